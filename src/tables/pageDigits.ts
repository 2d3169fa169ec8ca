/** Significant digits of a cell on a page; the CSV has those of the edition. */
export const PAGE_DIGITS = 7;
