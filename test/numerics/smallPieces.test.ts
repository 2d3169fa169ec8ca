import { describe, expect, test } from 'vitest';
import { chebyshevSeries, chebyshevValue } from '../../src/numerics/chebyshev.ts';
import { CompensatedSum } from '../../src/numerics/compensatedSum.ts';
import { findRoot } from '../../src/numerics/findRoot.ts';
import { expectClose } from '../support/closeness.ts';

describe('CompensatedSum', () => {
  test('keeps what plain addition loses', () => {
    const sum = new CompensatedSum(1);
    for (let k = 0; k < 1_000_000; k++) sum.add(1e-16);
    expect(sum.value).toBe(1 + 1e-10);
  });

  test('cancels large terms exactly', () => {
    const sum = new CompensatedSum();
    for (const term of [1, 1e100, 1, -1e100]) sum.add(term);
    expect(sum.value).toBe(2);
  });
});

describe('chebyshevSeries(f, lo, hi, size)', () => {
  test('reproduces a smooth function to rounding', () => {
    const series = chebyshevSeries(Math.exp, -1, 2, 24);
    for (const x of [-1, -0.3, 0, 1.1, 2]) expectClose(chebyshevValue(series, x), Math.exp(x), 3e-15, `exp(${x})`);
  });
});

describe('findRoot(f, lo, hi)', () => {
  test.each([
    ['x^2 - 2', (x: number) => x * x - 2, 0, 2, Math.SQRT2],
    ['cos x', Math.cos, 1, 2, Math.PI / 2],
    ['a steep one', (x: number) => Math.exp(40 * (x - 0.75)) - 1, -1, 1, 0.75],
    ['x^9', (x: number) => x * x * x * (x * x * x) * (x * x * x), -1, 1.5, 0],
  ])('finds the root of %s to the last bits', (_, f, lo, hi, root) => {
    expect(Math.abs(findRoot(f, lo, hi) - root)).toBeLessThan(4e-16 * Math.max(1, root) + (root === 0 ? 1e-30 : 0));
  });

  test('refuses an interval without a sign change', () => {
    expect(() => findRoot((x) => x * x + 1, -1, 1)).toThrow('no sign change between -1 (2) and 1 (2)');
  });
});
