import type { MilestoneName } from '../cosmology/milestones.ts';
import type { Parameters } from '../cosmology/parameters.ts';

/** What milestones are asked for as, besides the names that the pages print. */
export const MILESTONE_SEARCH_NAMES: Readonly<Record<MilestoneName, readonly string[]>> = {
  hubble_time: ['Hubble time today'],
  hubble_distance: ['c/H0', 'Hubble distance', 'Hubble radius today', 'Hubble length'],
  critical_density_SI: ['critical density', 'critical density today', 'closure density', 'rho_c', 'rho_crit'],
  critical_density_cgs: ['critical density', 'critical density today', 'closure density', 'rho_c', 'rho_crit'],
  critical_density_Msun: ['critical density', 'critical density today', 'closure density', 'rho_c', 'rho_crit'],
  age_today: ['t0', 't_0', 'age', 'age today', 'age of the universe', 'how old', 'how old universe', 'present age'],
  z_equality: [
    'z_eq',
    'matter-radiation equality',
    'radiation-matter equality',
    'equality',
    'equal matter and radiation',
  ],
  t_equality: ['t_eq', 'matter-radiation equality', 'radiation-matter equality', 'equality', 'time of equality'],
  z_acceleration: [
    'z_acc',
    'acceleration',
    'acceleration begins',
    'acceleration starts',
    'onset of acceleration',
    'transition redshift',
  ],
  t_acceleration: ['t_acc', 'acceleration', 'acceleration begins', 'acceleration starts', 'onset of acceleration'],
  z_matter_DE_equality: [
    'matter-dark energy equality',
    'dark energy equality',
    'dark energy dominates',
    'matter-Lambda equality',
    'equality',
  ],
  t_matter_DE_equality: [
    'matter-dark energy equality',
    'dark energy equality',
    'dark energy dominates',
    'matter-Lambda equality',
    'equality',
  ],
  z_largest_D_A: [
    'largest angular diameter distance',
    'maximum D_A',
    'largest D_A',
    'smallest angular size',
    'turnover of D_A',
  ],
  largest_D_A: ['largest angular diameter distance', 'maximum D_A', 'largest D_A', 'smallest angular size'],
  z_recession_c: ['superluminal recession', 'faster than light', 'recession at the speed of light', 'Hubble sphere'],
  particle_horizon_today: [
    'particle horizon',
    'observable universe',
    'size of the observable universe',
    'radius of the observable universe',
  ],
  event_horizon_today: ['event horizon', 'reachable universe'],
  fate: [
    'end of the universe',
    'future',
    'fate of the universe',
    'recollapse',
    'expands forever',
    'big crunch',
    'big rip',
  ],
  t_maximum: ['maximum expansion', 'time of maximum', 'turnaround', 'recollapse'],
  t_crunch: ['crunch', 'big crunch', 'time of the crunch', 'recollapse'],
};

/** What parameters are asked for as. */
export const PARAMETER_SEARCH_NAMES: Readonly<Record<keyof Parameters, readonly string[]>> = {
  H0: ['H0', 'H_0', 'Hubble constant', 'Hubble parameter today', 'h'],
  Omega_m: ['Omega_m', 'Omega_matter', 'matter density', 'matter'],
  omega_b: ['omega_b', 'omega_b h2', 'Omega_b h2', 'baryon density', 'baryons'],
  omega_c: [
    'omega_c',
    'omega_c h2',
    'Omega_c h2',
    'omega_cdm',
    'cold dark matter density',
    'cold dark matter',
    'dark matter',
  ],
  Omega_k: ['Omega_k', 'curvature', 'curvature density'],
  Omega_DE: ['Omega_DE', 'Omega_Lambda', 'Omega_L', 'dark energy density', 'dark energy', 'cosmological constant'],
  w0: ['w0', 'w_0', 'w', 'equation of state', 'dark energy equation of state'],
  wa: ['wa', 'w_a', 'w0wa', 'w0 wa', 'evolving dark energy'],
  T_CMB: ['T_CMB', 'CMB temperature', 'temperature of the CMB'],
  N_eff: ['N_eff', 'Neff', 'number of neutrinos', 'effective number of neutrinos', 'neutrino species'],
  m_nu: ['m_nu', 'neutrino mass', 'sum of neutrino masses', 'neutrinos'],
};

/** Names of parameters where the name that the pages print leans on the line before it. */
export const PARAMETER_SEARCH_TITLES: Readonly<Partial<Record<keyof Parameters, string>>> = {
  Omega_m: 'Matter density',
  wa: 'Change of the dark energy equation of state',
};
