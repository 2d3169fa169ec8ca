import { expect, test } from 'vitest';
import { normalCubature } from '../../src/numerics/normalCubature.ts';

/** E[x^p] of a standard normal variable: 0 for odd p, (p-1)!! for even p. */
const moment = (p: number): number => (p % 2 === 1 ? 0 : p === 0 ? 1 : (p - 1) * moment(p - 2));

/** All exponents of n variables with a sum of at most `degree`. */
function exponents(n: number, degree: number): readonly (readonly number[])[] {
  if (n === 0) return [[]];
  return Array.from({ length: degree + 1 }, (_, p) => p).flatMap((p) =>
    exponents(n - 1, degree - p).map((rest) => [p, ...rest]),
  );
}

test.each([1, 2, 3, 4, 5, 6])(
  'the rule for %d variables has the moments of the normal distribution up to degree 5',
  (n) => {
    const rule = normalCubature(n);
    expect(rule).toHaveLength(2 * n * n + 1);
    for (const powers of exponents(n, 5)) {
      const found = rule.reduce(
        (sum, { point, weight }) => sum + weight * powers.reduce((x, p, k) => x * (point[k] ?? 0) ** p, 1),
        0,
      );
      const expected = powers.reduce((x, p) => x * moment(p), 1);
      expect(found, powers.join()).toBeCloseTo(expected, 12);
    }
  },
);
