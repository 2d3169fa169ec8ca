import type { Parameters } from '../cosmology/parameters.ts';
import type { QuantityId } from '../cosmology/quantities.ts';
import { isSettled } from '../numerics/isSettled.ts';
import { decidingText, WORKING_DIGITS } from './decidingText.ts';
import type { EvaluatedRow } from './evaluateRows.ts';
import { PAGE_DIGITS } from './pageDigits.ts';

/** A cell whose double does not decide its digits, in a file or on a page. */
interface OpenCell {
  readonly redshift: string;
  readonly column: QuantityId;
}

/** Decimal texts of the audit for the open cells of one parameter set. */
export interface Settled {
  /** The text of a cell that was open; undefined for every other cell. */
  of(redshift: string, column: QuantityId): string | undefined;
}

const key = (redshift: string, column: QuantityId) => `${redshift} ${column}`;

/** The open cells of a set of rows, at the digits of the edition and at those of the pages. */
function openCells(redshifts: readonly string[], rows: readonly EvaluatedRow[], digits: number): readonly OpenCell[] {
  const counts = [digits, PAGE_DIGITS];
  return rows.flatMap((row, k) =>
    (Object.keys(row) as QuantityId[])
      .filter((column) => {
        const cell = row[column];
        return cell !== null && !isSettled(cell.value, cell.bound, counts);
      })
      .map((column) => ({ redshift: redshifts[k] ?? '', column })),
  );
}

/** Columns that are open in the same rows go to the audit together: those that need integrals cost the most. */
function byColumn(cells: readonly OpenCell[]): ReadonlyMap<QuantityId, readonly string[]> {
  const groups = new Map<QuantityId, Set<string>>();
  for (const { redshift, column } of cells) {
    groups.set(column, (groups.get(column) ?? new Set()).add(redshift));
  }
  return new Map([...groups].map(([column, redshifts]) => [column, [...redshifts]]));
}

/**
 * Settles the cells of one parameter set that lie too near a rounding boundary for their error bounds, by the audit.
 * The audit and its arithmetic are loaded only when there is such a cell.
 */
export async function settle(
  parameters: Parameters,
  grids: readonly { readonly redshifts: readonly string[]; readonly rows: readonly EvaluatedRow[] }[],
  digits: number,
): Promise<Settled> {
  const open = byColumn(grids.flatMap(({ redshifts, rows }) => openCells(redshifts, rows, digits)));
  if (open.size === 0) return { of: () => undefined };
  const { startAudit } = await import('../cosmology/audit/startAudit.ts');
  const { auditRows } = await import('../cosmology/audit/auditRows.ts');
  await startAudit();
  const texts = new Map<string, string>();
  for (const [column, redshifts] of open) {
    for (const [k, [audited]] of auditRows(parameters, redshifts, [column], WORKING_DIGITS).entries()) {
      if (audited) texts.set(key(redshifts[k] ?? '', column), decidingText(audited));
    }
  }
  return { of: (redshift, column) => texts.get(key(redshift, column)) };
}
