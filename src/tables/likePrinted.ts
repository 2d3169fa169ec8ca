import { roundHalfEven } from '../numerics/roundHalfEven.ts';
import { plain } from './csvCell.ts';

/** Enough to tell any two doubles apart, so that rounding to them does not reach the next power of ten. */
const ALL_DIGITS = 17;

/**
 * A value beside a number that somebody printed, to be read together: in the same power of ten, with `more` decimals.
 * 13.797129 beside "13.80" with 1 more is "13.797"; 92.0387e-27 beside "9.20E-26" is "9.204E-26".
 */
export function likePrinted(value: number, printed: string, more: number): string {
  const [mantissa = '', power = '0'] = printed.toLowerCase().split('e');
  const shift = Number(power);
  const decimals = (mantissa.split('.')[1]?.length ?? 0) + more;
  const size = roundHalfEven(value, ALL_DIGITS).exponent - shift;
  const text = fixed(value, shift, size + decimals + 1, decimals);
  return shift === 0 ? text : `${text}E${shift}`;
}

/** `count` significant digits of value/10^shift, which are so many that `decimals` stand behind the point. */
function fixed(value: number, shift: number, count: number, decimals: number): string {
  if (value === 0 || count < 1) return plain('0'.repeat(decimals + 1), 0);
  const { negative, digits, exponent } = roundHalfEven(value, count);
  // A value that rounds up to the next power of ten has a digit more before the point.
  const all = digits.padEnd(exponent - shift + decimals + 1, '0');
  return (negative ? '-' : '') + plain(all, exponent - shift);
}
