import { background } from '../../src/cosmology/background.ts';
import { epochs } from '../../src/cosmology/epochs.ts';
import { spread } from '../../src/cosmology/nonlinearity.ts';
import type { Parameters } from '../../src/cosmology/parameters.ts';
import { propagation } from '../../src/cosmology/propagation.ts';
import { QUANTITIES, type QuantityId } from '../../src/cosmology/quantities.ts';
import { cellPlace } from '../../src/cosmology/sweep.ts';
import type { ParameterSet } from '../../src/inputs/types.ts';
import { monteCarlo } from '../support/monteCarlo.ts';

const columns = Object.keys(QUANTITIES) as QuantityId[];

/** A part of u up to which the two standard deviations may differ before a table says so. */
const TOLERATED = 0.1;

/** How far the cubature may stray from Monte Carlo in a column that it calls linear, besides the noise of the draws. */
const CUBATURE = 0.03;

function values(parameters: Parameters, redshifts: readonly number[]): readonly number[] {
  const model = background(parameters);
  return epochs(model, redshifts).flatMap((epoch) =>
    columns.map((id) => (epoch === null ? Number.NaN : (QUANTITIES[id](model, epoch) ?? Number.NaN))),
  );
}

/** One standard deviation beside the other two. */
export interface Compared {
  readonly name: string;
  readonly u: number;
  /** Over u: the standard deviation of the draws, and that by the cubature. */
  readonly drawn: number;
  readonly cubature: number;
  readonly flagged: boolean;
}

/** Every column at some redshifts by the law of propagation, by cubature and by Monte Carlo. */
export function compared(
  set: ParameterSet,
  redshifts: readonly number[],
  draws: number,
  seed: number,
): readonly Compared[] {
  const found = propagation(set, redshifts);
  if (found === null) throw new Error(`${set.id} has no uncertainties`);
  const { deviation } = spread(set, redshifts);
  const drawn = monteCarlo(set, (parameters) => values(parameters, redshifts), draws, seed);
  return redshifts.flatMap((z, row) =>
    columns.flatMap((id, k) => {
      const place = cellPlace(row, id);
      const u = found.u[place] ?? Number.NaN;
      if (!(u > 0)) return [];
      return [
        {
          name: `${id} at z = ${z}`,
          u,
          drawn: (drawn[row * columns.length + k] ?? Number.NaN) / u,
          cubature: (deviation[place] ?? Number.NaN) / u,
          flagged: found.isNonlinear(place),
        },
      ];
    }),
  );
}

/**
 * Sentences on columns that Monte Carlo and the flags judge differently. `noise` is the relative standard deviation of
 * a standard deviation from so many draws, 1/sqrt(2 N) for a normal distribution.
 */
export function misjudged(all: readonly Compared[], noise: number): readonly string[] {
  const slack = 4 * noise + CUBATURE;
  return all
    .filter(({ drawn, flagged }) => {
      const apart = Math.abs(drawn - 1);
      return flagged ? apart < TOLERATED - slack : !(apart < TOLERATED + slack);
    })
    .map(({ name, drawn, cubature, flagged }) => `${name}: ${drawn} of u, cubature ${cubature}, flagged ${flagged}`);
}
