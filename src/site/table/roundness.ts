/**
 * The power of ten of the last digit that is not zero: -1 for 0.50, -2 for 0.37, 3 for 1000. The higher, the rounder; zero
 * is the roundest of all.
 */
export function lastPlace(redshift: string): number {
  const [whole = '', fraction = ''] = redshift.split('.');
  const decimals = fraction.replace(/0+$/, '').length;
  if (decimals > 0) return -decimals;
  const zeros = /^-?[1-9]\d*?(0*)$/.exec(whole)?.[1];
  return zeros === undefined ? Number.POSITIVE_INFINITY : zeros.length;
}

/** Whether a row is set heavier: its redshift is rounder than is usual around it. */
export function isRound(redshifts: readonly string[], row: number): boolean {
  const here = redshifts[row];
  if (here === undefined) return false;
  const around = redshifts.slice(Math.max(0, row - REACH), row + REACH + 1).map(lastPlace);
  const usual = around.toSorted((a, b) => a - b)[around.length >> 1] ?? 0;
  return lastPlace(here) > usual;
}

/** Rows on either side that say what is usual: two groups of five. */
const REACH = 10;
