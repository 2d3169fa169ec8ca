import { combinedUncertainty } from '../../cosmology/combinedUncertainty.ts';
import type { ScalarParameter } from '../../cosmology/parameters.ts';
import { sensitivities } from '../../cosmology/sensitivities.ts';
import { cellPlace, milestonePlace, sweep } from '../../cosmology/sweep.ts';
import { correlationMatrix, uncertainNames, uncertaintyOf } from '../../cosmology/uncertain.ts';
import type { ParameterSet } from '../../inputs/types.ts';
import type { PrintedRows } from './printedRows.ts';

export type ComparedValue = 'Omega_m' | 'omega_m' | 'age_today' | 'z_equality' | 'D_M';

/** How a value follows x = ln h and y = ln(Omega_m h^2), and its u in the set as shipped. */
export interface Follows {
  readonly x: number;
  readonly y: number;
  readonly ours: number;
}

export interface Dependences {
  readonly follows: ReadonlyMap<ComparedValue, Follows>;
  /** D_M to recombination, Mpc. */
  readonly distance: number;
}

/** How the values that are compared follow h and Omega_m h^2, for a set that gives H0, omega_b and omega_c. */
export function dependences(set: ParameterSet, rows: PrintedRows): Dependences {
  const redshifts = [Number(rows.recombination?.z ?? 0)];
  const found = sensitivities(set, redshifts);
  const Omega_m = Number(rows.Omega_m.value);
  const h = Number(set.parameters.H0) / 100;
  const omega_m = Omega_m * h * h;
  const D_M = cellPlace(0, 'D_M_Mpc');

  const at = (place: number): Follows => {
    const slope = (name: ScalarParameter) =>
      found.find(({ parameter }) => parameter === name)?.derivatives[place] ?? Number.NaN;
    return { x: slope('H0') * 100 * h, y: slope('omega_c') * omega_m, ours: uncertaintyIn(set, slope) };
  };
  // omega_b and omega_c add up to omega_m but for the neutrinos, which are fixed.
  const product = (x: number, y: number): Follows => {
    const slope = (name: ScalarParameter) => (name === 'H0' ? x / (100 * h) : y / omega_m);
    return { x, y, ours: uncertaintyIn(set, slope) };
  };
  return {
    follows: new Map<ComparedValue, Follows>([
      ['Omega_m', product(-2 * Omega_m, Omega_m)],
      ['omega_m', product(0, omega_m)],
      ['age_today', at(milestonePlace(1, 'age_today'))],
      ['z_equality', at(milestonePlace(1, 'z_equality'))],
      ['D_M', at(D_M)],
    ]),
    distance: sweep(set.parameters, redshifts)[D_M] ?? Number.NaN,
  };
}

function uncertaintyIn(set: ParameterSet, slope: (name: ScalarParameter) => number): number {
  const names = uncertainNames(set);
  const terms = names.map((name) => slope(name) * uncertaintyOf(set, name));
  return combinedUncertainty(terms, correlationMatrix(set, names));
}
