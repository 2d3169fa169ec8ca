import type { Content } from '../../inputs/types.ts';
import { columnsOf, TOPICS } from '../../tables/columns.ts';
import { address } from '../addresses.ts';
import { press } from '../press.ts';
import { quantityText, symbolHtml } from '../quantityText.ts';
import { TOPIC_TEXT } from '../topicText.ts';
import { typographic } from '../typographic.ts';
import { unitHtml } from '../unitText.ts';

/** One entry in the list of quantities; symbol and unit are HTML. */
export interface QuantityEntry {
  readonly id: string;
  readonly name: string;
  readonly symbol: string;
  readonly unit: string;
  readonly definition: string;
  readonly address: string;
}

/** All quantities by topic, with the redshift itself before them. */
export async function quantityList(): Promise<{ title: string; entries: QuantityEntry[] }[]> {
  const { content } = await press();
  const topics = TOPICS.map((topic) => ({
    title: TOPIC_TEXT[topic].name,
    entries: columnsOf(topic).map(({ id, unit }) => entry(content, id, unit)),
  }));
  const argument = content.quantities.some(({ id }) => id === 'z');
  return argument ? [{ title: 'The argument', entries: [entry(content, 'z', '')] }, ...topics] : topics;
}

function entry(content: Content, id: string, unit: string): QuantityEntry {
  const quantity = quantityText(content, id);
  return {
    id,
    name: quantity.name,
    symbol: symbolHtml(quantity),
    unit: unitHtml(unit),
    definition: typographic(quantity.definition),
    address: address.quantity(id),
  };
}
