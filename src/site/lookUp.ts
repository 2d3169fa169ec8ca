import type { MilestoneName } from '../cosmology/milestones.ts';
import type { ParameterSet, Topic } from '../inputs/types.ts';
import type { EditionTables, Milestone, MilestoneTable, Stamp, Table } from '../tables/types.ts';

/** The parameter sets of an edition, in its order. */
export function setsOf({ milestones }: EditionTables): ParameterSet[] {
  return milestones.map(({ set }) => set);
}

/** The milestones of a set. Throws if the edition does not have the set. */
export function milestonesOf({ edition, milestones }: EditionTables, set: string): MilestoneTable {
  const found = milestones.find((table) => table.set.id === set);
  if (!found) throw new Error(`Edition ${edition.number} has no parameter set ${set}.`);
  return found;
}

export function milestone(table: MilestoneTable, name: MilestoneName): Milestone | undefined {
  return table.milestones.find((one) => one.name === name);
}

/** Present densities that follow from the parameters of a set, as its tables are stamped. */
export function derivedOf({ tables }: EditionTables, set: string): Stamp['derived'] {
  return tables.find((table) => table.set.id === set)?.stamp.derived ?? [];
}

/** The tables of one set and topic, one for each grid. */
export function tablesOf({ tables }: EditionTables, set: string, topic: Topic): Table[] {
  return tables.filter((table) => table.set.id === set && table.topic === topic);
}

/** The value of a column at a redshift, from the first grid that has it; undefined if none does, null if it does not exist. */
export function valueAt(tables: readonly Table[], column: string, z: number): number | null | undefined {
  for (const { redshifts, columns, values } of tables) {
    const row = redshifts.findIndex((redshift) => Number(redshift) === z);
    const at = columns.findIndex(({ id }) => id === column);
    if (row >= 0 && at >= 0) return values[row]?.[at] ?? null;
  }
  return undefined;
}
