import type { Certificate } from '../inputs/certificate.ts';

/** A certificate as its file holds it: keys in a fixed order, a line for each table, so that changes are easy to see. */
export function certificateText({ tables, ...head }: Certificate): string {
  const lines = tables.map((table) => `    ${JSON.stringify(table)}`);
  const start = JSON.stringify(head, null, 2).replace(/\n\}$/, '');
  return `${start},\n  "tables": [\n${lines.join(',\n')}\n  ]\n}\n`;
}
