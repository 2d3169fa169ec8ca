import { integratePair } from '../numerics/integratePair.ts';
import type { Background } from './background.ts';
import { conformalRateSquared, conformalRateSquaredNearTurn } from './conformalRate.ts';
import type { TurningPoints } from './turningPoints.ts';

/** The two integrals that every time and distance is made of, between two epochs. */
export interface Span {
  /** int ds/(aE): comoving distance over c/H0, conformal time times H0. */
  readonly conformal: number;
  /** int a ds/(aE): time times H0. */
  readonly time: number;
}

/** Within this of a turning point, in ln a, the variable is the root of the distance to it. */
const NEAR_TURN = 0.5;
function plainSpan(model: Background, lo: number, hi: number): Span {
  const { first, second } = integratePair(
    (s, out) => {
      const f = 1 / Math.sqrt(conformalRateSquared(model, s));
      out[0] = f;
      out[1] = f * Math.exp(s);
    },
    lo,
    hi,
  );
  return { conformal: first, time: second };
}

/** The span on one side of a turning point: with s = turn -+ v^2 the integrand's inverse root becomes smooth. */
function turningSpan(model: Background, turn: number, side: 1 | -1, near: number, far: number): Span {
  const { first, second } = integratePair(
    (v, out) => {
      const shift = side * v * v;
      const f = (2 * v) / Math.sqrt(conformalRateSquaredNearTurn(model, turn, shift));
      out[0] = f;
      out[1] = f * Math.exp(turn - shift);
    },
    Math.sqrt(Math.max(0, near)),
    Math.sqrt(far),
  );
  return { conformal: first, time: second };
}

const plus = (a: Span, b: Span): Span => ({ conformal: a.conformal + b.conformal, time: a.time + b.time });

/**
 * Both integrals between ln a = lo and ln a = hi, lo <= hi, between the turning points if there are any.
 *
 * Source: Hogg (1999), astro-ph/9905116, eqs. 15 and 30, with dz = -ds/a.
 */
export function span(model: Background, { bounce, maximum }: TurningPoints, lo: number, hi: number): Span {
  if (maximum !== undefined && hi > maximum - NEAR_TURN) {
    const split = Math.max(lo, maximum - NEAR_TURN);
    const upper = turningSpan(model, maximum, 1, maximum - hi, maximum - split);
    return split > lo ? plus(span(model, { bounce }, lo, split), upper) : upper;
  }
  if (bounce !== undefined && lo < bounce + NEAR_TURN) {
    const split = Math.min(hi, bounce + NEAR_TURN);
    const lower = turningSpan(model, bounce, -1, lo - bounce, split - bounce);
    return split < hi ? plus(lower, plainSpan(model, split, hi)) : lower;
  }
  return plainSpan(model, lo, hi);
}
