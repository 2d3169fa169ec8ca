import type { Table } from '../../tables/types.ts';
import type { ErrorBudget } from '../../tables/uncertaintyTypes.ts';
import { parameterLines } from '../parameterLines.ts';
import { realMinus } from '../writtenNumber.ts';
import type { ColumnView } from './columnViews.ts';

/** Which parameter contributes how much to the uncertainties of a table, at a few of its redshifts. */
export interface BudgetView {
  /** As pages print them. */
  readonly redshifts: readonly string[];
  /** The parameters that are uncertain, MathML and words. */
  readonly parameters: readonly { readonly symbol: string; readonly name: string }[];
  /** Whether the set gives correlations; their part then stands behind the parameters. */
  readonly correlated: boolean;
  readonly lines: readonly BudgetLine[];
}

/** Columns with the same budget. */
export interface BudgetLine {
  /** MathML and words. */
  readonly columns: readonly { readonly symbol: string; readonly name: string }[];
  /** For each redshift the parts in per cent; none where the value is exact; null where there is no uncertainty. */
  readonly groups: readonly (readonly string[] | null)[];
}

/** Null for a table without uncertainties. */
export function budgetView(
  { set, budgets }: Pick<Table, 'set' | 'budgets'>,
  columns: readonly Pick<ColumnView, 'id' | 'name' | 'symbol'>[],
): BudgetView | null {
  if (budgets.length === 0) return null;
  const redshifts = [...new Set(budgets.map(({ redshift }) => redshift))];
  const parameters = parameterLines(set).filter(({ u }) => u !== '');
  const correlated = set.correlations.length > 0;
  const ids = parameters.map(({ id }) => id);
  const groupsOf = (column: string) =>
    redshifts.map((redshift) => {
      const budget = budgets.find((one) => one.column === column && one.redshift === redshift);
      return budget ? parts(budget, ids, correlated) : null;
    });
  return {
    redshifts: redshifts.map(realMinus),
    parameters: parameters.map(({ symbol, name }) => ({ symbol, name })),
    correlated,
    lines: together(columns.map(({ id, name, symbol }) => ({ columns: [{ name, symbol }], groups: groupsOf(id) }))),
  };
}

/** Lines with the same parts made one, in the place of the first; one quantity in several units is named once. */
function together(lines: readonly BudgetLine[]): BudgetLine[] {
  const byParts = Map.groupBy(lines, ({ groups }) => JSON.stringify(groups));
  return [...byParts.values()].map((same) => ({
    columns: same
      .flatMap(({ columns }) => columns)
      .filter(({ symbol }, n, all) => all.findIndex((one) => one.symbol === symbol) === n),
    groups: same[0]?.groups ?? [],
  }));
}

/** What each parameter contributes by itself, and behind them what the correlations add or take away. */
function parts({ shares }: ErrorBudget, parameters: readonly string[], correlated: boolean): string[] {
  if (shares.length === 0) return [];
  const alone = parameters.map((id) => shares.find(({ parameter }) => parameter === id)?.alone ?? 0);
  const correlations = shares.reduce((sum, share) => sum + share.correlated, 0);
  return [...alone, ...(correlated ? [correlations] : [])].map(perCent);
}

/** Whole per cent: "57", "−130"; "0" stands for less than half of one. */
function perCent(part: number): string {
  const whole = Math.round(100 * part);
  return realMinus(String(whole === 0 ? 0 : whole));
}
