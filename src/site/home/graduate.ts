import { type Branch, branches, positionOf } from './monotone.ts';

/** One stroke of a graduated scale. */
export interface Stroke {
  /** 0 at one end of the scale, 1 at the other. */
  readonly at: number;
  readonly value: number;
}

/** How an interval of 1, 2 or 5 times a power of ten may be divided, the finest way first. */
const DIVISIONS: Readonly<Record<number, readonly number[]>> = { 1: [10, 5, 2], 2: [2], 5: [5] };

/**
 * The strokes of a scale as an engraver sets them: intervals of 1, 2 or 5 times a power of ten are divided again wherever
 * the strokes stay at least `apart` from each other, so that a scale is fine where it is wide and coarse where it is narrow.
 */
export function graduate(positions: readonly number[], values: readonly number[], apart: number): Stroke[] {
  const strokes = branches(positions, values).flatMap((branch) => graduateBranch(branch, apart));
  return strokes
    .toSorted((a, b) => a.at - b.at)
    .filter((stroke, i, all) => i === 0 || stroke.at - (all[i - 1]?.at ?? 0) >= 0.9 * apart);
}

function graduateBranch(branch: Branch, apart: number): Stroke[] {
  const lowest = Math.min(...branch.values);
  const highest = Math.max(...branch.values);
  const power = Math.ceil(Math.log10(Math.max(highest - lowest, Number.MIN_VALUE)));
  const unit = ten(power);
  const first = Math.floor(lowest / unit);
  const last = Math.ceil(highest / unit);
  const marks: Stroke[] = [];
  for (let k = first; k < last; k++) {
    mark(branch, k * unit, marks);
    divide(branch, k * unit, unit, 1, apart, marks);
  }
  mark(branch, last * unit, marks);
  return marks;
}

/** Sets the strokes inside an interval of `times` x `unit`, a power of ten. */
function divide(branch: Branch, start: number, unit: number, times: number, apart: number, marks: Stroke[]): void {
  const length = times * unit;
  const parts = DIVISIONS[times]?.find((n) => fits(branch, start, length / n, n, apart));
  if (parts === undefined) return;
  const step = tidy(length / parts);
  const nextUnit = ten(Math.floor(Math.log10(step * 1.0001)));
  for (let i = 0; i < parts; i++) {
    if (i > 0) mark(branch, start + i * step, marks);
    divide(branch, start + i * step, nextUnit, Math.round(step / nextUnit), apart, marks);
  }
}

/** Whether the interval is wide enough to divide, and all strokes of the division keep their distance. */
function fits(branch: Branch, start: number, step: number, parts: number, apart: number): boolean {
  const at = Array.from({ length: parts + 1 }, (_, i) => positionOf(branch, tidy(start + i * step)));
  const on = at.filter((position) => position !== undefined);
  return (
    width(branch, start, start + parts * step) >= apart &&
    on.every((position, i) => i === 0 || Math.abs(position - (on[i - 1] ?? 0)) >= apart)
  );
}

/** Length of the part of an interval that lies on the branch. */
function width(branch: Branch, from: number, to: number): number {
  const lowest = Math.min(...branch.values);
  const highest = Math.max(...branch.values);
  if (to <= lowest || from >= highest) return 0;
  const start = positionOf(branch, Math.max(from, lowest)) ?? 0;
  return Math.abs((positionOf(branch, Math.min(to, highest)) ?? 0) - start);
}

function mark(branch: Branch, value: number, marks: Stroke[]): void {
  const at = positionOf(branch, tidy(value));
  if (at !== undefined) marks.push({ at, value: tidy(value) });
}

function ten(power: number): number {
  return Number(`1e${power}`);
}

/** Removes what adding decimals leaves behind: 0.30000000000000004. */
function tidy(value: number): number {
  return Number(value.toPrecision(12));
}
