import type { Background } from './background.ts';
import { relicNeutrino } from './relicNeutrinos.ts';

/** Densities and pressures at one epoch, over the critical density of today. Their sum is E^2. */
export interface Densities {
  readonly matter: number;
  readonly photons: number;
  /** All neutrinos. */
  readonly neutrinos: number;
  readonly massiveNeutrinos: number;
  readonly neutrinoPressure: number;
  readonly curvature: number;
  readonly darkEnergy: number;
  readonly darkEnergyPressure: number;
  /** E^2 = (H/H0)^2. */
  readonly E2: number;
}

/**
 * Dark energy density over that of today, a^(-3(1+w0+wa)) exp(-3 wa (1-a)), from u = 1/a.
 *
 * Source: Chevallier & Polarski (2001), gr-qc/0009008; Linder (2003), astro-ph/0208512.
 */
function darkEnergyGrowth(model: Background, u: number): number {
  if (model.onePlusW === 0 && model.wa === 0) return 1;
  return Math.exp(3 * (model.onePlusW * Math.log(u) - (model.wa * (u - 1)) / u));
}

/** All densities at u = 1 + z > 0, each to a few units of roundoff; E2 relative to its largest term. */
export function densities(model: Background, u: number): Densities {
  const u2 = u * u;
  const u4 = u2 * u2;
  let massive = 0;
  let pressure = model.masslessNeutrinos;
  for (const { relativistic, y0 } of model.massiveNeutrinos) {
    const relic = relicNeutrino(y0 / u);
    massive += relativistic * relic.energy;
    pressure += relativistic * relic.pressure;
  }
  const darkEnergy = model.darkEnergy === 0 ? 0 : model.darkEnergy * darkEnergyGrowth(model, u);
  const parts = {
    matter: model.matter * u2 * u,
    photons: model.photons * u4,
    neutrinos: (model.masslessNeutrinos + massive) * u4,
    massiveNeutrinos: massive * u4,
    neutrinoPressure: (pressure * u4) / 3,
    curvature: model.curvature * u2,
    darkEnergy,
    darkEnergyPressure: darkEnergy * (model.onePlusW - 1 - model.wa / u),
  };
  return { ...parts, E2: parts.matter + parts.photons + parts.neutrinos + parts.curvature + darkEnergy };
}
