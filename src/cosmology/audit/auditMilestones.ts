import type { Real } from '../../numerics/extended/real.ts';
import { MILESTONE_NAMES, type MilestoneName } from '../milestones.ts';
import type { Parameters } from '../parameters.ts';
import { type Audited, twice } from './audited.ts';
import { largestAngularDistance, recessionAtLightSpeed } from './distanceExtremes.ts';
import { accelerationOnset, matterDarkEnergyEquality, matterRadiationEquality } from './epochsOfChange.ts';
import { history, type Moment } from './history.ts';
import { auditModel, type Model } from './model.ts';
import { sinceBigBang } from './spans.ts';
import { type Turns, turningPoints } from './turns.ts';

/** A number, words (the fate), or null where the milestone does not exist. */
export type AuditedMilestones = Readonly<Record<MilestoneName, Audited | string | null>>;

type Numbers = Readonly<Record<Exclude<MilestoneName, 'fate'>, Real | null>>;

const NUMBER_NAMES = MILESTONE_NAMES.filter((name) => name !== 'fate');

/**
 * The milestones of a model in extended precision, in the units of the tables.
 *
 * Errors: Error when startAudit has not resolved, or when an integral or a root cannot be had to `digits` digits.
 */
export function auditMilestones(parameters: Parameters, digits: number): AuditedMilestones {
  let fate = '';
  const numbers = twice(digits, (arithmetic) => {
    const model = auditModel(arithmetic, parameters);
    const turns = turningPoints(model);
    const values = evaluate(model, turns);
    fate = fateOf(model, turns);
    return NUMBER_NAMES.map((name) => values[name]?.toText() ?? null);
  });
  const found = Object.fromEntries(NUMBER_NAMES.map((name, k) => [name, numbers[k] ?? null]));
  return { ...(found as Record<keyof Numbers, Audited | null>), fate };
}

function evaluate(model: Model, turns: Turns): Numbers {
  const { hubbleTime, hubbleDistance, criticalDensity } = model;
  const equality = matterRadiationEquality(model, turns);
  const acceleration = accelerationOnset(model, turns);
  const darkEquality = matterDarkEnergyEquality(model, turns);
  const largest = largestAngularDistance(model, turns);
  const today = presentMoment(model, turns);
  const maximum = turns.maximum === null ? null : age(model, turns, turns.maximum);
  return {
    hubble_time: hubbleTime,
    hubble_distance: hubbleDistance,
    critical_density_SI: criticalDensity,
    critical_density_cgs: criticalDensity.over(1000),
    critical_density_Msun: model.criticalDensityInSuns,
    age_today: today.age?.times(hubbleTime) ?? null,
    z_equality: redshift(equality),
    t_equality: age(model, turns, equality),
    z_acceleration: redshift(acceleration),
    t_acceleration: age(model, turns, acceleration),
    z_matter_DE_equality: redshift(darkEquality),
    t_matter_DE_equality: age(model, turns, darkEquality),
    z_largest_D_A: redshift(largest?.u ?? null),
    largest_D_A: largest?.distance.times(hubbleDistance) ?? null,
    z_recession_c: redshift(recessionAtLightSpeed(model, turns)),
    particle_horizon_today: today.conformalTime?.times(hubbleDistance) ?? null,
    event_horizon_today: today.conformalFuture?.times(hubbleDistance) ?? null,
    t_maximum: maximum,
    // The way back takes as long as the way out.
    t_crunch: maximum?.times(2) ?? null,
  };
}

const redshift = (u: Real | null): Real | null => u?.minus(1) ?? null;

function presentMoment(model: Model, turns: Turns): Moment {
  const needs = { fromToday: false, volume: false, sinceBigBang: true, untilEnd: true };
  const [today] = history(model, turns, [model.arithmetic.real(1)], needs);
  return today as Moment;
}

/** Age at 1 + z = u in Gyr. */
function age(model: Model, turns: Turns, u: Real | null): Real | null {
  return u === null ? null : (sinceBigBang(model, turns, u).time?.times(model.hubbleTime) ?? null);
}

/** What becomes of the universe; dark energy that grows without limit tears everything apart in finite time. */
function fateOf({ darkEnergy, w0, wa }: Model, { maximum }: Turns): string {
  if (maximum !== null) return 'recollapses';
  const grows = wa.sign() > 0 || (wa.sign() === 0 && w0.below(-1));
  return darkEnergy.sign() > 0 && grows ? 'big rip' : 'expands forever';
}
