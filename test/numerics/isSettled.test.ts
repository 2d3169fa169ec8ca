import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { isSettled } from '../../src/numerics/isSettled.ts';
import { roundHalfEven } from '../../src/numerics/roundHalfEven.ts';

describe('isSettled(value, bound, counts)', () => {
  test.each([
    [1.2345, 1e-9, [5], true],
    [1.2345, 1e-9, [4], false], // a tie within the bound
    [1.2345, 1e-9, [5, 4], false],
    [1.23449, 1e-6, [4], true],
    [1.23449, 2e-5, [4], false],
    [9.99996, 3e-5, [5], false], // 9.9999 or 10.000
    [9.99996, 1e-6, [5], true],
    [0.625, 0, [2], true], // exact, however it rounds
    [1e-27, 2e-27, [3], false], // even the sign is open
    [-1.2345, 1e-9, [4], false],
    [5, Number.POSITIVE_INFINITY, [10], false],
    [5, Number.NaN, [10], false],
  ])('%d +- %d at %j digits: %s', (value, bound, counts, expected) => {
    expect(isSettled(value, bound, counts)).toBe(expected);
  });

  test('a settled value has one rounding over its whole interval', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-30, max: 1e30, noNaN: true }),
        fc.double({ min: 1e-17, max: 1e-4, noNaN: true }),
        fc.integer({ min: 3, max: 12 }),
        fc.double({ min: -1, max: 1, noNaN: true }),
        (value, relative, count, place) => {
          const bound = value * relative;
          if (!isSettled(value, bound, [count])) return;
          const { digits, exponent } = roundHalfEven(value + place * bound, count);
          expect({ digits, exponent }).toEqual({
            digits: roundHalfEven(value, count).digits,
            exponent: roundHalfEven(value, count).exponent,
          });
        },
      ),
      { seed: 20260204, numRuns: 20_000 },
    );
  });
});
