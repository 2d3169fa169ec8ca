import type { ColumnView } from './columnViews.ts';

/** Width of a figure and of the space before a column, in em of the table; measured in the font of the site. */
const FIGURE = 0.495;
const GAP = 1.45;
/** Room for a table on the page with its thumb index beside it, in em of the table. */
const PAGE = 70;

/** Whether a table is too wide for the page, so that it scrolls in a frame of its own. */
export function isWide(columns: readonly ColumnView[]): boolean {
  const widths = columns.map(({ cells }) => Math.max(...cells.map((cell) => cell.length)) * FIGURE + GAP);
  return widths.reduce((sum, width) => sum + width, 0) > PAGE;
}
