import type { ColumnView } from './columnViews.ts';

/** How a table fits the page: easily, only where the page is at its widest, or not at all. */
export type Fit = 'slim' | 'broad' | 'wide';

/** Width of a figure and of the space before a column, in em of the table; measured in the font of the site. */
const FIGURE = 0.495;
const GAP = 1.45;
/**
 * Room beside the redshifts in em: on a page of 1280 pixels, and on the widest page, where the style sheet sets such a
 * table a little closer.
 */
const ROOM = { slim: 63.5, broad: 77 } as const;

/** Judged by the longest cell of each column. */
export function fitOf(columns: readonly ColumnView[]): Fit {
  const widths = columns.map(({ cells }) => Math.max(...cells.map((cell) => cell.length)) * FIGURE + GAP);
  const width = widths.reduce((sum, one) => sum + one, 0);
  if (width <= ROOM.slim) return 'slim';
  return width <= ROOM.broad ? 'broad' : 'wide';
}
