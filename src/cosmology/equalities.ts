import { findRoot } from '../numerics/findRoot.ts';
import type { Background } from './background.ts';
import { densities } from './densities.ts';
import type { TurningPoints } from './turningPoints.ts';

/** Earliest and latest ln a where epochs are sought, and the step that tells two of them apart. */
const EARLIEST = -60;
const LATEST = 60;
const STEP = 0.02;

/**
 * Redshift of matter-radiation equality as CMB papers define it: baryons and cold dark matter against photons and all
 * N_eff as if massless. Null without matter or radiation, or where it falls before a bounce.
 *
 * Source: Planck Collaboration VI (2020), A&A 641, A6, table 2.
 */
export function matterRadiationEquality(model: Background): number | null {
  const radiation = model.photons + model.allMassless;
  return radiation > 0 && model.matter > 0 ? model.matter / radiation - 1 : null;
}

/**
 * The first epoch in time where f goes from positive to negative, as a redshift; it may lie in the future (z < 0).
 * Sought between the turning points of the model.
 */
function firstFall(f: (s: number) => number, { bounce, maximum }: TurningPoints): number | null {
  const end = Math.min(maximum ?? LATEST, LATEST);
  let s = Math.max(bounce ?? EARLIEST, EARLIEST);
  let value = f(s);
  while (s < end) {
    const next = s + STEP;
    const valueNext = f(next);
    if (value > 0 && valueNext <= 0) return Math.expm1(-findRoot(f, s, next));
    [s, value] = [next, valueNext];
  }
  return null;
}

/**
 * Redshift at which the expansion begins to accelerate: where the deceleration parameter first falls to zero. Null for
 * a model that never accelerates, or always does.
 */
export function accelerationOnset(model: Background, turns: TurningPoints): number | null {
  return firstFall((s) => {
    const d = densities(model, Math.exp(-s));
    return d.matter + 2 * d.photons + d.neutrinos + 3 * d.neutrinoPressure + d.darkEnergy + 3 * d.darkEnergyPressure;
  }, turns);
}

/** Redshift at which dark energy overtakes matter with massive neutrinos; null where it never does. */
export function matterDarkEnergyEquality(model: Background, turns: TurningPoints): number | null {
  if (model.darkEnergy <= 0) return null;
  return firstFall((s) => {
    const d = densities(model, Math.exp(-s));
    return d.matter + d.massiveNeutrinos - d.darkEnergy;
  }, turns);
}
