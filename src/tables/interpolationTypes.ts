import type { QuantityId } from '../cosmology/quantities.ts';

/** How far interpolation between the rows of a table can be off, at most; the rounding of the cells is counted in. */
export interface LargestError {
  /** Over the true value; see `interpolationErrors` for where that is zero. */
  readonly relative: number;
  /** The redshift of the largest relative error; that of a row if the error grows all the way towards that row. */
  readonly z: number;
  /** The largest error anywhere between the rows in the unit of the column; not necessarily at `z`. */
  readonly absolute: number;
}

/** What interpolating a column in z is worth; null where no two neighbouring rows have a value. */
export interface ColumnInterpolation {
  readonly column: QuantityId;
  readonly linear: LargestError | null;
  /** Cubic through the four rows nearest around the interval. */
  readonly lagrange: LargestError | null;
}

/** What a table says of the space between its rows. */
export interface TableInterpolation {
  /** One for each column. */
  readonly interpolation: readonly ColumnInterpolation[];
  /** The file `<set>.<topic>.<grid>.interpolation.csv`. */
  readonly interpolationCsv: string;
}
