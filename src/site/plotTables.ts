import type { Topic } from '../inputs/types.ts';
import type { EditionTables, Table } from '../tables/types.ts';

/** The farthest redshift of a drawing over z that still leaves room for the near ones. */
const FARTHEST = 12;

/** The finest table of a set and topic that is fit to be drawn over z: from 0 to not too far. */
export function plotTable({ tables }: EditionTables, set: string, topic: Topic): Table | undefined {
  return tables
    .filter((table) => table.set.id === set && table.topic === topic)
    .filter(({ redshifts }) => Number(redshifts[0]) === 0 && reach(redshifts) <= FARTHEST)
    .toSorted((a, b) => b.redshifts.length - a.redshifts.length)[0];
}

function reach(redshifts: readonly string[]): number {
  return Number(redshifts.at(-1));
}

/** The values of a column, row by row; null where the quantity does not exist. */
export function columnValues({ columns, values }: Table, id: string): (number | null)[] {
  const at = columns.findIndex((column) => column.id === id);
  return values.map((row) => row[at] ?? null);
}
