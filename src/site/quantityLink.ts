import { columnsOf, TOPICS } from '../tables/columns.ts';
import { address } from './addresses.ts';

const COLUMNS: ReadonlySet<string> = new Set(['z', ...TOPICS.flatMap((topic) => columnsOf(topic).map(({ id }) => id))]);

/** The address behind a link in prose whose target is a column id; undefined if it is none. */
export function quantityLink(target: string): string | undefined {
  return COLUMNS.has(target) ? address.quantity(target) : undefined;
}
