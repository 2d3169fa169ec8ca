import { type Propagation, propagation } from '../cosmology/propagation.ts';
import { cellPlace } from '../cosmology/sweep.ts';
import type { ParameterSet, RedshiftGrid } from '../inputs/types.ts';
import { csvText } from './csvText.ts';
import type { Column } from './types.ts';
import { uncertaintyCell } from './uncertaintyCell.ts';
import type { ErrorBudget, NonlinearRange, TableUncertainty } from './uncertaintyTypes.ts';

type Values = readonly (readonly (number | null)[])[];

/** A table whose uncertainties are known. */
interface Sheet {
  readonly found: Propagation;
  readonly grid: RedshiftGrid;
  readonly columns: readonly Column[];
  /** `places[row][column]` in the sweep. */
  readonly places: readonly (readonly number[])[];
  readonly uncertainties: Values;
}

/** A set without uncertainties. */
const NONE: TableUncertainty = { uncertainties: null, uncertaintyCsv: null, nonlinear: [], budgets: [] };

/** The uncertainties of one set over all its grids at once; null for a set that gives none. */
export function uncertaintiesOf(set: ParameterSet, grids: readonly RedshiftGrid[]): Propagation | null {
  const redshifts = new Set(grids.flatMap((grid) => grid.redshifts.map(Number)));
  return propagation(
    set,
    [...redshifts].sort((a, b) => a - b),
  );
}

/** The uncertainties of one table, given those of its set and the values that they belong to. */
export function uncertaintyTable(
  found: Propagation | null,
  grid: RedshiftGrid,
  columns: readonly Column[],
  values: Values,
): TableUncertainty {
  if (found === null) return NONE;
  const places = placesOf(found, grid, columns);
  const uncertainties = values.map((row, k) =>
    row.map((value, c) => (value === null ? null : present(found.u[places[k]?.[c] ?? Number.NaN]))),
  );
  const sheet = { found, grid, columns, places, uncertainties };
  return {
    uncertainties,
    uncertaintyCsv: csvText(
      ['z', ...columns.map(({ id }) => `u_${id}`)],
      uncertainties.map((row, k) => [grid.redshifts[k] ?? '', ...row.map(uncertaintyCell)]),
    ),
    nonlinear: columns.flatMap((_, column) => nonlinearRanges(sheet, column)),
    budgets: budgetRows(grid, uncertainties).flatMap((row) =>
      columns.flatMap((_, column) => budget(sheet, row, column)),
    ),
  };
}

function placesOf({ redshifts }: Propagation, grid: RedshiftGrid, columns: readonly Column[]): Sheet['places'] {
  const rows = new Map(redshifts.map((z, row) => [z, row]));
  return grid.redshifts.map((redshift) => {
    const row = rows.get(Number(redshift));
    if (row === undefined) throw new RangeError(`no uncertainties were propagated to z = ${redshift}`);
    return columns.map(({ id }) => cellPlace(row, id));
  });
}

function present(u: number | undefined): number | null {
  return u === undefined || Number.isNaN(u) ? null : u;
}

/** Runs of neighbouring rows in which a column is nonlinear. */
function nonlinearRanges({ found, grid, columns, places, uncertainties }: Sheet, column: number): NonlinearRange[] {
  const ranges: { column: string; from: string; to: string }[] = [];
  let open: { column: string; from: string; to: string } | undefined;
  for (const [row, redshift] of grid.redshifts.entries()) {
    const bent = uncertainties[row]?.[column] != null && found.isNonlinear(places[row]?.[column] ?? Number.NaN);
    if (!bent) {
      open = undefined;
    } else if (open !== undefined) {
      open.to = redshift;
    } else {
      open = { column: columns[column]?.id ?? '', from: redshift, to: redshift };
      ranges.push(open);
    }
  }
  return ranges;
}

/** Rows of a low, a middle and a high redshift with uncertainties; z = 0, where distances are exact, is none of them. */
function budgetRows({ redshifts }: RedshiftGrid, uncertainties: Values): readonly number[] {
  const usable = (row: number) => Number(redshifts[row]) !== 0 && uncertainties[row]?.some((u) => u !== null) === true;
  const rows = redshifts.map((_, row) => row).filter(usable);
  const chosen = [rows[0], rows[Math.floor(rows.length / 2)], rows.at(-1)];
  return [...new Set(chosen)].filter((row) => row !== undefined);
}

function budget({ found, grid, columns, places, uncertainties }: Sheet, row: number, column: number): ErrorBudget[] {
  const u = uncertainties[row]?.[column] ?? null;
  if (u === null) return [];
  const shares = found.shares(places[row]?.[column] ?? Number.NaN);
  return [{ column: columns[column]?.id ?? '', redshift: grid.redshifts[row] ?? '', u, shares }];
}
