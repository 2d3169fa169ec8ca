import { choleskyFactor } from '../numerics/choleskyFactor.ts';
import { normalCubature } from '../numerics/normalCubature.ts';
import type { Parameters, ScalarParameter } from './parameters.ts';
import { type Sweep, sweep } from './sweep.ts';
import { type UncertainParameters, uncertaintyOf } from './uncertain.ts';

/** The law of propagation may be off by this part of u before a table says so. */
export const TOLERATED = 0.1;

/** A spread below this part of the value itself is rounding. */
const ROUNDING = 1e-11;

/**
 * Standard deviations of everything in a sweep if the parameters are normally distributed, to the order that the note
 * to JCGM 100:2008, 5.1.2, gives: the terms (1/2 (d2f/dx_i dx_j)^2 + df/dx_i d3f/dx_i dx_j^2) u_i^2 u_j^2 included, here
 * for independent combinations of the parameters. NaN where a value does not exist throughout the spread.
 *
 * Method: a cubature of the fifth degree for E[y] and E[y^2] over parameters x + L p, L L^T being the covariance. It
 *         reaches out to sqrt(3) standard deviations, so it notices strong curvature that derivatives at the centre
 *         alone do not show. 2 n^2 + 1 sweeps for n parameters.
 */
export function spread(
  set: UncertainParameters,
  redshifts: readonly number[],
  names: readonly ScalarParameter[],
  correlations: readonly (readonly number[])[],
): { readonly deviation: Sweep; readonly centre: Sweep } {
  const factor = choleskyFactor(correlations);
  const [middle, ...around] = normalCubature(names.length);
  const centre = sweep(set.parameters, redshifts);
  // Means of the differences to the centre, which keep their digits where the spread is small against the value.
  const mean = new Float64Array(centre.length);
  const square = new Float64Array(centre.length);
  for (const { point, weight } of middle === undefined ? [] : around) {
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

/** 1 at the places where u departs from the spread by more than a tenth of it, or where the spread leaves the domain. */
export function nonlinearPlaces(
  set: UncertainParameters,
  redshifts: readonly number[],
  names: readonly ScalarParameter[],
  correlations: readonly (readonly number[])[],
  u: Sweep,
): Uint8Array {
  const { deviation, centre } = spread(set, redshifts, names, correlations);
  return Uint8Array.from(u, (linear, k) => {
    if (Number.isNaN(linear)) return 0;
    const difference = Math.abs((deviation[k] as number) - linear);
    const allowed = TOLERATED * linear + ROUNDING * Math.abs(centre[k] as number);
    return difference <= allowed ? 0 : 1;
  });
}

/** The set's parameters moved by `point` standard deviations along the columns of the factor. */
function displaced(
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
