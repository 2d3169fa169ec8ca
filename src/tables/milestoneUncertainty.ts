import { MILESTONE_NAMES, type MilestoneName } from '../cosmology/milestones.ts';
import type { Propagation } from '../cosmology/propagation.ts';
import { milestonePlace } from '../cosmology/sweep.ts';

/** What is known of the uncertainties of a set's milestones. */
export interface MilestoneUncertainty {
  /** Standard uncertainty; null for words, for what does not exist, and for a set that gives none. */
  of(name: MilestoneName): number | null;
  /** Milestones whose u is off by more than a tenth of it. */
  readonly nonlinear: readonly MilestoneName[];
}

/** The uncertainties of the milestones, from those of their set. */
export function milestoneUncertainty(found: Propagation | null): MilestoneUncertainty {
  if (found === null) return { of: () => null, nonlinear: [] };
  const place = (name: MilestoneName) => milestonePlace(found.redshifts.length, name);
  return {
    of: (name) => {
      const u = found.u[place(name)];
      return u === undefined || Number.isNaN(u) ? null : u;
    },
    nonlinear: MILESTONE_NAMES.filter((name) => found.isNonlinear(place(name))),
  };
}
