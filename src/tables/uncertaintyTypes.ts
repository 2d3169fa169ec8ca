import type { Share } from '../cosmology/propagation.ts';

/** Where the law of propagation is off by more than a tenth of u: a run of rows of one column. */
export interface NonlinearRange {
  readonly column: string;
  /** First and last redshift, as the grid writes them. */
  readonly from: string;
  readonly to: string;
}

/** What the parameters contribute to the uncertainty of one cell. */
export interface ErrorBudget {
  readonly column: string;
  /** As the grid writes it. */
  readonly redshift: string;
  readonly u: number;
  /** `alone` and `correlated` of all shares add up to 1; no shares where u is 0. */
  readonly shares: readonly Share[];
}

/** What a table says of the standard uncertainties of its cells. */
export interface TableUncertainty {
  /**
   * `uncertainties[row][column]` beside `values`; null in a cell without value, or whose existence hangs on the
   * parameters. Null as a whole for a set that gives no uncertainties.
   */
  readonly uncertainties: readonly (readonly (number | null)[])[] | null;
  /** The file `<set>.<topic>.<grid>.u.csv`; null for a set that gives no uncertainties and has no such file. */
  readonly uncertaintyCsv: string | null;
  /** Columns where u is off by more than a tenth of it. */
  readonly nonlinear: readonly NonlinearRange[];
  /** Error budgets of all columns at a low, a middle and a high redshift of the grid. */
  readonly budgets: readonly ErrorBudget[];
}
