import { Decimal } from '../numerics/decimal.ts';

/** A stretch of a redshift grid, decimals as written; the step is greater than 0. */
export interface Segment {
  readonly from: string;
  readonly to: string;
  readonly step: string;
}

/** What is wrong with a segment, and with which of its numbers. */
interface WrongSegment {
  readonly key: keyof Segment;
  readonly wrong: string;
  readonly expected: string;
}

/**
 * The redshifts of a segment step by step in exact decimal arithmetic, both ends included, all with the decimals of
 * that of its three numbers that has most. Refuses a step that does not lead to the end, and more than `most` redshifts.
 */
export function segmentSteps(segment: Segment, most: number): { redshifts: Decimal[] } | WrongSegment {
  const step = Decimal.parse(segment.step);
  const to = Decimal.parse(segment.to);
  // Adding zeros that have the decimals of the others gives the start these decimals, and so every sum.
  const from = Decimal.parse(segment.from).plus(to.minus(to)).plus(step.minus(step));
  if (from.compare(to) >= 0) {
    return { key: 'to', wrong: `the segment ends at ${segment.to}`, expected: `more than its start, ${segment.from}` };
  }
  const count = to.minus(from).toNumber() / step.toNumber();
  if (count >= most) {
    const wrong = `step ${segment.step} makes about ${count.toPrecision(2)} redshifts`;
    return { key: 'step', wrong, expected: `at most ${most} more in this grid` };
  }
  const redshifts: Decimal[] = [];
  let next = from;
  for (; next.compare(to) <= 0; next = next.plus(step)) redshifts.push(next);
  const last = redshifts.at(-1) ?? from;
  if (last.compare(to) === 0) return { redshifts };
  return {
    key: 'step',
    wrong: `step ${segment.step} does not lead from ${segment.from} to ${segment.to}`,
    expected: `a step that divides the segment: around its end come ${last} and ${next}`,
  };
}
