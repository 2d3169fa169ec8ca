import type { QuantityPage } from '../../inputs/types.ts';
import { columnsOf, TOPICS } from '../../tables/columns.ts';
import type { Column } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { currentEdition } from '../currentEdition.ts';
import { displayFormula } from '../displayFormula.ts';
import { renderFormula } from '../formula.ts';
import { setsOf, tablesOf } from '../lookUp.ts';
import { renderMarkdown } from '../markdown.ts';
import type { Press } from '../press.ts';
import { quantityLink } from '../quantityLink.ts';
import { quantityText, symbolHtml } from '../quantityText.ts';
import { setTitle } from '../setTitle.ts';
import { TOPIC_TEXT } from '../topicText.ts';
import { typographic } from '../typographic.ts';
import { unitHtml } from '../unitText.ts';
import { type Plot, plot } from './plot.ts';

/** Everything a quantity page prints; symbols, units, formula and body are HTML. */
export interface QuantityView {
  readonly id: string;
  readonly name: string;
  readonly symbol: string;
  readonly unit: string;
  readonly topic: string;
  readonly definition: string;
  readonly formula: string;
  readonly symbols: readonly { readonly symbol: string; readonly meaning: string }[];
  readonly body: string;
  readonly source: string;
  readonly alsoCalled: readonly string[];
  readonly related: readonly { readonly name: string; readonly symbol: string; readonly address: string }[];
  readonly plot: Plot | undefined;
  readonly edition: string;
  /** Sets of the current edition with the tables that hold the quantity, one for each grid. */
  readonly tables: readonly {
    readonly set: string;
    readonly grids: readonly { readonly id: string; readonly address: string }[];
  }[];
}

export function quantityView(press: Press, id: string): QuantityView {
  const quantity = quantityText(press.content, id);
  const where = `content/quantities/${id}.md`;
  const pressed = currentEdition(press);
  const column = columnOf(id);
  return {
    id,
    name: quantity.name,
    symbol: symbolHtml(quantity),
    unit: unitHtml(column?.unit ?? ''),
    topic: column ? TOPIC_TEXT[column.topic].name : 'every table',
    definition: typographic(quantity.definition),
    formula: displayFormula(quantity.formula, where),
    symbols: quantity.symbols.map(({ symbol, meaning, unit }) => ({
      symbol: renderFormula(symbol, 'inline', where),
      meaning: typographic(meaning) + (unit === '' ? '' : `, ${unitHtml(unit)}`),
    })),
    body: renderMarkdown(quantity.body, { where, link: quantityLink }),
    source: quantity.source,
    alsoCalled: quantity.alsoCalled,
    related: quantity.related.map((other) => related(quantityText(press.content, other))),
    plot: column && plot(pressed, column),
    edition: pressed.edition.number,
    tables: setsOf(pressed).map((set) => ({
      set: setTitle(set),
      grids: tablesOf(pressed, set.id, column?.topic ?? 'distances').map((table) => ({
        id: table.grid.id,
        address: address.table(pressed.edition.number, table.id),
      })),
    })),
  };
}

function columnOf(id: string): Column | undefined {
  return TOPICS.flatMap(columnsOf).find((column) => column.id === id);
}

function related(quantity: QuantityPage): QuantityView['related'][number] {
  return { name: quantity.name, symbol: symbolHtml(quantity), address: address.quantity(quantity.id) };
}
