import type { Background } from './background.ts';
import { type Densities, densities } from './densities.ts';
import { expansionHistory, type Moment } from './expansionHistory.ts';

/** A model at one redshift: everything the columns are made of. */
export interface Epoch extends Moment {
  readonly z: number;
  /** 1 + z. */
  readonly u: number;
  readonly densities: Densities;
  /** H/H0; exactly 0 at the largest expansion of a recollapsing model. */
  readonly E: number;
}

/** A sum this small against its terms is nothing but their rounding errors. */
const ROUNDING = 4 * Number.EPSILON;

/**
 * The model at each of the redshifts, in the order given; null for epochs that a recollapsing model never reaches.
 *
 * Errors: DomainError for z <= -1; ConvergenceError where an integral cannot be had to full accuracy.
 */
export function epochs(model: Background, redshifts: readonly number[]): readonly (Epoch | null)[] {
  const { moments } = expansionHistory(model, redshifts);
  return redshifts.map((z, k) => {
    const moment = moments[k];
    return moment == null ? null : { ...moment, z, u: 1 + z, ...rate(model, 1 + z) };
  });
}

function rate(model: Background, u: number): { densities: Densities; E: number } {
  const parts = densities(model, u);
  const size = parts.matter + parts.photons + parts.neutrinos + Math.abs(parts.curvature) + Math.abs(parts.darkEnergy);
  return { densities: parts, E: parts.E2 <= ROUNDING * size ? 0 : Math.sqrt(parts.E2) };
}
