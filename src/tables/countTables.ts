import type { EditionTables } from './types.ts';

/** How much was pressed. */
export interface TableCounts {
  /** Tables with a redshift column, and milestone tables. */
  readonly tables: number;
  readonly rows: number;
  /** Cells with and without a value, the redshift column included. */
  readonly cells: number;
  /** Cells, among them, whose digits the doubles left open and the audit settled. */
  readonly settled: number;
}

/** Counts tables, rows and cells over editions; a milestone table counts one cell per line. */
export function countTables(editions: readonly EditionTables[]): TableCounts {
  let tables = 0;
  let rows = 0;
  let cells = 0;
  let settled = 0;
  for (const pressed of editions) {
    tables += pressed.tables.length + pressed.milestones.length;
    for (const table of pressed.tables) {
      rows += table.redshifts.length;
      cells += table.redshifts.length * (table.columns.length + 1);
      settled += table.audited.reduce((sum, column) => sum + column.size, 0);
    }
    for (const { milestones } of pressed.milestones) {
      rows += milestones.length;
      cells += milestones.length;
      settled += milestones.filter(({ audited }) => audited !== undefined).length;
    }
  }
  return { tables, rows, cells, settled };
}
