import type { Background } from '../cosmology/background.ts';
import { milestoneBounds } from '../cosmology/milestoneBounds.ts';
import { MILESTONE_NAMES, type MilestoneName } from '../cosmology/milestones.ts';
import { milestoneValues } from '../cosmology/milestoneValues.ts';
import type { Propagation } from '../cosmology/propagation.ts';
import type { ParameterSet } from '../inputs/types.ts';
import { csvCell } from './csvCell.ts';
import { csvText } from './csvText.ts';
import { milestoneUncertainty } from './milestoneUncertainty.ts';
import { settleMilestones } from './settleMilestones.ts';
import type { MilestoneTable } from './types.ts';
import { uncertaintyCell } from './uncertaintyCell.ts';

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

/**
 * The milestones of one parameter set and their CSV with columns name, value, u, unit; u is blank where none is given.
 * Values that lie too near a rounding boundary are settled by the audit.
 */
export async function milestoneTable(
  set: ParameterSet,
  model: Background,
  digits: number,
  found: Propagation | null,
): Promise<Omit<MilestoneTable, 'checksum'>> {
  const values = milestoneValues(model);
  const audited = await settleMilestones(set.parameters, values, milestoneBounds(model, values), digits);
  const { of: u, nonlinear } = milestoneUncertainty(found);
  const milestones = MILESTONE_NAMES.map((name) => ({
    name,
    value: values[name],
    u: u(name),
    unit: UNITS[name],
    audited: audited(name),
  }));
  const rows = milestones.map(({ name, value, u, unit, audited: text }) => [
    name,
    typeof value === 'string' ? value : csvCell(value, digits, text),
    uncertaintyCell(u),
    unit,
  ]);
  return { id: `${set.id}.milestones`, set, milestones, nonlinear, csv: csvText(['name', 'value', 'u', 'unit'], rows) };
}
