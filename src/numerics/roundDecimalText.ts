import { Decimal } from './decimal.ts';
import type { RoundedDigits } from './roundHalfEven.ts';

/**
 * A decimal text, known to within `error`, to `count` significant digits, ties to even; 'undecided' if a rounding
 * boundary lies within the error and the text itself is not all there is. With an error of "0" the text is exact.
 *
 * Errors: RangeError if either text is no decimal number.
 */
export function roundDecimalText(text: string, error: string, count: number): RoundedDigits | 'undecided' {
  const value = Decimal.parse(text);
  const reach = Decimal.parse(error);
  if (reach.isZero()) return rounded(value, count);
  const [low, high] = [rounded(value.minus(reach), count), rounded(value.plus(reach), count)];
  const same = low.digits === high.digits && low.exponent === high.exponent && low.negative === high.negative;
  return same ? low : 'undecided';
}

function rounded(value: Decimal, count: number): RoundedDigits {
  if (value.isZero()) return { negative: false, digits: '0', exponent: 0 };
  const size = value.digits < 0n ? -value.digits : value.digits;
  const text = size.toString();
  const cut = text.length - count;
  const exponent = text.length - 1 + value.exponent;
  if (cut <= 0) return { negative: value.sign() < 0, digits: text.padEnd(count, '0'), exponent };
  const unit = BigInt(`1${'0'.repeat(cut)}`);
  const [kept, twice] = [size / unit, 2n * (size % unit)];
  const up = twice > unit || (twice === unit && kept % 2n === 1n);
  const digits = (up ? kept + 1n : kept).toString();
  const carried = digits.length > count;
  return { negative: value.sign() < 0, digits: digits.slice(0, count), exponent: carried ? exponent + 1 : exponent };
}
