import { rowId } from '../addresses.ts';
import { alignPoints } from '../alignPoints.ts';
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
  /** HTML. */
  readonly cells: readonly string[];
}

/** The rows of a table in their groups. */
export function rowViews(redshifts: readonly string[], columns: readonly ColumnView[]): RowView[][] {
  const aligned = alignPoints(redshifts.map(realMinus));
  return rowGroups(redshifts).map(({ start, end }) =>
    redshifts.slice(start, end).map((z, i) => ({
      id: rowId(z),
      z: aligned[start + i] ?? z,
      round: isRound(redshifts, start + i),
      cells: columns.map(({ printed }) => printed[start + i] ?? ''),
    })),
  );
}
