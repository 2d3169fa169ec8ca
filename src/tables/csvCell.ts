import type { RoundedDigits } from '../numerics/roundHalfEven.ts';
import { roundValue } from './roundValue.ts';

/** Plain decimals for 1e-4 <= |x| < 1e12, scientific notation outside. */
const SMALLEST_PLAIN = -4;
const LARGEST_PLAIN = 11;

/**
 * A value as a CSV cell: rounded half to even to `digits` significant digits, trailing zeros kept, "" where the
 * quantity does not exist, "0" for zero. The rounded value decides between plain and `d.dddE-27` notation. `audited`
 * is the text to round where the double does not decide.
 */
export function csvCell(value: number | null, digits: number, audited?: string): string {
  return value === null ? '' : decimalText(roundValue(value, audited, digits));
}

/** Rounded digits as plain ASCII text. */
export function decimalText({ negative, digits, exponent }: RoundedDigits): string {
  const sign = negative ? '-' : '';
  if (exponent < SMALLEST_PLAIN || exponent > LARGEST_PLAIN) return `${sign}${scientific(digits)}E${exponent}`;
  return sign + plain(digits, exponent);
}

function scientific(digits: string): string {
  return digits.length > 1 ? `${digits[0]}.${digits.slice(1)}` : digits;
}

/** Digits with the point put where the exponent of the first digit says. */
export function plain(digits: string, exponent: number): string {
  if (exponent < 0) return `0.${'0'.repeat(-exponent - 1)}${digits}`;
  const whole = digits.slice(0, exponent + 1).padEnd(exponent + 1, '0');
  const decimals = digits.slice(exponent + 1);
  return decimals === '' ? whole : `${whole}.${decimals}`;
}
