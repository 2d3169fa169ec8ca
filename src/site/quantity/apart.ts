/** The end of the curves at which they are labelled. */
export type Side = 'left' | 'right';

/** A curve that is drawn: which of those given, and the height of its label, 0 to 1. */
export interface Chosen {
  readonly index: number;
  readonly labelAt: number;
}

/** Labels need this part of the height each. */
const APART = 0.07;
const MOST = 5;

/**
 * Chooses the curves that can be told apart and labelled at one end: in the order given, each that ends far enough from those
 * already chosen, at the end where more of them do. Heights run from 0 to 1; null where a curve does not exist.
 */
export function apart(curves: readonly (readonly (number | null)[])[]): { chosen: readonly Chosen[]; side: Side } {
  const right = choose(curves.map((heights) => heights.findLast((height) => height !== null) ?? null));
  const left = choose(curves.map((heights) => heights.find((height) => height !== null) ?? null));
  return left.length > right.length ? { chosen: left, side: 'left' } : { chosen: right, side: 'right' };
}

function choose(ends: readonly (number | null)[]): Chosen[] {
  const chosen: Chosen[] = [];
  ends.forEach((labelAt, index) => {
    if (labelAt === null || chosen.length === MOST) return;
    if (chosen.every((other) => Math.abs(other.labelAt - labelAt) >= APART)) chosen.push({ index, labelAt });
  });
  return chosen;
}
