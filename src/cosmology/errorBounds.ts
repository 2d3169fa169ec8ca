import type { Background } from './background.ts';
import type { Epoch } from './epochs.ts';
import type { IntegralErrors } from './integralErrors.ts';
import { curvatureArgument, type QuantityId } from './quantities.ts';
import { type RateErrors, rateErrors } from './rateErrors.ts';

/** The unit of all error counts here: half a unit in the last place of 1. */
export const UNIT_ROUNDOFF = Number.EPSILON / 2;

/** Everything that the bound of a column is made of, in units of the unit roundoff. */
interface Errors {
  readonly model: Background;
  readonly epoch: Epoch;
  readonly value: number;
  /** Of 1 + z. */
  readonly u: number;
  readonly rate: RateErrors;
  readonly E: number;
  readonly integral: IntegralErrors;
}

/** Error in units of the unit roundoff times the column's own unit. */
type Bound = (errors: Errors) => number;

/** c/H0: two roundings; 1/H0 in Gyr: pi, the au and the year besides. */
const HUBBLE_DISTANCE = 2;
const HUBBLE_TIME = 9;
/** 3 H0^2/(8 pi G) in either unit. */
const CRITICAL_DENSITY = 22;

const relative =
  (count: (errors: Errors) => number): Bound =>
  (errors) =>
    Math.abs(errors.value) * count(errors);

/** Omega_k (D_C/D_H)^2, its root, and how strongly D_M follows D_C: r cot r or r coth r. */
function bending({ model, epoch, integral }: Errors) {
  const x = curvatureArgument(model, epoch.comoving ?? 0);
  const r = Math.sqrt(Math.abs(x));
  const follow = x === 0 ? 1 : x > 0 ? r / Math.tanh(r) : Math.max(1, Math.abs(r / Math.tan(r)));
  return { r, follow, curvature: x === 0 ? 0 : model.errors.curvature + 2, distance: integral.distance };
}

/** D_M: what it inherits from D_C and from Omega_k, and its own function. */
const transverse = (errors: Errors): number => {
  const { r, follow, curvature, distance } = bending(errors);
  return follow * (distance + 3) + (Math.min(r * r, r + follow) / 2) * curvature + 8;
};

/** V_C grows at most as the cube of D_C, or as exp(2r) in open space. */
const volume = (errors: Errors): number => {
  const { r, curvature, distance } = bending(errors);
  return (3 + 2 * r) * (distance + 3) + Math.min(r * r, 1 + r) * curvature + 24;
};

/** 5 log10(D_L): absolute in the relative error of D_L, and the rounding of the logarithm. */
const modulus: Bound = (errors) => 2.2 * (transverse(errors) + errors.u + 4) + 3 * Math.abs(errors.value);

/** ((1+z)^2 - E^2)/((1+z) + E) in units of the column: the errors of its terms over what they add up to. */
const drift: Bound = (errors) => {
  const { model, epoch, value, u, rate } = errors;
  const d = epoch.densities;
  const square = epoch.u * epoch.u;
  const growth = epoch.z * (2 + epoch.z);
  const dark = model.darkEnergy * growth;
  const terms =
    model.matter * square * epoch.z * (rate.matter + 8) +
    (d.photons + d.neutrinos) * Math.min(1, 2 * epoch.z) * (rate.neutrinos + 8) +
    (Math.abs(dark) + Math.abs(d.darkEnergy - model.darkEnergy)) * (rate.darkEnergy + 8) +
    4 * (square - 1);
  const sum = Math.abs((epoch.u - epoch.E) * (epoch.u + epoch.E));
  const scale = sum === 0 ? 0 : Math.abs(value) / sum;
  return scale * terms + Math.abs(value) * (u + errors.E + HUBBLE_TIME + 8);
};

/** A fraction of E^2. */
const fraction = (part: (rate: RateErrors) => number): Bound => relative(({ rate }) => part(rate) + rate.E2 + 4);

/** Terms of the deceleration and of the pressure, each with the error of its density and of its pressure. */
function pressureTerms({ model, epoch, rate }: Errors): { all: number; pressure: number; density: number } {
  const d = epoch.densities;
  const wa = Math.abs(model.wa / epoch.u);
  const darkPressure = (Math.abs(model.onePlusW) + 1 + wa) * Math.abs(d.darkEnergy) * (rate.darkEnergy + 8);
  const radiation = d.photons * (rate.photons + 4) + d.neutrinos * (rate.neutrinos + 8);
  const density = d.matter * (rate.matter + 4) + radiation + Math.abs(d.darkEnergy) * (rate.darkEnergy + 4);
  return { all: density + 1.5 * darkPressure + radiation, pressure: radiation + darkPressure, density };
}

const deceleration: Bound = (errors) =>
  pressureTerms(errors).all / (errors.epoch.E * errors.epoch.E) + Math.abs(errors.value) * (errors.rate.E2 + 6);

const totalPressure: Bound = (errors) => {
  const d = errors.epoch.densities;
  const total = Math.abs(d.matter + d.photons + d.neutrinos + d.darkEnergy);
  const { pressure, density } = pressureTerms(errors);
  return (pressure + Math.abs(errors.value) * density) / total + 6 * Math.abs(errors.value);
};

/** One for each column; derived from the formulas of `QUANTITIES`, one unit for each rounding. */
const BOUNDS: Readonly<Record<QuantityId, Bound>> = {
  D_C_Mpc: relative(({ integral }) => integral.distance + HUBBLE_DISTANCE + 1),
  D_M_Mpc: relative((e) => transverse(e) + HUBBLE_DISTANCE),
  D_A_Mpc: relative((e) => transverse(e) + HUBBLE_DISTANCE + e.u + 2),
  D_L_Mpc: relative((e) => transverse(e) + HUBBLE_DISTANCE + e.u + 2),
  mu_mag: modulus,
  kpc_per_arcsec: relative((e) => transverse(e) + HUBBLE_DISTANCE + e.u + 6),
  V_C_Gpc3: relative((e) => volume(e) + 3 * HUBBLE_DISTANCE),
  dV_dz_Mpc3_per_deg2: relative((e) => 2 * transverse(e) + e.E + 3 * HUBBLE_DISTANCE + 12),
  D_V_Mpc: relative((e) => (2 * transverse(e) + e.E) / 3 + HUBBLE_DISTANCE + 4),

  a: relative(({ u }) => u + 1),
  t_Gyr: relative(({ integral }) => integral.age + HUBBLE_TIME),
  t_L_Gyr: relative(({ integral }) => integral.distance + HUBBLE_TIME),
  eta_Gyr: relative(({ integral }) => integral.conformalTime + HUBBLE_TIME),
  H_km_s_Mpc: relative(({ E }) => E + 2),
  t_H_Gyr: relative(({ E }) => E + HUBBLE_TIME + 1),
  T_CMB_K: relative(({ u }) => u + 2),
  dz_dt_per_Gyr: drift,
  dv_dt_cm_s_yr: (e) => drift(e) + Math.abs(e.value) * (e.u + 6),

  E: relative(({ E }) => E),
  rho_c_kg_m3: relative(({ E }) => 2 * E + CRITICAL_DENSITY),
  rho_c_g_cm3: relative(({ E }) => 2 * E + CRITICAL_DENSITY + 1),
  rho_c_Msun_Mpc3: relative(({ E }) => 2 * E + CRITICAL_DENSITY),
  Omega_bc: fraction((rate) => rate.matter),
  Omega_nu: fraction((rate) => rate.neutrinos),
  Omega_gamma: fraction((rate) => rate.photons),
  Omega_DE: fraction((rate) => rate.darkEnergy),
  Omega_k: fraction((rate) => rate.curvature),
  q: deceleration,
  w_eff: totalPressure,

  D_H_Mpc: relative(({ E }) => E + HUBBLE_DISTANCE + 1),
  particle_horizon_Mpc: relative(({ integral, u }) => integral.conformalTime + u + 6),
  event_horizon_Mpc: relative(({ integral, u }) => integral.conformalFuture + u + 6),
  chi_Mpc: relative(({ integral }) => integral.distance + HUBBLE_DISTANCE + 1),
  v_rec_now_c: relative(({ integral }) => integral.distance),
  v_rec_then_c: relative(({ integral, u, E }) => integral.distance + u + E + 2),
};

/** Columns at one epoch with their bounds. */
export interface ErrorBounds {
  /** Bound on |value - truth| of a column's double value, in the column's unit; 0 for an exact zero. */
  of(id: QuantityId, value: number): number;
}

/** The bounds of all columns at an epoch, given the errors of its integrals. */
export function errorBounds(model: Background, epoch: Epoch, integral: IntegralErrors): ErrorBounds {
  // z itself is the nearest double to its decimal; for the future 1 + z is a difference that shows it.
  const u = epoch.z < 0 ? 1 + -epoch.z / epoch.u : 2;
  const rate = rateErrors(model, epoch.densities, epoch.u, u);
  const E = rate.E2 / 2 + 1;
  return {
    of: (id, value) =>
      value === 0 && epoch.E > 0 ? 0 : UNIT_ROUNDOFF * BOUNDS[id]({ model, epoch, value, u, rate, E, integral }),
  };
}
