const PATTERN = /^([+-]?)(?:(\d+)\.?(\d*)|\.(\d+))(?:[eE]([+-]?\d+))?$/;

/** No double reaches past 1e-324 or 1e309; a larger exponent is a slip, and its plain decimal would fill the memory. */
const LARGEST_EXPONENT = 400;
/** Far beyond anything that can be written by hand or told apart by a double (at most 767 digits). */
const MOST_CHARACTERS = 1000;

/**
 * An exact decimal number, never changed once made: `digits` x 10^`exponent`.
 *
 * Trailing zeros are kept as written, so that "0.30" stays "0.30"; sums and differences have the decimals of the
 * finer of the two. There is no division: its result need not be a finite decimal.
 */
export class Decimal {
  readonly digits: bigint;
  readonly exponent: number;

  private constructor(digits: bigint, exponent: number) {
    this.digits = digits;
    this.exponent = exponent;
  }

  /**
   * Reads "67.36", "-.5", "2.", "1e-9". Throws a RangeError that quotes the text when it is no finite decimal number,
   * or one whose size or length no computation here could use.
   */
  static parse(text: string): Decimal {
    const match = text.length <= MOST_CHARACTERS ? PATTERN.exec(text) : null;
    if (match === null) throw new RangeError(`"${shortened(text)}" is not a decimal number such as 67.36 or 1e-9`);
    const [, sign, whole = '', decimals = '', bare = '', power = '0'] = match;
    if (Math.abs(Number(power)) > LARGEST_EXPONENT) {
      throw new RangeError(`"${shortened(text)}" has an exponent beyond ${LARGEST_EXPONENT}`);
    }
    const magnitude = BigInt(whole + decimals + bare);
    return new Decimal(sign === '-' ? -magnitude : magnitude, Number(power) - decimals.length - bare.length);
  }

  plus(other: Decimal): Decimal {
    const exponent = Math.min(this.exponent, other.exponent);
    return new Decimal(this.scaledTo(exponent) + other.scaledTo(exponent), exponent);
  }

  minus(other: Decimal): Decimal {
    return this.plus(other.negated());
  }

  times(other: Decimal): Decimal {
    return new Decimal(this.digits * other.digits, this.exponent + other.exponent);
  }

  negated(): Decimal {
    return new Decimal(-this.digits, this.exponent);
  }

  /** -1, 0 or 1 as this is smaller than, equal to or larger than the other; 0.3 and 0.30 are equal. */
  compare(other: Decimal): -1 | 0 | 1 {
    return this.minus(other).sign();
  }

  sign(): -1 | 0 | 1 {
    if (this.digits === 0n) return 0;
    return this.digits < 0n ? -1 : 1;
  }

  isZero(): boolean {
    return this.digits === 0n;
  }

  /** The nearest double, ties to even; infinite beyond the range of doubles. */
  toNumber(): number {
    // Number() rounds a decimal string correctly; dividing two doubles would not.
    return Number(`${this.digits}e${this.exponent}`);
  }

  /** Plain decimal without exponent, e.g. "-0.30", "1000"; zero has no sign. */
  toString(): string {
    const magnitude = (this.digits < 0n ? -this.digits : this.digits).toString();
    const sign = this.digits < 0n ? '-' : '';
    if (this.exponent >= 0) return sign + (this.digits === 0n ? '0' : magnitude + '0'.repeat(this.exponent));
    const padded = magnitude.padStart(1 - this.exponent, '0');
    return `${sign}${padded.slice(0, this.exponent)}.${padded.slice(this.exponent)}`;
  }

  private scaledTo(exponent: number): bigint {
    return this.digits * BigInt(`1${'0'.repeat(this.exponent - exponent)}`);
  }
}

function shortened(text: string): string {
  return text.length <= 40 ? text : `${text.slice(0, 37)}...`;
}
