import type { Parameters } from '../../src/cosmology/parameters.ts';
import {
  correlationMatrix,
  type UncertainParameters,
  uncertainNames,
  uncertaintyOf,
} from '../../src/cosmology/uncertain.ts';
import { choleskyFactor } from '../../src/numerics/choleskyFactor.ts';
import { standardNormals } from './standardNormals.ts';

/**
 * Standard deviations of a vector of values over `draws` sets of normally distributed parameters with the set's
 * uncertainties and correlations (JCGM 101:2008, clause 7), from a seed. NaN where some draw has no value.
 */
export function monteCarlo(
  set: UncertainParameters,
  evaluate: (parameters: Parameters) => ArrayLike<number>,
  draws: number,
  seed: number,
): readonly number[] {
  const names = uncertainNames(set);
  const factor = choleskyFactor(correlationMatrix(set, names));
  const normals = standardNormals(seed);
  const centre = Array.from(evaluate(set.parameters));
  const [sum, squares] = [centre.map(() => 0), centre.map(() => 0)];
  for (let draw = 0; draw < draws; draw++) {
    const independent = names.map(normals);
    const drawn = names.map((name, i) => {
      const away = independent.reduce((total, x, k) => total + x * (factor[i]?.[k] ?? 0), 0);
      return [name, String(Number(set.parameters[name]) + away * uncertaintyOf(set, name))];
    });
    const values = evaluate({ ...set.parameters, ...Object.fromEntries(drawn) });
    for (const [k, y] of centre.entries()) {
      const difference = (values[k] ?? Number.NaN) - y;
      sum[k] = (sum[k] ?? 0) + difference;
      squares[k] = (squares[k] ?? 0) + difference * difference;
    }
  }
  return squares.map((s, k) => Math.sqrt((s - ((sum[k] ?? 0) * (sum[k] ?? 0)) / draws) / (draws - 1)));
}
