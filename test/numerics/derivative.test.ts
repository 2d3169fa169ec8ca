import { describe, expect, test } from 'vitest';
import { type AlongStep, derivative, sidedDerivative } from '../../src/numerics/derivative.ts';

/** Components side by side, each a function of the distance in steps. */
const along =
  (...components: readonly ((t: number) => number)[]): AlongStep =>
  (t) =>
    Float64Array.from(components, (f) => f(t));

const RATES = [0.03, 0.125, 0.5, 1];

describe.each([
  ['central differences', derivative, (k: number) => k ** 7 / 300_000],
  ['differences to one side', sidedDerivative, (k: number) => k ** 4 / 120],
] as const)('%s', (_, differentiate, truncation) => {
  test.each(RATES)('of exp(k t), k = %d, have the derivative k and an error within the stated one', (k) => {
    const { values, errors } = differentiate(along((t) => Math.exp(k * t)));
    const error = Math.abs((values[0] ?? Number.NaN) - k);
    expect(error).toBeLessThanOrEqual(errors[0] ?? 0);
    expect(error).toBeLessThanOrEqual(truncation(k) + 1e-13);
  });

  test('of a constant that only rounding moves are exactly 0', () => {
    const { values } = differentiate(along((t) => 1 + (t > 0 ? Number.EPSILON : 0)));
    expect(values[0]).toBe(0);
  });

  test('keep the other components where one does not exist', () => {
    const { values } = differentiate(
      along(
        (t) => (t > 0.9 ? Number.NaN : 1),
        (t) => 3 + 2 * t,
      ),
    );
    expect(values[0]).toBeNaN();
    expect(values[1]).toBeCloseTo(2, 12);
  });
});

test('central differences are exact for polynomials of the fifth degree', () => {
  const { values } = derivative(along((t) => 2 + 3 * t - 5 * t ** 2 + 7 * t ** 3 - 11 * t ** 4 + 13 * t ** 5));
  expect(values[0]).toBeCloseTo(3, 13);
});

test('differences to one side are exact for cubic polynomials and do not look at the other side', () => {
  const { values } = sidedDerivative(along((t) => (t < 0 ? Number.NaN : 2 + 3 * t - 5 * t ** 2 + 7 * t ** 3)));
  expect(values[0]).toBeCloseTo(3, 13);
});
