import type { Content } from '../../inputs/types.ts';
import { pageColumn } from '../../tables/pageCells.ts';
import type { ValueSetting } from '../../tables/pageUncertainty.ts';
import type { Column, Table } from '../../tables/types.ts';
import { warrantedDigits } from '../../tables/warrantedDigits.ts';
import { address } from '../addresses.ts';
import { displayFormula } from '../displayFormula.ts';
import { PAGE_DIGITS } from '../pageDigits.ts';
import { paleDigits } from '../paleDigits.ts';
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
  /** HTML of the cells, with the digits that their uncertainties do not warrant in paler ink. */
  readonly printed: readonly string[];
  readonly setting: ValueSetting;
}

/** The columns of a table after z. */
export function columnViews(content: Content, table: Table): ColumnView[] {
  return table.columns.map((column, i) => columnView(content, table, column, i));
}

function columnView(content: Content, table: Table, column: Column, at: number): ColumnView {
  const quantity = quantityText(content, column.id);
  const values = table.values.map((row) => row[at] ?? null);
  const { exponent, decimals, cells } = pageColumn(values, PAGE_DIGITS, table.audited[at]);
  const power =
    exponent === null || exponent === 0 ? '' : writtenNumber(`1E${exponent}`).replace(/^1\u2009×\u2009/, '');
  return {
    id: column.id,
    name: quantity.name,
    symbol: symbolHtml(quantity),
    unit: [power, unitHtml(column.unit)].filter(Boolean).join('\u2009'),
    curve: curvePath(table.redshifts, values),
    definition: quantity.definition,
    formula: displayFormula(quantity.formula, `content/quantities/${column.id}.md`),
    address: address.quantity(column.id),
    cells,
    printed: cells.map((cell, row) => printed(cell, values[row] ?? null, table.uncertainties?.[row]?.[at] ?? null)),
    setting: { exponent: exponent ?? 0, decimals },
  };
}

function printed(cell: string, value: number | null, u: number | null): string {
  return value === null ? cell : paleDigits(cell, warrantedDigits(value, u, PAGE_DIGITS));
}
