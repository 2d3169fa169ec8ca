import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { smallestEigenvalue } from '../../src/numerics/smallestEigenvalue.ts';

describe('closed forms', () => {
  test('one number is its own eigenvalue', () => expect(smallestEigenvalue([[-3]])).toBe(-3));

  test('two correlated parameters have 1 - |r|', () => {
    for (const r of [-1, -0.975, 0, 0.25, 1]) {
      expect(
        smallestEigenvalue([
          [1, r],
          [r, 1],
        ]),
      ).toBeCloseTo(1 - Math.abs(r), 15);
    }
  });

  test('n equally correlated parameters have 1 - r and 1 + (n - 1) r', () => {
    for (const [n, r] of [
      [3, -0.6],
      [5, 0.5],
      [10, -0.125],
    ] as const) {
      const matrix = Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => (i === j ? 1 : r)));
      expect(smallestEigenvalue(matrix)).toBeCloseTo(Math.min(1 - r, 1 + (n - 1) * r), 14);
    }
  });

  test('the chain 2, -1 has 2 - 2 cos(pi/(n+1))', () => {
    const n = 12;
    const matrix = Array.from({ length: n }, (_, i) =>
      Array.from({ length: n }, (_, j) => (i === j ? 2 : Math.abs(i - j) === 1 ? -1 : 0)),
    );
    expect(smallestEigenvalue(matrix)).toBeCloseTo(2 - 2 * Math.cos(Math.PI / (n + 1)), 14);
  });
});

test('no direction has a smaller quotient x.A.x / x.x (Rayleigh), and shifting the diagonal shifts the eigenvalue', () => {
  const number = fc.integer({ min: -100, max: 100 }).map((k) => k / 64);
  const square = fc.integer({ min: 2, max: 6 }).chain((n) =>
    fc.record({
      matrix: fc.array(fc.array(number, { minLength: n, maxLength: n }), { minLength: n, maxLength: n }),
      x: fc.array(number, { minLength: n, maxLength: n }),
    }),
  );
  fc.assert(
    fc.property(square, ({ matrix, x }) => {
      const element = (i: number, j: number) => matrix[Math.min(i, j)]?.[Math.max(i, j)] ?? 0;
      const a = matrix.map((row, i) => row.map((_, j) => element(i, j)));
      const smallest = smallestEigenvalue(a);
      const norm = x.reduce((sum, v) => sum + v * v, 0);
      const form = a.reduce(
        (sum, row, i) => sum + row.reduce((part, v, j) => part + v * (x[i] ?? 0) * (x[j] ?? 0), 0),
        0,
      );
      expect(form).toBeGreaterThanOrEqual(smallest * norm - 1e-12 * (1 + norm));
      const shifted = a.map((row, i) => row.map((v, j) => (i === j ? v + 3 : v)));
      expect(smallestEigenvalue(shifted)).toBeCloseTo(smallest + 3, 12);
    }),
  );
});
