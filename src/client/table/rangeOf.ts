import { firstFrom } from '../nearest.ts';
import { readNumber } from '../readNumber.ts';

/** The rows of a range of redshifts, ends included, by position: from `start` to before `end`. */
export interface Range {
  readonly start: number;
  readonly end: number;
}

/**
 * Reads the two ends as typed; an empty one is open. A string is returned for a mistake: what to say to whoever typed it.
 */
export function rangeOf(redshifts: readonly number[], from: string, to: string): Range | string {
  const low = readEnd(from, Number.NEGATIVE_INFINITY);
  const high = readEnd(to, Number.POSITIVE_INFINITY);
  if (low === undefined) return `“${from}” is not a redshift.`;
  if (high === undefined) return `“${to}” is not a redshift.`;
  if (low > high) return `From ${from} to ${to} runs backwards.`;
  const start = firstFrom(redshifts, low);
  const past = firstFrom(redshifts, high);
  return { start, end: redshifts[past] === high ? past + 1 : past };
}

function readEnd(text: string, open: number): number | undefined {
  return text.trim() === '' ? open : readNumber(text);
}
