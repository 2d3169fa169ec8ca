import type { Background } from './background.ts';
import { ARCSECOND, GRAVITATION, MEGAPARSEC, SOLAR_GM, SPEED_OF_LIGHT } from './constants.ts';
import { transverseFactor, volumeFactor } from './curvature.ts';
import type { Epoch } from './epochs.ts';
import { redshiftDrift } from './redshiftDrift.ts';

/** A column: its value at an epoch of a model in the unit of its name, or null where it does not exist. */
export type Quantity = (model: Background, epoch: Epoch) => number | null;

const times = (value: number | null, factor: number): number | null => (value === null ? null : value * factor);
const over = (value: number, divisor: number): number | null => (divisor === 0 ? null : value / divisor);

/** One square degree, sr. */
const SQUARE_DEGREE = (Math.PI / 180) * (Math.PI / 180);
const DEKAPARSECS_PER_MEGAPARSEC = 1e5;
const CENTIMETRES = 1e5;
const GIGAYEARS_TO_YEARS = 1e-9;

const lineOfSight: Quantity = (model, { comoving }) => times(comoving, model.hubbleDistance);

/** Omega_k (D_C/D_H)^2: the square of the comoving distance over the radius of curvature, negative in closed space. */
export function curvatureArgument(model: Background, comoving: number): number {
  return model.curvature * comoving * comoving;
}

const transverse: Quantity = (model, { comoving }) =>
  comoving === null
    ? null
    : Math.abs(transverseFactor(curvatureArgument(model, comoving))) * comoving * model.hubbleDistance;

const hubbleDistance: Quantity = (model, { E }) => over(model.hubbleDistance, E);

/** Critical density today, 3 H0^2/(8 pi G), kg/m3. */
export function criticalDensity(model: Background): number {
  const rate = model.H0 / MEGAPARSEC;
  return (3 * rate * rate) / (8 * Math.PI * GRAVITATION);
}

/** The same as 3 H0^2/(8 pi (GM)_sun), solar masses per Mpc3: free of the uncertainty of G. */
export function criticalDensityInSuns(model: Background): number {
  const velocity = model.H0 * 1e3;
  return (3 * velocity * velocity * (MEGAPARSEC * 1e3)) / (8 * Math.PI * SOLAR_GM);
}

/**
 * Every column of design topics `distances`, `times`, `densities` and `horizons`, by its id.
 *
 * Distances, volumes: Hogg (1999), astro-ph/9905116, eqs. 15, 16, 18, 21, 25, 28, 29; D_V: Eisenstein et al. (2005),
 * ApJ 633, 560, eq. 2; horizons and recession: Davis & Lineweaver (2004), astro-ph/0310808, appendix A; drift: see
 * redshiftDrift. Lengths in Mpc, times in Gyr.
 */
export const QUANTITIES = {
  D_C_Mpc: lineOfSight,
  D_M_Mpc: transverse,
  D_A_Mpc: (model, epoch) => times(transverse(model, epoch), 1 / epoch.u),
  D_L_Mpc: (model, epoch) => times(transverse(model, epoch), epoch.u),
  mu_mag: (model, epoch) => {
    const distance = transverse(model, epoch);
    return distance ? 5 * Math.log10(distance * epoch.u * DEKAPARSECS_PER_MEGAPARSEC) : null;
  },
  kpc_per_arcsec: (model, epoch) => times(transverse(model, epoch), (1e3 * ARCSECOND) / epoch.u),
  V_C_Gpc3: (model, { comoving }) => {
    if (comoving === null) return null;
    const distance = (comoving * model.hubbleDistance) / 1e3;
    return ((4 * Math.PI) / 3) * distance * distance * distance * volumeFactor(curvatureArgument(model, comoving));
  },
  dV_dz_Mpc3_per_deg2: (model, epoch) => {
    const distance = transverse(model, epoch);
    const depth = hubbleDistance(model, epoch);
    return distance === null || depth === null ? null : distance * distance * depth * SQUARE_DEGREE;
  },
  D_V_Mpc: (model, epoch) => {
    const distance = transverse(model, epoch);
    const depth = hubbleDistance(model, epoch);
    return distance === null || depth === null ? null : Math.cbrt(epoch.z * distance * distance * depth);
  },

  a: (_, { u }) => 1 / u,
  t_Gyr: (model, { age }) => times(age, model.hubbleTime),
  t_L_Gyr: (model, { lookback }) => times(lookback, model.hubbleTime),
  eta_Gyr: (model, { conformalTime }) => times(conformalTime, model.hubbleTime),
  H_km_s_Mpc: (model, { E }) => model.H0 * E,
  t_H_Gyr: (model, { E }) => over(model.hubbleTime, E),
  T_CMB_K: (model, { u }) => (model.temperature === 0 ? null : model.temperature * u),
  dz_dt_per_Gyr: (model, epoch) => times(redshiftDrift(model, epoch), 1 / model.hubbleTime),
  dv_dt_cm_s_yr: (model, epoch) =>
    times(
      redshiftDrift(model, epoch),
      (SPEED_OF_LIGHT * CENTIMETRES * GIGAYEARS_TO_YEARS) / (model.hubbleTime * epoch.u),
    ),

  E: (_, { E }) => E,
  rho_c_kg_m3: (model, { E }) => criticalDensity(model) * E * E,
  rho_c_g_cm3: (model, { E }) => (criticalDensity(model) * E * E) / 1e3,
  rho_c_Msun_Mpc3: (model, { E }) => criticalDensityInSuns(model) * E * E,
  Omega_bc: (_, { densities, E }) => over(densities.matter, E * E),
  Omega_nu: (_, { densities, E }) => over(densities.neutrinos, E * E),
  Omega_gamma: (_, { densities, E }) => over(densities.photons, E * E),
  Omega_DE: (_, { densities, E }) => over(densities.darkEnergy, E * E),
  Omega_k: (_, { densities, E }) => over(densities.curvature, E * E),
  q: (_, { densities: d, E }) =>
    over(
      d.matter / 2 + d.photons + (d.neutrinos + 3 * d.neutrinoPressure + d.darkEnergy + 3 * d.darkEnergyPressure) / 2,
      E * E,
    ),
  w_eff: (_, { densities: d }) =>
    over(d.photons / 3 + d.neutrinoPressure + d.darkEnergyPressure, d.matter + d.photons + d.neutrinos + d.darkEnergy),

  D_H_Mpc: hubbleDistance,
  particle_horizon_Mpc: (model, { conformalTime, u }) => times(conformalTime, model.hubbleDistance / u),
  event_horizon_Mpc: (model, { conformalFuture, u }) => times(conformalFuture, model.hubbleDistance / u),
  chi_Mpc: lineOfSight,
  v_rec_now_c: (_, { comoving }) => comoving,
  v_rec_then_c: (_, { comoving, E, u }) => times(comoving, E / u),
} satisfies Record<string, Quantity>;

/** Column id of a quantity, e.g. `D_L_Mpc`; the redshift itself is not among them. */
export type QuantityId = keyof typeof QUANTITIES;
