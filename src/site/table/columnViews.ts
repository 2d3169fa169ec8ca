import type { Content } from '../../inputs/types.ts';
import { pageColumn } from '../../tables/pageCells.ts';
import type { Column, Table } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { displayFormula } from '../displayFormula.ts';
import { PAGE_DIGITS } from '../pageDigits.ts';
import { quantityText, symbolHtml } from '../quantityText.ts';
import { unitHtml } from '../unitText.ts';
import { writtenNumber } from '../writtenNumber.ts';
import { curvePath } from './curve.ts';

/** One column of a table, ready to print. */
export interface ColumnView {
  readonly id: string;
  readonly name: string;
  /** MathML. */
  readonly symbol: string;
  /** HTML, with the power of ten that belongs to the whole column; "" if there is neither. */
  readonly unit: string;
  /** Path of the tiny curve. */
  readonly curve: string;
  readonly definition: string;
  /** HTML of the formula in a line of its own. */
  readonly formula: string;
  /** Address of the quantity's page. */
  readonly address: string;
  /** One for each row; "" where the quantity does not exist. */
  readonly cells: readonly string[];
}

/** The columns of a table after z. */
export function columnViews(content: Content, table: Table): ColumnView[] {
  return table.columns.map((column, i) =>
    columnView(
      content,
      column,
      table.redshifts,
      table.values.map((row) => row[i] ?? null),
      table.audited[i],
    ),
  );
}

function columnView(
  content: Content,
  column: Column,
  redshifts: readonly string[],
  values: readonly (number | null)[],
  audited: ReadonlyMap<number, string> | undefined,
): ColumnView {
  const quantity = quantityText(content, column.id);
  const { exponent, cells } = pageColumn(values, PAGE_DIGITS, audited);
  const power =
    exponent === null || exponent === 0 ? '' : writtenNumber(`1E${exponent}`).replace(/^1\u2009×\u2009/, '');
  return {
    id: column.id,
    name: quantity.name,
    symbol: symbolHtml(quantity),
    unit: [power, unitHtml(column.unit)].filter(Boolean).join('\u2009'),
    curve: curvePath(redshifts, values),
    definition: quantity.definition,
    formula: displayFormula(quantity.formula, `content/quantities/${column.id}.md`),
    address: address.quantity(column.id),
    cells,
  };
}
