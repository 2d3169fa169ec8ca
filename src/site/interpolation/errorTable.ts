import type { QuantityId } from '../../cosmology/quantities.ts';
import type { Content, Topic } from '../../inputs/types.ts';
import { columnsOf } from '../../tables/columns.ts';
import { address } from '../addresses.ts';
import { quantityText, symbolHtml } from '../quantityText.ts';
import { TOPIC_TEXT } from '../topicText.ts';
import { unitHtml } from '../unitText.ts';

/** A table with a line for each column of the tables, by topic. Heads, symbols, units and cells are HTML. */
export interface ErrorTable {
  readonly label: string;
  readonly groups: readonly { readonly title: string; readonly heads: readonly string[] }[];
  readonly topics: readonly { readonly name: string; readonly lines: readonly ErrorLine[] }[];
}

export interface ErrorLine {
  readonly name: string;
  readonly symbol: string;
  readonly unit: string;
  readonly address: string;
  /** One for each head of each group; "" where there is nothing to say. */
  readonly cells: readonly string[];
}

/** A table whose cells `cellsOf` gives for each column. */
export function errorTable(
  content: Content,
  topics: readonly Topic[],
  label: string,
  groups: ErrorTable['groups'],
  cellsOf: (column: QuantityId) => readonly string[],
): ErrorTable {
  return {
    label,
    groups,
    topics: topics.map((topic) => ({
      name: TOPIC_TEXT[topic].name,
      lines: columnsOf(topic).map(({ id, unit }) => {
        const quantity = quantityText(content, id);
        return {
          name: quantity.name,
          symbol: symbolHtml(quantity),
          unit: unitHtml(unit),
          address: address.quantity(id),
          cells: cellsOf(id),
        };
      }),
    })),
  };
}
