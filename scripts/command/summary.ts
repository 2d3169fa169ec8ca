import { countTables } from '../../src/tables/countTables.ts';
import type { EditionTables } from '../../src/tables/types.ts';
import { shortPath } from './shortPath.ts';

/** The closing line of a command: how much was made, how long it took (ms since `started`), and where it is. */
export function summary(what: string, editions: readonly EditionTables[], started: number, out: string): string {
  const { tables, rows, cells, settled } = countTables(editions);
  const seconds = ((performance.now() - started) / 1000).toFixed(1);
  const counts = `${plural(tables, 'table')}, ${plural(rows, 'row')}, ${plural(cells, 'cell')} (${settled} settled in extended precision)`;
  return `${what}: ${counts} in ${seconds} s, in ${shortPath(out)}`;
}

function plural(count: number, noun: string): string {
  return `${count.toLocaleString('en-US')} ${noun}${count === 1 ? '' : 's'}`;
}
