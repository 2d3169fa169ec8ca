import type { Background } from './background.ts';
import { accelerationOnset, matterDarkEnergyEquality, matterRadiationEquality } from './equalities.ts';
import { expansionHistory, type History } from './expansionHistory.ts';
import { largestAngularDistance, recessionAtLightSpeed } from './extremes.ts';
import type { MilestoneName } from './milestones.ts';
import { criticalDensity, criticalDensityInSuns } from './quantities.ts';
import { type TurningPoints, turningPoints } from './turningPoints.ts';

export type MilestoneValues = Readonly<Record<MilestoneName, number | string | null>>;

/** Fates of a model, in words of the trade. */
function fate(model: Background, { maximum }: TurningPoints): string {
  if (maximum !== undefined) return 'recollapses';
  const phantom = model.wa > 0 || (model.wa === 0 && model.onePlusW < 0);
  return model.darkEnergy > 0 && phantom ? 'big rip' : 'expands forever';
}

const scaled = (value: number | null | undefined, unit: number): number | null => (value == null ? null : value * unit);

/** Ages at some redshifts, in 1/H0; null where the redshift or the age does not exist. */
function ages(model: Background, redshifts: readonly (number | null)[]): readonly (number | null)[] {
  const known = redshifts.filter((z) => z !== null);
  const { moments } = expansionHistory(model, known);
  const found = new Map(known.map((z, k) => [z, moments[k]?.age ?? null]));
  return redshifts.map((z) => (z === null ? null : (found.get(z) ?? null)));
}

function future(model: Background, history: History) {
  const atMaximum = scaled(history.ageAtMaximum, model.hubbleTime);
  return { t_maximum: atMaximum, t_crunch: scaled(atMaximum, 2) };
}

/**
 * The present-day values and single epochs of a model: times in Gyr, lengths in Mpc, critical densities in kg/m3,
 * g/cm3 and solar masses per Mpc3; null where an epoch does not exist. A recollapsing model is symmetric in time about
 * its maximum, so the crunch comes at twice that age.
 */
export function milestoneValues(model: Background): MilestoneValues {
  const turns = turningPoints(model);
  const today = expansionHistory(model, [0]);
  const equality = matterRadiationEquality(model);
  const acceleration = accelerationOnset(model, turns);
  const darkEquality = matterDarkEnergyEquality(model, turns);
  const [tEquality, tAcceleration, tDark] = ages(model, [equality, acceleration, darkEquality]);
  const largest = largestAngularDistance(model, turns);
  const density = criticalDensity(model);
  const now = today.moments[0];
  return {
    hubble_time: model.hubbleTime,
    hubble_distance: model.hubbleDistance,
    critical_density_SI: density,
    critical_density_cgs: density / 1e3,
    critical_density_Msun: criticalDensityInSuns(model),
    age_today: scaled(now?.age, model.hubbleTime),
    z_equality: equality,
    t_equality: scaled(tEquality, model.hubbleTime),
    z_acceleration: acceleration,
    t_acceleration: scaled(tAcceleration, model.hubbleTime),
    z_matter_DE_equality: darkEquality,
    t_matter_DE_equality: scaled(tDark, model.hubbleTime),
    z_largest_D_A: largest?.z ?? null,
    largest_D_A: scaled(largest?.distance, model.hubbleDistance),
    z_recession_c: recessionAtLightSpeed(model, turns),
    particle_horizon_today: scaled(now?.conformalTime, model.hubbleDistance),
    event_horizon_today: scaled(now?.conformalFuture, model.hubbleDistance),
    fate: fate(model, turns),
    ...future(model, today),
  };
}
