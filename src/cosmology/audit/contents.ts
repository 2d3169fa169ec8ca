import type { Real } from '../../numerics/extended/real.ts';
import type { Model } from './model.ts';
import { relicEnergy, relicPressure } from './relic.ts';

/** Densities at 1 + z = u over the critical density of today. */
export interface Contents {
  readonly matter: Real;
  readonly photons: Real;
  /** All neutrinos. */
  readonly neutrinos: Real;
  /** Those with mass. */
  readonly massiveNeutrinos: Real;
  readonly curvature: Real;
  readonly darkEnergy: Real;
}

/**
 * Dark energy over its density today: u^(3(1+w0+wa)) exp(-3 wa z/(1+z)).
 *
 * Source: Chevallier & Polarski (2001), gr-qc/0009008; Linder (2003), astro-ph/0208512, with 1 - a = z/(1+z).
 */
function darkEnergyGrowth({ arithmetic, darkPower, wa }: Model, u: Real): Real {
  if (darkPower.sign() === 0 && wa.sign() === 0) return arithmetic.real(1);
  const fading = wa.times(u.minus(1)).over(u).times(3);
  return u.ln().times(darkPower).minus(fading).exp();
}

/** The components of the universe at 1 + z = u; their sum is E^2, the square of H/H0. */
export function contents(model: Model, u: Real): Contents {
  const { arithmetic } = model;
  const fourth = u.power(4);
  let massive = arithmetic.real(0);
  for (const { relativistic, y0 } of model.eigenstates)
    massive = massive.plus(relicEnergy(arithmetic, y0.over(u)).times(relativistic));
  const massiveNeutrinos = massive.times(fourth);
  const none = model.darkEnergy.sign() === 0;
  return {
    matter: model.matter.times(u.power(3)),
    photons: model.photons.times(fourth),
    neutrinos: model.massless.times(fourth).plus(massiveNeutrinos),
    massiveNeutrinos,
    curvature: model.curvature.times(u.squared()),
    darkEnergy: none ? model.darkEnergy : model.darkEnergy.times(darkEnergyGrowth(model, u)),
  };
}

/** Pressures at 1 + z = u in the same unit, times c^-2: photons a third of their density, dark energy w(a) times its. */
export function pressures(model: Model, u: Real, { photons, darkEnergy }: Contents) {
  const { arithmetic } = model;
  let neutrinos = model.massless;
  for (const { relativistic, y0 } of model.eigenstates)
    neutrinos = neutrinos.plus(relicPressure(arithmetic, y0.over(u)).times(relativistic));
  const w = model.w0.plus(model.wa.times(u.minus(1)).over(u));
  return { photons: photons.over(3), neutrinos: neutrinos.times(u.power(4)).over(3), darkEnergy: darkEnergy.times(w) };
}

/** E^2 = (H/H0)^2 at 1 + z = u. Friedmann's equation: Hogg (1999), astro-ph/9905116, eq. 14, with all components. */
export function expansionSquared(model: Model, u: Real): Real {
  const [result] = model.arithmetic.scope<[Real]>(() => {
    const { matter, photons, neutrinos, curvature, darkEnergy } = contents(model, u);
    return [matter.plus(photons).plus(neutrinos).plus(curvature).plus(darkEnergy)];
  });
  return result;
}
