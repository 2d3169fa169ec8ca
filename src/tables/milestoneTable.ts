import type { Background } from '../cosmology/background.ts';
import { MILESTONE_NAMES, type MilestoneName } from '../cosmology/milestones.ts';
import { milestoneValues } from '../cosmology/milestoneValues.ts';
import type { ParameterSet } from '../inputs/types.ts';
import { csvCell } from './csvCell.ts';
import { csvText } from './csvText.ts';
import type { Milestone } from './types.ts';

/** Units of the milestones; "" for redshifts and words. */
const UNITS: Readonly<Record<MilestoneName, string>> = {
  hubble_time: 'Gyr',
  hubble_distance: 'Mpc',
  critical_density_SI: 'kg/m3',
  critical_density_cgs: 'g/cm3',
  critical_density_Msun: 'Msun/Mpc3',
  age_today: 'Gyr',
  z_equality: '',
  t_equality: 'Gyr',
  z_acceleration: '',
  t_acceleration: 'Gyr',
  z_matter_DE_equality: '',
  t_matter_DE_equality: 'Gyr',
  z_largest_D_A: '',
  largest_D_A: 'Mpc',
  z_recession_c: '',
  particle_horizon_today: 'Mpc',
  event_horizon_today: 'Mpc',
  fate: '',
  t_maximum: 'Gyr',
  t_crunch: 'Gyr',
};

/** The milestones of one parameter set and their CSV with columns name, value, u, unit; u is blank where none is given. */
export function milestoneTable(
  set: ParameterSet,
  model: Background,
  digits: number,
): { id: string; set: ParameterSet; milestones: readonly Milestone[]; csv: string } {
  const values = milestoneValues(model);
  const milestones = MILESTONE_NAMES.map((name) => ({ name, value: values[name], unit: UNITS[name] }));
  const rows = milestones.map(({ name, value, unit }) => [
    name,
    typeof value === 'string' ? value : csvCell(value, digits),
    '',
    unit,
  ]);
  return { id: `${set.id}.milestones`, set, milestones, csv: csvText(['name', 'value', 'u', 'unit'], rows) };
}
