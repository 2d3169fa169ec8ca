import { choleskyFactor } from '../numerics/choleskyFactor.ts';
import { normalCubature } from '../numerics/normalCubature.ts';
import type { Parameters, ScalarParameter } from './parameters.ts';
import { type Sweep, sweep } from './sweep.ts';
import { correlationMatrix, type UncertainParameters, uncertainNames, uncertaintyOf } from './uncertain.ts';

/** Standard deviations of everything in a sweep, and the sweep of the parameters as given. */
export interface Spread {
  readonly deviation: Sweep;
  readonly centre: Sweep;
}

/**
 * Standard deviations of everything in a sweep if the parameters are normally distributed, to the order of the note to
 * JCGM 100:2008, 5.1.2: with the terms (1/2 (d2f/dx_i dx_j)^2 + df/dx_i d3f/dx_i dx_j^2) u_i^2 u_j^2, for independent
 * combinations x of the parameters. NaN where a value does not exist throughout the spread.
 *
 * Method: a cubature of the fifth degree for E[y] and E[y^2]. It reaches out to sqrt(3) standard deviations along
 *         each axis, so it notices strong curvature that derivatives at the centre alone do not show. 2 n^2 + 1 sweeps
 *         for n parameters.
 */
export function spread(set: UncertainParameters, redshifts: readonly number[]): Spread {
  const names = uncertainNames(set);
  const factor = choleskyFactor(correlationMatrix(set, names));
  const centre = sweep(set.parameters, redshifts);
  // Means of the differences to the centre, which keep their digits where the spread is small against the value.
  const [mean, square] = [new Float64Array(centre.length), new Float64Array(centre.length)];
  for (const { point, weight } of normalCubature(names.length).slice(1)) {
    const values = sweep(displaced(set, names, factor, point), redshifts);
    for (const [k, y] of values.entries()) {
      const difference = y - (centre[k] as number);
      mean[k] = (mean[k] as number) + weight * difference;
      square[k] = (square[k] as number) + weight * difference * difference;
    }
  }
  const deviation = square.map((s, k) => Math.sqrt(Math.max(0, s - (mean[k] as number) * (mean[k] as number))));
  return { deviation, centre };
}

/** The law of propagation may be off by this part of u before a table says so. */
const TOLERATED = 0.1;
/** A spread below this part of the value itself is rounding. */
const ROUNDING = 1e-11;

/** Whether u departs from the spread at a place by more than a tenth of u, or the spread leaves the domain there. */
export function isNonlinear({ deviation, centre }: Spread, place: number, u: number): boolean {
  // What u says is exact has no spread to compare.
  if (!(u > 0)) return false;
  const difference = Math.abs((deviation[place] as number) - u);
  return !(difference <= TOLERATED * u + ROUNDING * Math.abs(centre[place] as number));
}

/** The set's parameters moved by `point` standard deviations along the columns of the factor. */
export function displaced(
  set: UncertainParameters,
  names: readonly ScalarParameter[],
  factor: readonly (readonly number[])[],
  point: readonly number[],
): Parameters {
  const changes = names.map((name, i) => {
    const along = point.reduce((sum, p, k) => sum + p * (factor[i]?.[k] ?? 0), 0);
    return [name, String(Number(set.parameters[name]) + along * uncertaintyOf(set, name))];
  });
  return { ...set.parameters, ...Object.fromEntries(changes) };
}
