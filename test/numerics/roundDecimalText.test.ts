import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { roundDecimalText } from '../../src/numerics/roundDecimalText.ts';
import { roundHalfEven } from '../../src/numerics/roundHalfEven.ts';

describe('roundDecimalText(text, error, digits)', () => {
  test.each([
    ['2.5', '0', 1, '2', 0],
    ['3.5', '0', 1, '4', 0],
    ['2.50000000000000000000000000000000001', '0', 1, '3', 0],
    ['9.9996', '0', 4, '1000', 1],
    ['0.00012345', '0', 3, '123', -4],
    ['12', '0', 5, '12000', 1],
    ['1.25e-27', '0', 2, '12', -27],
    ['2.4999999', '1e-9', 1, '2', 0],
  ])('%s +- %s to %d digits is %s', (text, error, count, digits, exponent) => {
    expect(roundDecimalText(text, error, count)).toEqual({ negative: false, digits, exponent });
  });

  test('a boundary within the error leaves it undecided', () => {
    expect(roundDecimalText('2.5', '1e-30', 1)).toBe('undecided');
    expect(roundDecimalText('0', '1e-30', 1)).toBe('undecided');
  });

  test('keeps the sign, and zero has none', () => {
    expect(roundDecimalText('-1.25', '0', 2)).toEqual({ negative: true, digits: '12', exponent: 0 });
    expect(roundDecimalText('-0.000', '0', 4)).toEqual({ negative: false, digits: '0', exponent: 0 });
  });

  test('agrees with the rounding of doubles on their exact decimals', () => {
    const double = fc.double({ min: 1e-20, max: 1e20, noNaN: true });
    fc.assert(
      fc.property(double, fc.integer({ min: 1, max: 15 }), (value, count) => {
        expect(roundDecimalText(value.toExponential(100), '0', count)).toEqual(roundHalfEven(value, count));
      }),
      { seed: 20260205, numRuns: 3000 },
    );
  });
});
