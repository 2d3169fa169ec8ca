import type { IndexedSet, SearchIndex } from '../../src/site/searchIndexTypes.ts';

/** Redshifts in steps of 1/per, written with as many decimals as given. */
function steps(from: number, to: number, per: number, decimals: number): string[] {
  return Array.from({ length: (to - from) * per + 1 }, (_, n) => (from + n / per).toFixed(decimals));
}

function set(id: string, title: string, kind: string, parameters: IndexedSet['parameters'], age: string): IndexedSet {
  return {
    id,
    title,
    kind,
    parameters,
    milestones: { age_today: age, z_acceleration: '0.63', t_acceleration: '7.7', particle_horizon_today: '14153' },
  };
}

/** A small index: three grids, four sets, two editions; the older one has no horizons and only the coarse grid. */
export const sampleIndex: SearchIndex = {
  editions: [
    {
      number: '2026.1',
      title: 'First',
      state: 'draft',
      sets: [0, 1, 2, 3],
      grids: [0, 1, 2],
      topics: ['distances', 'times', 'densities', 'horizons'],
      missing: ['plain.distances.long'],
    },
    {
      number: '2025.2',
      title: 'Trial',
      state: 'released',
      sets: [0],
      grids: [0],
      topics: ['distances', 'times'],
      missing: [],
    },
  ],
  sets: [
    set(
      'planck-2018',
      'Planck 2018 base ΛCDM',
      'published',
      { H0: ['67.36', '0.54'], Omega_m: ['0.3153', '0.0073'] },
      '13.797',
    ),
    set(
      'planck-2015',
      'Planck 2015 base ΛCDM',
      'published',
      { H0: ['67.74', '0.46'], Omega_m: ['0.3089', '0.0062'] },
      '13.799',
    ),
    set('wmap-9', 'WMAP nine-year', 'published', { H0: ['69.32', '0.80'] }, '13.772'),
    set('plain', 'The 0.3/0.7/70 convention', 'textbook', { H0: ['70'], Omega_m: ['0.3'], w0: ['-1'] }, '13.467'),
  ],
  grids: [
    { id: 'reading', title: 'Reading grid', redshifts: steps(0, 10, 10, 1).join(' ') },
    { id: 'survey', title: 'Survey grid', redshifts: steps(0, 2, 100, 2).join(' ') },
    { id: 'long', title: 'Logarithmic grid', redshifts: '0.0001 0.001 0.01 0.1 0.5 1 10 100 1089.80 10000' },
  ],
  columns: [
    {
      id: 'D_L_Mpc',
      title: 'Luminosity distance',
      also: ['D_L', 'DL', 'photometric distance'],
      unit: 'Mpc',
      topic: 'distances',
    },
    { id: 'D_M_Mpc', title: 'Transverse comoving distance', also: ['D_M'], unit: 'Mpc', topic: 'distances' },
    { id: 'mu_mag', title: 'Distance modulus', also: ['DM', 'mu'], unit: 'mag', topic: 'distances' },
    {
      id: 'D_C_Mpc',
      title: 'Line-of-sight comoving distance',
      also: ['D_C', 'comoving distance'],
      unit: 'Mpc',
      topic: 'distances',
    },
    { id: 'a', title: 'Scale factor', also: ['a', 'a(t)'], unit: '', topic: 'times' },
    { id: 't_Gyr', title: 'Age', also: ['t', 'age of the universe', 'cosmic time'], unit: 'Gyr', topic: 'times' },
    { id: 'rho_c_kg_m3', title: 'Critical density', also: ['rho_c'], unit: 'kg/m3', topic: 'densities' },
    { id: 'rho_c_g_cm3', title: 'Critical density', also: ['rho_c'], unit: 'g/cm3', topic: 'densities' },
    { id: 'E', title: 'Expansion rate in units of today’s', also: ['E', 'E(z)'], unit: '', topic: 'densities' },
  ],
  milestones: [
    { id: 'particle_horizon_today', title: 'Particle horizon today', also: [], unit: 'Mpc' },
    { id: 'age_today', title: 'Age today', also: ['t_0', 'age of the universe'], unit: 'Gyr' },
    {
      id: 'z_equality',
      title: 'Redshift of matter-radiation equality',
      also: ['z_eq', 'matter-radiation equality'],
      unit: '',
    },
    {
      id: 'z_acceleration',
      title: 'Redshift at which acceleration begins',
      also: ['acceleration begins', 'acceleration'],
      unit: '',
    },
    {
      id: 't_acceleration',
      title: 'Age at which acceleration begins',
      also: ['acceleration begins', 'acceleration'],
      unit: 'Gyr',
    },
  ],
  parameters: [
    { id: 'H0', title: 'Hubble constant', also: ['H0', 'H_0'], unit: 'km/s/Mpc' },
    { id: 'Omega_m', title: 'Matter density', also: ['Omega_m'], unit: '' },
    { id: 'w0', title: 'Dark energy equation of state today', also: ['w0', 'w_0'], unit: '' },
  ],
};
