import { rowId } from '../addresses.ts';
import { shortRedshift } from '../shortRedshift.ts';
import { lastPlace } from './roundness.ts';

/** One tab of the thumb index. */
export interface Thumb {
  readonly row: string;
  readonly text: string;
}

/** Shorter tables are seen at once. */
const SHORTEST = 60;
/** Two tabs are at most this part of the table apart, so that about 16 fit beside it on a small screen. */
const WIDEST_GAP = 1 / 12;

/** The tabs at the side of a long table: first row, last row, and between them round values spread over the rows. */
export function thumbIndex(redshifts: readonly string[]): Thumb[] {
  if (redshifts.length < SHORTEST) return [];
  const places = redshifts.map(lastPlace);
  const last = redshifts.length - 1;
  const rows = [0, ...between(places, 0, last, redshifts.length * WIDEST_GAP), last];
  return rows.map((row) => ({ row: rowId(redshifts[row] ?? ''), text: shortRedshift(redshifts[row] ?? '') }));
}

/** Rows between two tabs, halving the gap until it is narrow: the roundest value near the middle each time. */
function between(places: readonly number[], from: number, to: number, widest: number): number[] {
  const gap = to - from;
  if (gap <= widest) return [];
  const middle = from + gap / 2;
  let best = Math.round(middle);
  for (let row = Math.ceil(from + gap / 4); row <= to - gap / 4; row++) {
    const rounder = (places[row] ?? 0) - (places[best] ?? 0);
    const nearer = Math.abs(best - middle) - Math.abs(row - middle);
    if (rounder > 0 || (rounder === 0 && nearer > 0)) best = row;
  }
  return [...between(places, from, best, widest), best, ...between(places, best, to, widest)];
}
