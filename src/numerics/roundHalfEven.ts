/** A number rounded to significant digits: 0.d1d2d3... x 10^(exponent + 1), or zero. */
export interface RoundedDigits {
  readonly negative: boolean;
  /** Exactly as many digits as asked for; "0" for zero. */
  readonly digits: string;
  /** Power of ten of the first digit. */
  readonly exponent: number;
}

/** The most decimals that the engine converts. */
const LONG = 100;

/**
 * The double `value` to `count` significant digits (1 to 20), correctly rounded, ties to even.
 *
 * Method: the engine's own conversion is correctly rounded but breaks ties upwards (ECMA-262, Number.prototype
 *         .toExponential), so ties are told apart here. A tie is a double m 2^-q that equals a decimal t 10^-r of
 *         count + 1 digits; its shortest decimal is then t itself. Where it merely looks so, the two differ by at least
 *         1/(t 2^q) relative, which a hundred decimals show for every |x| > 1e-70.
 * Errors: RangeError if value is not finite.
 */
export function roundHalfEven(value: number, count: number): RoundedDigits {
  if (!Number.isFinite(value)) throw new RangeError(`cannot round ${value} to ${count} digits`);
  if (value === 0) return { negative: false, digits: '0', exponent: 0 };
  const negative = value < 0;
  const size = Math.abs(value);
  const up = parts(size.toExponential(count - 1));
  if (!isTie(size, count)) return { negative, ...up };
  const exact = parts(size.toExponential(LONG));
  const even = Number(exact.digits[count - 1]) % 2 === 0;
  return even ? { negative, digits: exact.digits.slice(0, count), exponent: exact.exponent } : { negative, ...up };
}

function isTie(size: number, count: number): boolean {
  const shortest = parts(size.toExponential()).digits;
  if (shortest.length !== count + 1 || shortest[count] !== '5') return false;
  const { digits } = parts(size.toExponential(LONG));
  return digits[count] === '5' && /^0*$/.test(digits.slice(count + 1));
}

function parts(text: string): { digits: string; exponent: number } {
  const [mantissa = '', exponent = '0'] = text.split('e');
  return { digits: mantissa.replace('.', ''), exponent: Number(exponent) };
}
