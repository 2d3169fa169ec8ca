import type { QuantityId } from '../cosmology/quantities.ts';
import type { Topic } from '../inputs/types.ts';
import type { Column } from './types.ts';

const UNITS: Readonly<Record<Topic, Readonly<Partial<Record<QuantityId, string>>>>> = {
  distances: {
    D_C_Mpc: 'Mpc',
    D_M_Mpc: 'Mpc',
    D_A_Mpc: 'Mpc',
    D_L_Mpc: 'Mpc',
    mu_mag: 'mag',
    kpc_per_arcsec: 'kpc/arcsec',
    V_C_Gpc3: 'Gpc3',
    dV_dz_Mpc3_per_deg2: 'Mpc3/deg2',
    D_V_Mpc: 'Mpc',
  },
  times: {
    a: '',
    t_Gyr: 'Gyr',
    t_L_Gyr: 'Gyr',
    eta_Gyr: 'Gyr',
    H_km_s_Mpc: 'km/s/Mpc',
    t_H_Gyr: 'Gyr',
    T_CMB_K: 'K',
    dz_dt_per_Gyr: '1/Gyr',
    dv_dt_cm_s_yr: 'cm/s/yr',
  },
  densities: {
    E: '',
    rho_c_kg_m3: 'kg/m3',
    rho_c_g_cm3: 'g/cm3',
    rho_c_Msun_Mpc3: 'Msun/Mpc3',
    Omega_bc: '',
    Omega_nu: '',
    Omega_gamma: '',
    Omega_DE: '',
    Omega_k: '',
    q: '',
    w_eff: '',
  },
  horizons: {
    D_H_Mpc: 'Mpc',
    particle_horizon_Mpc: 'Mpc',
    event_horizon_Mpc: 'Mpc',
    chi_Mpc: 'Mpc',
    v_rec_now_c: 'c',
    v_rec_then_c: 'c',
  },
};

/** All topics, in order of printing. */
export const TOPICS = Object.keys(UNITS) as readonly Topic[];

/** The columns of a topic after `z`, in order of printing. Units are plain text; "" is dimensionless. */
export function columnsOf(topic: Topic): readonly Column[] {
  return (Object.entries(UNITS[topic]) as [QuantityId, string][]).map(([id, unit]) => ({ id, topic, unit }));
}
