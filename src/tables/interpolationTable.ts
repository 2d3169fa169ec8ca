import { csvCell } from './csvCell.ts';
import { csvText } from './csvText.ts';
import type { ColumnInterpolation, LargestError, TableInterpolation } from './interpolationTypes.ts';
import { roundedUp } from './roundedUp.ts';
import type { Column } from './types.ts';

/** Significant digits of an error, rounded up. */
export const ERROR_DIGITS = 2;
/** Significant digits of the redshift where it is: enough to tell the interval. */
export const PLACE_DIGITS = 4;

const HEADER = [
  'column',
  'linear_relative',
  'linear_z',
  'lagrange_relative',
  'lagrange_z',
  'linear_absolute',
  'lagrange_absolute',
];

/** The interpolation errors of one table, given those of all columns on its grid. */
export function interpolationTable(
  found: readonly ColumnInterpolation[],
  columns: readonly Column[],
): TableInterpolation {
  const interpolation = columns.flatMap(({ id }) => found.filter(({ column }) => column === id));
  const rows = interpolation.map(({ column, linear, lagrange }) => [
    column,
    ...relativeCells(linear),
    ...relativeCells(lagrange),
    absoluteCell(linear),
    absoluteCell(lagrange),
  ]);
  return { interpolation, interpolationCsv: csvText(HEADER, rows) };
}

/** The largest relative error and its place; blank where nothing can be interpolated. */
function relativeCells(error: LargestError | null): readonly string[] {
  return error === null ? ['', ''] : [roundedUp(error.relative, ERROR_DIGITS), csvCell(error.z, PLACE_DIGITS)];
}

function absoluteCell(error: LargestError | null): string {
  return error === null ? '' : roundedUp(error.absolute, ERROR_DIGITS);
}
