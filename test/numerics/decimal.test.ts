import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { Decimal } from '../../src/numerics/decimal.ts';

const decimal = (text: string) => Decimal.parse(text);
/** Any decimal of up to 25 digits and an exponent that doubles can hold. */
const decimals = fc
  .record({ digits: fc.bigInt({ min: -(10n ** 25n), max: 10n ** 25n }), exponent: fc.integer({ min: -60, max: 40 }) })
  .map(({ digits, exponent }) => Decimal.parse(`${digits}e${exponent}`));

describe('reading', () => {
  test.each([
    ['0.30', '0.30'],
    ['67.36', '67.36'],
    ['-0.5', '-0.5'],
    ['.5', '0.5'],
    ['-.05', '-0.05'],
    ['5.', '5'],
    ['+3', '3'],
    ['007.10', '7.10'],
    ['1e-9', '0.000000001'],
    ['1.20E+3', '1200'],
    ['1.234e1', '12.34'],
    ['0', '0'],
    ['-0.0', '0.0'],
    ['0e5', '0'],
    ['0.0e-2', '0.000'],
  ])('%s prints as %s', (text, printed) => expect(decimal(text).toString()).toBe(printed));

  test.each(['', ' 1', '1 ', '1,5', 'abc', '.', '-', '1e', '0x10', '1_000', 'Infinity', '.nan', '１', '1e1.5'])(
    'refuses "%s"',
    (text) => expect(() => decimal(text)).toThrow(`"${text}" is not a decimal number such as 67.36 or 1e-9`),
  );

  test('refuses an exponent that no double can hold', () => {
    expect(() => decimal('1e401')).toThrowErrorMatchingInlineSnapshot(
      `[RangeError: "1e401" has an exponent beyond 400]`,
    );
    expect(() => decimal(`1e-${'9'.repeat(60)}`)).toThrow('has an exponent beyond 400');
  });

  test('quotes only the beginning of an endless number', () => {
    expect(() => decimal('1'.repeat(2000))).toThrow(`"${'1'.repeat(37)}..." is not a decimal number`);
  });
});

describe('arithmetic', () => {
  test('ten steps of 0.1 are 1.0, and three are 0.3', () => {
    const sums: Decimal[] = [];
    for (let sum = decimal('0'); sums.length < 10; sums.push(sum)) sum = sum.plus(decimal('0.1'));
    expect(sums.map(String)).toEqual(['0.1', '0.2', '0.3', '0.4', '0.5', '0.6', '0.7', '0.8', '0.9', '1.0']);
  });

  test('a sum has the decimals of the finer number', () => {
    expect(decimal('3').plus(decimal('0.010')).toString()).toBe('3.010');
    expect(decimal('1e3').minus(decimal('1')).toString()).toBe('999');
    expect(decimal('0.25').minus(decimal('0.250')).toString()).toBe('0.000');
  });

  test('a product has the decimals of both', () => {
    expect(decimal('-1.20').times(decimal('0.5')).toString()).toBe('-0.600');
  });

  test('0.3 and 0.30 compare as equal', () => {
    expect(decimal('0.3').compare(decimal('0.30'))).toBe(0);
    expect(decimal('-1').compare(decimal('0.5'))).toBe(-1);
    expect(decimal('1e2').compare(decimal('99.999'))).toBe(1);
  });

  test('zero has no sign', () => {
    expect(decimal('-0').sign()).toBe(0);
    expect(decimal('-0.00').isZero()).toBe(true);
    expect(Object.is(decimal('-0').toNumber(), 0)).toBe(true);
    expect(decimal('1e-400').isZero()).toBe(false);
  });

  test('sums agree with integers scaled by hand, differences undo them, and comparison agrees with the sign', () => {
    fc.assert(
      fc.property(decimals, decimals, (a, b) => {
        const scale = 10n ** 60n;
        const scaled = (d: Decimal) =>
          d.exponent < 0
            ? (d.digits * scale) / 10n ** BigInt(-d.exponent)
            : d.digits * scale * 10n ** BigInt(d.exponent);
        expect(scaled(a.plus(b))).toBe(scaled(a) + scaled(b));
        expect(a.plus(b).minus(b).compare(a)).toBe(0);
        expect(a.compare(b)).toBe(scaled(a) < scaled(b) ? -1 : scaled(a) > scaled(b) ? 1 : 0);
        expect(a.times(b).digits).toBe(a.digits * b.digits);
      }),
    );
  });
});

describe('to text and to a double', () => {
  test('printing and reading again keeps value and decimals', () => {
    fc.assert(
      fc.property(decimals, (a) => {
        const again = Decimal.parse(a.toString());
        expect(again.compare(a)).toBe(0);
        expect(again.toString()).toBe(a.toString());
      }),
    );
  });

  test('every finite double comes back from its shortest decimal', () => {
    fc.assert(
      fc.property(fc.double({ noDefaultInfinity: true, noNaN: true }), (x) => {
        expect(decimal(String(x)).toNumber()).toBe(x === 0 ? 0 : x);
      }),
    );
  });

  test('a decimal between two doubles goes to the nearer one, and to the even one from the middle', () => {
    const { EPSILON } = Number;
    expect(decimal('1.00000000000000011102230246251565404').toNumber()).toBe(1);
    expect(decimal('1.000000000000000111022302462515654042363166809082031251').toNumber()).toBe(1 + EPSILON);
    expect(decimal('1.00000000000000011102230246251565404236316680908203125').toNumber()).toBe(1);
  });

  test('numbers beyond the doubles become infinite or zero', () => {
    expect(decimal('-1e400').toNumber()).toBe(-Infinity);
    expect(decimal('1e-400').toNumber()).toBe(0);
  });
});
