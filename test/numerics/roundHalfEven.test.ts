import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { roundHalfEven } from '../../src/numerics/roundHalfEven.ts';

/** The exact value of a double as a fraction, from its bits. */
function fraction(value: number): { numerator: bigint; denominator: bigint } {
  const view = new DataView(new ArrayBuffer(8));
  view.setFloat64(0, value);
  const bits = view.getBigUint64(0);
  const power = Number((bits >> 52n) & 0x7ffn);
  const mantissa = (bits & 0xfffffffffffffn) | (power === 0 ? 0n : 1n << 52n);
  const shift = Math.max(1, power) - 1075;
  return shift >= 0
    ? { numerator: mantissa << BigInt(shift), denominator: 1n }
    : { numerator: mantissa, denominator: 1n << BigInt(-shift) };
}

/** Whether digits x 10^(exponent + 1 - count) is the nearest decimal of its length, even on a tie: by whole numbers. */
function isCorrect(value: number, count: number, digits: string, exponent: number): boolean {
  const { numerator, denominator } = fraction(Math.abs(value));
  const scale = exponent + 1 - count;
  const [up, down] = scale >= 0 ? [1n, 10n ** BigInt(scale)] : [10n ** BigInt(-scale), 1n];
  const twice = 2n * (numerator * up - BigInt(digits) * denominator * down);
  const unit = denominator * down;
  const size = twice < 0n ? -twice : twice;
  return size < unit || (size === unit && BigInt(digits) % 2n === 0n);
}

describe('roundHalfEven(value, digits)', () => {
  test('is the nearest decimal for every double, ties to even', () => {
    const double = fc.double({ noNaN: true, noDefaultInfinity: true, min: 1e-60, max: 1e60 });
    fc.assert(
      fc.property(double, fc.integer({ min: 1, max: 17 }), fc.boolean(), (size, count, negative) => {
        const rounded = roundHalfEven(negative ? -size : size, count);
        expect(rounded.digits).toHaveLength(count);
        expect(rounded.negative).toBe(negative);
        expect(isCorrect(size, count, rounded.digits, rounded.exponent)).toBe(true);
      }),
      { seed: 20260203, numRuns: 5000 },
    );
  });

  test.each([
    [0.5, 1, '5', -1],
    [2.5, 1, '2', 0],
    [3.5, 1, '4', 0],
    [0.125, 2, '12', -1],
    [0.375, 2, '38', -1],
    [9.5, 1, '1', 1],
    [8.5, 1, '8', 0],
    [99.5, 2, '10', 2],
    [1234567890.5, 10, '1234567890', 9],
    [1234567891.5, 10, '1234567892', 9],
    [1.0000000005, 10, '1000000001', 0], // the double lies just above the tie
    [1.0000000015, 10, '1000000001', 0], // and this one just below
    [4.35, 2, '43', 0], // 4.3499999...
  ])('%d to %d digits is %s', (value, count, digits, exponent) => {
    expect(roundHalfEven(value, count)).toEqual({ negative: false, digits, exponent });
  });

  test('zero has one digit and no sign', () => {
    expect(roundHalfEven(-0, 10)).toEqual({ negative: false, digits: '0', exponent: 0 });
  });

  test.each([Number.NaN, Number.POSITIVE_INFINITY])('%d is refused', (value) => {
    expect(() => roundHalfEven(value, 10)).toThrow(`cannot round ${value} to 10 digits`);
  });
});
