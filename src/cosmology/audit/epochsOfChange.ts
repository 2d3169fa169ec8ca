import type { Real } from '../../numerics/extended/real.ts';
import { root } from '../../numerics/extended/root.ts';
import { contents, pressures } from './contents.ts';
import type { Model } from './model.ts';
import type { Turns } from './turns.ts';

/** ln(1+z) at which a search begins and ends, unless a turning point lies nearer: e^60 is far beyond the Planck era. */
const FARTHEST = 60;
const STEP = 1 / 32;

/** 1 + z at the first epoch in time where f goes from positive to negative, in the past or the future; null for none. */
function firstFall(model: Model, { bounce, maximum }: Turns, f: (u: Real) => Real): Real | null {
  const { arithmetic } = model;
  const place = (x: number) => arithmetic.real(x).exp();
  const end = maximum === null ? -FARTHEST : Math.log(maximum.toNumber());
  let x = bounce === null ? FARTHEST : Math.log(bounce.toNumber());
  let sign = 0;
  for (; x > end; x -= STEP) {
    const next = arithmetic.forget(() => f(place(x)).sign());
    if (sign > 0 && next <= 0) return root(arithmetic, f, place(x), place(x + STEP));
    sign = next;
  }
  return null;
}

/**
 * 1 + z at the equality of matter and radiation as papers on the CMB define it: baryons and cold dark matter against
 * photons and all N_eff as if massless. Source: Planck Collaboration VI (2020), A&A 641, A6, table 2. Null for an epoch
 * that never was or will be.
 */
export function matterRadiationEquality({ matter, photons, allMassless }: Model, turns: Turns): Real | null {
  const radiation = photons.plus(allMassless);
  if (radiation.sign() <= 0 || matter.sign() <= 0) return null;
  const u = matter.over(radiation);
  const never = (turns.bounce?.below(u) ?? false) || (turns.maximum !== null && u.below(turns.maximum));
  return never ? null : u;
}

/** 1 + z where the deceleration first falls through zero: rho + 3p of all that is in the universe. */
export function accelerationOnset(model: Model, turns: Turns): Real | null {
  return firstFall(model, turns, (u) => {
    const here = contents(model, u);
    const p = pressures(model, u, here);
    const density = here.matter.plus(here.photons).plus(here.neutrinos).plus(here.darkEnergy);
    return p.photons.plus(p.neutrinos).plus(p.darkEnergy).times(3).plus(density);
  });
}

/** 1 + z where dark energy first overtakes matter with massive neutrinos. */
export function matterDarkEnergyEquality(model: Model, turns: Turns): Real | null {
  if (model.darkEnergy.sign() <= 0) return null;
  return firstFall(model, turns, (u) => {
    const { matter, massiveNeutrinos, darkEnergy } = contents(model, u);
    return matter.plus(massiveNeutrinos).minus(darkEnergy);
  });
}
