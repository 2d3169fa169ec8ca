import { newtonPolynomial } from '../numerics/newtonPolynomial.ts';

/** Places within one interval of a grid, in ascending order. */
export interface Places {
  /** Between the rows of this index and the next. */
  readonly interval: number;
  readonly z: readonly number[];
}

/** The largest error within one interval. */
export interface Peak {
  readonly interval: number;
  readonly size: number;
  readonly z: number;
  /** Neighbouring places, between which the largest error lies. */
  readonly from: number;
  readonly to: number;
}

/** Errors that differ by less than this share are equal, so that rounding does not choose among equal peaks. */
const EQUAL = 1e-6;

/** The errors are interpolated through this many places around the largest, at so many steps between neighbours. */
const AROUND = 5;
const STEPS = 8;
/** The largest error lies above the largest at the places, which are close together, by less than this factor. */
const HIGHEST = 1.25;

/**
 * The largest of the errors at some places and, interpolated, between the largest of these and its neighbours. Null
 * unless it is larger than `above`.
 */
export function peakOf({ interval, z }: Places, errors: readonly number[], above = -1): Peak | null {
  let k = 0;
  for (let i = 1; i < errors.length; i++) if ((errors[i] ?? 0) > (errors[k] ?? 0) * (1 + EQUAL)) k = i;
  const highest = HIGHEST * (errors[k] ?? 0);
  if (highest <= above) return null;
  const first = Math.min(Math.max(0, k - (AROUND - 1) / 2), Math.max(0, z.length - AROUND));
  const between = newtonPolynomial(z.slice(first, first + AROUND), errors.slice(first, first + AROUND));
  const place = z[k] ?? Number.NaN;
  const [from = place, to = place] = [z[k - 1], z[k + 1]];
  let peak = { size: errors[k] ?? 0, z: place };
  for (const [lo, hi] of [
    [from, place],
    [place, to],
  ] as const) {
    for (let step = 1; step < STEPS; step++) {
      const x = lo + (step / STEPS) * (hi - lo);
      const size = Math.min(highest, between(x));
      if (size > peak.size * (1 + EQUAL)) peak = { size, z: x };
    }
  }
  return peak.size > above * (1 + EQUAL) ? { interval, ...peak, from, to } : null;
}
