import { rowId } from '../addresses.ts';
import { realMinus } from '../writtenNumber.ts';
import type { ColumnView } from './columnViews.ts';
import { isRound } from './roundness.ts';
import { rowGroups } from './rowGroups.ts';

/** One line of a table, ready to print. */
export interface RowView {
  readonly id: string;
  /** The redshift, padded so that the points of a right-aligned column stand below each other. */
  readonly z: string;
  /** Set heavier. */
  readonly round: boolean;
  readonly cells: readonly string[];
}

/** As wide as a figure. */
const FIGURE_SPACE = '\u2007';
/** As wide as a point. */
const POINT_SPACE = '\u2008';

/** The rows of a table in their groups. */
export function rowViews(redshifts: readonly string[], columns: readonly ColumnView[]): RowView[][] {
  const decimals = Math.max(...redshifts.map(decimalsOf));
  return rowGroups(redshifts).map(({ start, end }) =>
    redshifts.slice(start, end).map((z, i) => ({
      id: rowId(z),
      z: padded(z, decimals),
      round: isRound(redshifts, start + i),
      cells: columns.map(({ cells }) => cells[start + i] ?? ''),
    })),
  );
}

function decimalsOf(z: string): number {
  return z.split('.')[1]?.length ?? 0;
}

function padded(z: string, decimals: number): string {
  const missing = decimals - decimalsOf(z);
  const point = decimals > 0 && !z.includes('.') ? POINT_SPACE : '';
  return realMinus(z) + point + FIGURE_SPACE.repeat(missing);
}
