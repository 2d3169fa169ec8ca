import type { Cell } from './hit.ts';

/**
 * A cell of a published CSV, as the file writes it; "" where the quantity does not exist, undefined if the file has no
 * such row or column. Our files quote nothing, so a comma always parts two cells.
 */
export function cellOf(csv: string, { redshift, column }: Pick<Cell, 'redshift' | 'column'>): string | undefined {
  const [head = '', ...lines] = csv.split('\n');
  const at = head.split(',').indexOf(column);
  const line = lines.find((text) => text.startsWith(`${redshift},`));
  return at < 0 ? undefined : line?.split(',')[at];
}
