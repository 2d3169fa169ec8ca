import { realMinus } from '../../site/writtenNumber.ts';
import type { Parts } from './parts.ts';
import type { Range } from './rangeOf.ts';

/** Hides the rows outside a range, and groups of five that are left empty. */
export function showRange({ table, rows }: Parts, { start, end }: Range): void {
  rows.forEach(({ element }, n) => {
    element.hidden = n < start || n >= end;
  });
  for (const group of table.tBodies) group.hidden = Array.from(group.rows).every((row) => row.hidden);
}

/** "51 of 301 rows, z from 0.50 to 1.00"; "301 rows" when all are shown. */
export function countRows({ rows }: Parts, { start, end }: Range): string {
  const shown = end - start;
  const written = (row: number): string => realMinus(rows[row]?.written ?? '');
  if (shown === rows.length) return `${rows.length} rows`;
  if (shown <= 0) return `No row in this range; the table has ${rows.length}`;
  return `${shown} of ${rows.length} rows, z from ${written(start)} to ${written(end - 1)}`;
}
