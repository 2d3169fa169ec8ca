/** Names of the single epochs and present-day values of a parameter set, in order of printing. */
export const MILESTONE_NAMES = [
  'hubble_time',
  'hubble_distance',
  'critical_density_SI',
  'critical_density_cgs',
  'critical_density_Msun',
  'age_today',
  'z_equality',
  't_equality',
  'z_acceleration',
  't_acceleration',
  'z_matter_DE_equality',
  't_matter_DE_equality',
  'z_largest_D_A',
  'largest_D_A',
  'z_recession_c',
  'particle_horizon_today',
  'event_horizon_today',
  'fate',
  't_maximum',
  't_crunch',
] as const;
export type MilestoneName = (typeof MILESTONE_NAMES)[number];
