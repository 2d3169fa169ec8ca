import type { Real } from '../../numerics/extended/real.ts';
import type { QuantityId } from '../quantities.ts';
import type { Needs } from './history.ts';
import type { Row } from './row.ts';
import { units } from './units.ts';

/** One column: which integrals it needs, and its value in the unit of its name; null where it does not exist. */
interface Column {
  readonly needs?: Partial<Needs>;
  readonly value: (row: Row) => Real | null;
}

const FROM_TODAY: Partial<Needs> = { fromToday: true };
const SINCE_BIG_BANG: Partial<Needs> = { sinceBigBang: true };

/** A column made of the integral of a moment, times a factor. */
function scaled(needs: Partial<Needs>, pick: (row: Row) => Real | null, factor: (row: Row) => Real): Column {
  return { needs, value: (row) => pick(row)?.times(factor(row)) ?? null };
}

const lineOfSight = scaled(
  FROM_TODAY,
  (row) => row.moment.comoving,
  (row) => row.model.hubbleDistance,
);

/** A column made of the transverse distance in Mpc. */
function fromTransverse(value: (distance: Real, row: Row) => Real | null): Column {
  return {
    needs: FROM_TODAY,
    value: (row) => (row.transverse === null ? null : value(row.transverse.times(row.model.hubbleDistance), row)),
  };
}

/** c/H in Mpc. */
const hubbleRadius = ({ E, model }: Row): Real | null => (E === null ? null : model.hubbleDistance.over(E));

/** E^2. */
function square({ E, model }: Row): Real {
  return E?.squared() ?? model.arithmetic.real(0);
}

function fraction(density: (row: Row) => Real): Column {
  return { value: (row) => (row.E === null ? null : density(row).over(square(row))) };
}

/** (1 + z) H0 - H(z) in 1/Gyr, seen today. Sandage (1962), ApJ 136, 319; Loeb (1998), astro-ph/9802122, eq. 3. */
function drift({ u, E, model }: Row): Real | null {
  return u.below(1) || E === null ? null : u.minus(E).over(model.hubbleTime);
}

/** Parsecs in a megaparsec over the 10 pc of the distance modulus. */
const MODULUS_UNITS = 1e5;
const CENTIMETRES_PER_KILOMETRE = 1e5;
const YEARS_PER_GIGAYEAR = 1e9;
const SQUARE_DEGREES_PER_STERADIAN_TIMES_PI_SQUARED = 180 * 180;

/**
 * Every column, from its definition. Hogg (1999), astro-ph/9905116: eqs. 15, 16, 18, 21, 25, 28, 30. D_V: Eisenstein et
 * al. (2005), ApJ 633, 560, eq. 2. Horizons, recession: Davis & Lineweaver (2004), astro-ph/0310808, appendix A.
 */
export const AUDITED_COLUMNS: Readonly<Record<QuantityId, Column>> = {
  D_C_Mpc: lineOfSight,
  D_M_Mpc: fromTransverse((distance) => distance),
  D_A_Mpc: fromTransverse((distance, { u }) => distance.over(u)),
  D_L_Mpc: fromTransverse((distance, { u }) => distance.times(u)),
  mu_mag: fromTransverse((distance, { u }) =>
    distance.sign() === 0 ? null : distance.times(u).times(MODULUS_UNITS).log10().times(5),
  ),
  kpc_per_arcsec: fromTransverse((distance, { u, model }) =>
    distance.over(u).times(units(model.arithmetic).arcsecond).times(1000),
  ),
  V_C_Gpc3: scaled(
    { fromToday: true, volume: true },
    (row) => row.moment.volume,
    (row) => row.model.hubbleDistance.over(1000).power(3),
  ),
  dV_dz_Mpc3_per_deg2: fromTransverse((distance, row) => {
    const pi = row.model.arithmetic.pi();
    const depth = hubbleRadius(row)?.times(pi.squared()).over(SQUARE_DEGREES_PER_STERADIAN_TIMES_PI_SQUARED);
    return depth?.times(distance.squared()) ?? null;
  }),
  D_V_Mpc: fromTransverse((distance, row) => hubbleRadius(row)?.times(distance.squared()).times(row.z).cbrt() ?? null),

  a: { value: ({ u }) => u.reciprocal() },
  t_Gyr: scaled(
    SINCE_BIG_BANG,
    (row) => row.moment.age,
    (row) => row.model.hubbleTime,
  ),
  t_L_Gyr: scaled(
    FROM_TODAY,
    (row) => row.moment.lookback,
    (row) => row.model.hubbleTime,
  ),
  eta_Gyr: scaled(
    SINCE_BIG_BANG,
    (row) => row.moment.conformalTime,
    (row) => row.model.hubbleTime,
  ),
  H_km_s_Mpc: { value: ({ E, model }) => E?.times(model.H0) ?? model.arithmetic.real(0) },
  t_H_Gyr: { value: ({ E, model }) => (E === null ? null : model.hubbleTime.over(E)) },
  T_CMB_K: { value: ({ u, model }) => (model.temperature.sign() === 0 ? null : model.temperature.times(u)) },
  dz_dt_per_Gyr: { value: drift },
  dv_dt_cm_s_yr: {
    value: (row) => {
      const speed = units(row.model.arithmetic).lightSpeed.times(CENTIMETRES_PER_KILOMETRE).over(YEARS_PER_GIGAYEAR);
      return drift(row)?.times(speed).over(row.u) ?? null;
    },
  },

  E: { value: ({ E, model }) => E ?? model.arithmetic.real(0) },
  rho_c_kg_m3: { value: (row) => row.model.criticalDensity.times(square(row)) },
  rho_c_g_cm3: { value: (row) => row.model.criticalDensity.times(square(row)).over(1000) },
  rho_c_Msun_Mpc3: { value: (row) => row.model.criticalDensityInSuns.times(square(row)) },
  Omega_bc: fraction((row) => row.contents.matter),
  Omega_nu: fraction((row) => row.contents.neutrinos),
  Omega_gamma: fraction((row) => row.contents.photons),
  Omega_DE: fraction((row) => row.contents.darkEnergy),
  Omega_k: fraction((row) => row.contents.curvature),
  q: fraction(({ fluids }) => fluids.density.plus(fluids.pressure.times(3)).over(2)),
  w_eff: {
    value: ({ fluids }) => (fluids.density.sign() === 0 ? null : fluids.pressure.over(fluids.density)),
  },

  D_H_Mpc: { value: hubbleRadius },
  particle_horizon_Mpc: scaled(
    SINCE_BIG_BANG,
    (row) => row.moment.conformalTime,
    (row) => row.model.hubbleDistance.over(row.u),
  ),
  event_horizon_Mpc: scaled(
    { untilEnd: true },
    (row) => row.moment.conformalFuture,
    (row) => row.model.hubbleDistance.over(row.u),
  ),
  chi_Mpc: lineOfSight,
  v_rec_now_c: { needs: FROM_TODAY, value: (row) => row.moment.comoving },
  v_rec_then_c: {
    needs: FROM_TODAY,
    value: ({ moment, E, u, model }) => moment.comoving?.times(E ?? model.arithmetic.real(0)).over(u) ?? null,
  },
};
