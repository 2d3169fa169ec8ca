import type { Background } from './background.ts';
import type { Densities } from './densities.ts';

/** Bounds on relative rounding errors at one epoch, in units of the unit roundoff 2^-53. */
export interface RateErrors {
  /** Of each density there. */
  readonly matter: number;
  readonly photons: number;
  readonly neutrinos: number;
  readonly curvature: number;
  readonly darkEnergy: number;
  /** Of E^2: the densities' errors and the sum's, over the sum; infinite where the terms cancel altogether. */
  readonly E2: number;
}

/**
 * Rounding errors of the densities and of E^2 at u = 1/a, when u itself is wrong by `argument` units.
 *
 * A power u^n carries n times the error of u and a unit for each product; a massive neutrino 18 units for its tables
 * and two more powers of u for y; an exponential the absolute error of its exponent.
 */
export function rateErrors(model: Background, d: Densities, u: number, argument: number): RateErrors {
  const e = model.errors;
  const massless = e.masslessNeutrinos + 4 * argument + 6;
  const massive = e.massiveNeutrinos + 5 * argument + 24;
  const errors = {
    matter: e.matter + 3 * argument + 3,
    photons: e.photons + 4 * argument + 3,
    neutrinos: d.massiveNeutrinos === 0 ? massless : Math.max(massless, massive),
    curvature: e.curvature + 2 * argument + 2,
    darkEnergy: e.darkEnergy + exponentError(model, u, argument),
  };
  const terms = d.matter + d.photons + d.neutrinos + Math.abs(d.curvature) + Math.abs(d.darkEnergy);
  const sum =
    d.matter * errors.matter +
    d.photons * errors.photons +
    (d.neutrinos - d.massiveNeutrinos) * massless +
    d.massiveNeutrinos * massive +
    Math.abs(d.curvature) * errors.curvature +
    Math.abs(d.darkEnergy) * errors.darkEnergy;
  return { ...errors, E2: d.E2 > 0 ? (sum + 4 * terms) / d.E2 : Number.POSITIVE_INFINITY };
}

/** Absolute error of 3 (n ln u - wa (1 - a)), and that of its exponential. */
function exponentError(model: Background, u: number, argument: number): number {
  if (model.onePlusW === 0 && model.wa === 0) return 1;
  const power = Math.abs(model.onePlusW);
  const bend = Math.abs(model.wa);
  const log = Math.abs(Math.log(u));
  return (
    3 * power * (4 * log + argument) + 3 * bend * (4 * Math.abs(1 - 1 / u) + argument / u) + 6 * (power + bend) + 3
  );
}
