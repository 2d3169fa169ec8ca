import type { Background } from './background.ts';
import { densities } from './densities.ts';
import { epochs } from './epochs.ts';
import { type ErrorBounds, errorBounds, UNIT_ROUNDOFF } from './errorBounds.ts';
import { integralErrors } from './integralErrors.ts';
import type { MilestoneName } from './milestones.ts';
import type { MilestoneValues } from './milestoneValues.ts';
import { rateErrors } from './rateErrors.ts';
import { turningPoints } from './turningPoints.ts';

/** Change of ln(1+z) over which the slope at a root is taken. */
const STEP = 1e-4;
/** Search for the root itself, and the conversion from ln(1+z) to z. */
const SEARCH = 8;

/** A quantity at z together with the bound of its double value there. */
type At = (z: number) => { readonly value: number; readonly bound: number };

/**
 * Bound on the error of a root z of f: the error of f there over its slope, and the search.
 * Near a root a rounded f may vanish anywhere within its own error.
 */
function rootBound(f: At, z: number): number {
  const u = 1 + z;
  const [here, near] = [f(z), f(u * Math.exp(STEP) - 1)];
  const slope = Math.abs(near.value - here.value) / STEP;
  return u * (here.bound / slope + SEARCH * UNIT_ROUNDOFF);
}

function boundsAt(model: Background, z: number): ErrorBounds | null {
  const [epoch] = epochs(model, [z]);
  const [integral] = integralErrors(model, turningPoints(model), [z]);
  return epoch && integral ? errorBounds(model, epoch, integral) : null;
}

function columnAt(model: Background, id: 'q' | 'D_A_Mpc' | 'v_rec_now_c', evaluate: (z: number) => number): At {
  return (z) => {
    const value = evaluate(z);
    return { value, bound: boundsAt(model, z)?.of(id, value) ?? Number.POSITIVE_INFINITY };
  };
}

/** ln of matter with massive neutrinos over dark energy. */
function logRatio(model: Background): At {
  return (z) => {
    const u = 1 + z;
    const d = densities(model, u);
    const errors = rateErrors(model, d, u, 2);
    const matter = d.matter + d.massiveNeutrinos;
    const count = Math.max(errors.matter, errors.neutrinos) + errors.darkEnergy + 4;
    return { value: Math.log(matter / d.darkEnergy), bound: UNIT_ROUNDOFF * count };
  };
}

/** q at z; the onset of acceleration is its root. */
function decelerationAt(model: Background): (z: number) => number {
  return (z) => {
    const d = densities(model, 1 + z);
    const pressure = d.photons / 3 + d.neutrinoPressure + d.darkEnergyPressure;
    return (d.matter + d.photons + d.neutrinos + d.darkEnergy + 3 * pressure) / (2 * d.E2);
  };
}

const comovingAt = (model: Background) => (z: number) => epochs(model, [z])[0]?.comoving ?? Number.NaN;

/** dD_M/dz (1+z)/D_M - 1, by which the largest D_A is found, with the errors of its two factors. */
function growthExcess(model: Background): At {
  return (z) => {
    const [epoch] = epochs(model, [z]);
    if (!epoch || epoch.comoving === null) return { value: Number.NaN, bound: Number.POSITIVE_INFINITY };
    const x = model.curvature * epoch.comoving * epoch.comoving;
    const r = Math.sqrt(Math.abs(x));
    const follow = x === 0 ? 1 : x > 0 ? r / Math.tanh(r) : r / Math.tan(r);
    const relative = ((boundsAt(model, z)?.of('D_A_Mpc', 1) ?? 1) + (boundsAt(model, z)?.of('E', 1) ?? 1)) * 2;
    return { value: (follow * epoch.u) / (epoch.E * epoch.comoving) - 1, bound: relative };
  };
}

/** Bound of an age at a redshift that is itself known to `zBound` only: t falls at most as (1+z)^-2. */
function ageBound(model: Background, z: number | string | null, zBound: number, age: number): number {
  if (typeof z !== 'number') return 0;
  return (boundsAt(model, z)?.of('t_Gyr', age) ?? Number.POSITIVE_INFINITY) + (2 * age * zBound) / (1 + z);
}

/**
 * Bounds on the errors of the milestones' double values, in their own units; 0 for words and for what does not exist.
 * Roots are wrong by the error of their function over its slope, ages besides by what their redshift is.
 */
export function milestoneBounds(model: Background, values: MilestoneValues): Readonly<Record<MilestoneName, number>> {
  const today = boundsAt(model, 0);
  const number = (name: MilestoneName): number => {
    const value = values[name];
    return typeof value === 'number' ? value : 0;
  };
  const root = (name: MilestoneName, f: At): number => {
    const z = values[name];
    return typeof z === 'number' ? rootBound(f, z) : 0;
  };
  const density = 24 * UNIT_ROUNDOFF;
  const equality =
    UNIT_ROUNDOFF * (model.errors.matter + model.errors.masslessNeutrinos + 4) * (1 + number('z_equality'));
  const acceleration = root('z_acceleration', columnAt(model, 'q', decelerationAt(model)));
  const dark = root('z_matter_DE_equality', logRatio(model));
  const maximum = number('t_maximum') * turnAgeBound(model);
  const ofToday = (id: 't_Gyr' | 'particle_horizon_Mpc' | 'event_horizon_Mpc', name: MilestoneName) =>
    number(name) === 0 ? 0 : (today?.of(id, number(name)) ?? Number.POSITIVE_INFINITY);
  return {
    hubble_time: 10 * UNIT_ROUNDOFF * number('hubble_time'),
    hubble_distance: 3 * UNIT_ROUNDOFF * number('hubble_distance'),
    critical_density_SI: density * number('critical_density_SI'),
    critical_density_cgs: density * number('critical_density_cgs'),
    critical_density_Msun: density * number('critical_density_Msun'),
    age_today: ofToday('t_Gyr', 'age_today'),
    z_equality: values.z_equality === null ? 0 : equality,
    t_equality: ageBound(model, values.z_equality, equality, number('t_equality')),
    z_acceleration: acceleration,
    t_acceleration: ageBound(model, values.z_acceleration, acceleration, number('t_acceleration')),
    z_matter_DE_equality: dark,
    t_matter_DE_equality: ageBound(model, values.z_matter_DE_equality, dark, number('t_matter_DE_equality')),
    z_largest_D_A: root('z_largest_D_A', growthExcess(model)),
    largest_D_A:
      typeof values.z_largest_D_A === 'number'
        ? 2 * (boundsAt(model, values.z_largest_D_A)?.of('D_A_Mpc', number('largest_D_A')) ?? Number.POSITIVE_INFINITY)
        : 0,
    z_recession_c: root('z_recession_c', columnAt(model, 'v_rec_now_c', comovingAt(model))),
    particle_horizon_today: ofToday('particle_horizon_Mpc', 'particle_horizon_today'),
    event_horizon_today: ofToday('event_horizon_Mpc', 'event_horizon_today'),
    fate: 0,
    t_maximum: maximum,
    t_crunch: 2 * maximum,
  };
}

/** Relative bound of the age at the maximum: that of the conformal time left, which runs through the maximum. */
function turnAgeBound(model: Background): number {
  const [integral] = integralErrors(model, turningPoints(model), [0]);
  return UNIT_ROUNDOFF * (10 + (integral?.conformalFuture ?? 0) + (integral?.age ?? 0));
}
