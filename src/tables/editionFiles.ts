import type { EditionTables } from './types.ts';

/** A CSV file of an edition. */
export interface EditionFile {
  /** File name without `.csv`. */
  readonly id: string;
  readonly csv: string;
}

/** The CSV files of an edition: tables, the uncertainties of those that have any, and milestones. */
export function editionFiles({ tables, milestones }: EditionTables): readonly EditionFile[] {
  return [
    ...tables.flatMap(({ id, csv, uncertaintyCsv }) =>
      uncertaintyCsv === null
        ? [{ id, csv }]
        : [
            { id, csv },
            { id: `${id}.u`, csv: uncertaintyCsv },
          ],
    ),
    ...milestones.map(({ id, csv }) => ({ id, csv })),
  ];
}
