import type { EditionTables, Table } from './types.ts';

/** A CSV file of an edition. */
export interface EditionFile {
  /** File name without `.csv`. */
  readonly id: string;
  readonly csv: string;
}

/** The CSV files of an edition: tables, what goes with them, and milestones. */
export function editionFiles({ tables, milestones }: EditionTables): readonly EditionFile[] {
  return [...tables.flatMap(tableFiles), ...milestones.map(({ id, csv }) => ({ id, csv }))];
}

/** A table, the uncertainties of its cells if it has any, and the errors of interpolating between its rows. */
function tableFiles({ id, csv, uncertaintyCsv, interpolationCsv }: Table): readonly EditionFile[] {
  const uncertainty = uncertaintyCsv === null ? [] : [{ id: `${id}.u`, csv: uncertaintyCsv }];
  return [{ id, csv }, ...uncertainty, { id: `${id}.interpolation`, csv: interpolationCsv }];
}
