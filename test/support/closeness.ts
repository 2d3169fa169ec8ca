import { expect } from 'vitest';

/** max(|a-b|/|a|, |a-b|/|b|): 0 if equal, 1 if exactly one of them is zero; NaN never passes a bound. */
export function relativeDifference(a: number, b: number): number {
  if (a === b) return 0;
  if (a === 0 || b === 0) return 1;
  return Math.abs(a - b) / Math.min(Math.abs(a), Math.abs(b));
}

/** Fails with both values when they differ by more than `tolerance`, relative. */
export function expectClose(actual: number | null | undefined, expected: number, tolerance: number, what = ''): void {
  const difference = relativeDifference(actual ?? Number.NaN, expected);
  expect(
    difference <= tolerance,
    `${what} is ${actual}, expected ${expected}: relative difference ${difference}, allowed ${tolerance}`,
  ).toBe(true);
}
