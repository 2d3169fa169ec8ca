import type { Arithmetic } from '../../numerics/extended/arithmetic.ts';
import type { Real } from '../../numerics/extended/real.ts';
import { MILESTONE_NAMES, type MilestoneName } from '../milestones.ts';
import type { Parameters } from '../parameters.ts';
import { type Audited, twice } from './audited.ts';
import { largestAngularDistance, recessionAtLightSpeed } from './distanceExtremes.ts';
import { accelerationOnset, matterDarkEnergyEquality, matterRadiationEquality } from './epochsOfChange.ts';
import { history } from './history.ts';
import { auditModel, type Model } from './model.ts';
import { sinceBigBang, span } from './spans.ts';
import { type Turns, turningPoints } from './turns.ts';

/** Every milestone that is a number; null where it does not exist. */
export type AuditedMilestones = Readonly<Record<Exclude<MilestoneName, 'fate'>, Audited | null>>;

const NUMBERS = MILESTONE_NAMES.filter((name) => name !== 'fate');

/**
 * The milestones of a model in extended precision, in the units of `milestoneValues`.
 *
 * Errors: Error when startAudit has not resolved, or when an integral cannot be had to `digits` digits.
 */
export function auditMilestones(parameters: Parameters, digits: number): AuditedMilestones {
  const values = twice(digits, (arithmetic) => evaluate(arithmetic, parameters));
  return Object.fromEntries(NUMBERS.map((name, k) => [name, values[k] ?? null])) as unknown as AuditedMilestones;
}

function evaluate(arithmetic: Arithmetic, parameters: Parameters): readonly (string | null)[] {
  const model = auditModel(arithmetic, parameters);
  const turns = turningPoints(model);
  const values = {
    ...present(model, turns),
    ...changes(model, turns),
    ...extremes(model, turns),
    ...end(model, turns),
  };
  return NUMBERS.map((name) => values[name]?.toText() ?? null);
}

const scaled = (value: Real | null | undefined, unit: Real): Real | null => value?.times(unit) ?? null;

function present(model: Model, turns: Turns) {
  const today = model.arithmetic.real(1);
  const needs = { fromToday: false, volume: false, sinceBigBang: true, untilEnd: true };
  const [now] = history(model, turns, [today], needs);
  return {
    hubble_time: model.hubbleTime,
    hubble_distance: model.hubbleDistance,
    critical_density_SI: model.criticalDensity,
    critical_density_cgs: model.criticalDensity.over(1000),
    critical_density_Msun: model.criticalDensityInSuns,
    age_today: scaled(now?.age, model.hubbleTime),
    particle_horizon_today: scaled(now?.conformalTime, model.hubbleDistance),
    event_horizon_today: scaled(now?.conformalFuture, model.hubbleDistance),
  };
}

/** Redshift and age of an epoch given as 1 + z. */
function dated(model: Model, turns: Turns, u: Real | null): readonly [Real | null, Real | null] {
  return u === null ? [null, null] : [u.minus(1), scaled(sinceBigBang(model, turns, u).time, model.hubbleTime)];
}

function changes(model: Model, turns: Turns) {
  const [z_equality, t_equality] = dated(model, turns, matterRadiationEquality(model, turns));
  const [z_acceleration, t_acceleration] = dated(model, turns, accelerationOnset(model, turns));
  const [z_matter_DE_equality, t_matter_DE_equality] = dated(model, turns, matterDarkEnergyEquality(model, turns));
  return { z_equality, t_equality, z_acceleration, t_acceleration, z_matter_DE_equality, t_matter_DE_equality };
}

function extremes(model: Model, turns: Turns) {
  const largest = largestAngularDistance(model, turns);
  return {
    z_largest_D_A: largest?.u.minus(1) ?? null,
    largest_D_A: scaled(largest?.distance, model.hubbleDistance),
    z_recession_c: recessionAtLightSpeed(model, turns)?.u.minus(1) ?? null,
  };
}

/** A recollapse is symmetric in time about the maximum. */
function end(model: Model, turns: Turns) {
  if (turns.maximum === null) return { t_maximum: null, t_crunch: null };
  const today = model.arithmetic.real(1);
  const past = sinceBigBang(model, turns, today).time;
  const age = past?.plus(span(model, turns, turns.maximum, today).time);
  return { t_maximum: scaled(age, model.hubbleTime), t_crunch: scaled(age?.times(2), model.hubbleTime) };
}
