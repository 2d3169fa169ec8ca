import type { Background } from './background.ts';
import type { Epoch } from './epochs.ts';
import { relicEnergyChange } from './relicEnergyChange.ts';
import { relicNeutrino } from './relicNeutrinos.ts';

/**
 * Drift of the redshift of a comoving source as seen today, (1+z) - E(z), in H0; null for the future.
 *
 * Evaluated as ((1+z)^2 - E^2)/((1+z) + E) with the sum of all densities being 1, so that curvature drops out and each
 * other term is a difference that needs no cancellation for z -> 0.
 *
 * Source: Sandage (1962), ApJ 136, 319; Loeb (1998), astro-ph/9802122.
 */
export function redshiftDrift(model: Background, { z, u, E, lookback }: Epoch): number | null {
  if (lookback === null) return null;
  const square = u * u;
  const double = z * (2 + z);
  const difference =
    -model.matter * square * z -
    (model.photons + model.masslessNeutrinos) * square * double +
    massiveChange(model, z) * square +
    model.darkEnergy * (double - darkEnergyChange(model, z, u));
  return difference / (u + E);
}

/** Present density of the massive neutrinos less that at z over (1+z)^2. */
function massiveChange(model: Background, z: number): number {
  let change = 0;
  for (const { relativistic, y0 } of model.massiveNeutrinos) {
    const square = (1 + z) * (1 + z);
    const today = relicNeutrino(y0).energy;
    // For small z as a sum of two small changes, otherwise as it stands: each form cancels where the other does not.
    change +=
      relativistic *
      (z < 1
        ? -relicEnergyChange(y0, -Math.log1p(z)) * square - today * z * (2 + z)
        : today - relicNeutrino(y0 / (1 + z)).energy * square);
  }
  return change;
}

/** Dark energy density over that of today, less one. */
function darkEnergyChange(model: Background, z: number, u: number): number {
  return Math.expm1(3 * (model.onePlusW * Math.log1p(z) - (model.wa * z) / u));
}
