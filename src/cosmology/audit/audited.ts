import { Decimal } from '../../numerics/decimal.ts';
import { Arithmetic } from '../../numerics/extended/arithmetic.ts';

/** One value of the audit. */
export interface Audited {
  /** Decimal with at least the working digits. */
  readonly text: string;
  /** Bound on its error, a decimal: the change with sixteen digits more, and two units of the last working digit. */
  readonly error: string;
}

/** How many digits more the second evaluation has. */
const MORE_DIGITS = 16;
/** A value that shrinks by this power of ten with sixteen digits more is nothing but rounding: an exact zero. */
const VANISHING_DIGITS = 12;
/** Two digits of the working digits are not counted on: both evaluations could err alike in those. */
const UNCOUNTED_DIGITS = 2;

const arithmetics = new Map<number, Arithmetic>();

/** The arithmetic with so many working digits; its rules of integration are kept from call to call. */
function arithmeticOf(digits: number): Arithmetic {
  const known = arithmetics.get(digits) ?? new Arithmetic(digits);
  arithmetics.set(digits, known);
  return known;
}

/**
 * Values in order, evaluated twice: with the working digits, and with sixteen digits more. The second evaluation uses
 * other nodes for every integral, so that the difference shows errors of integration as well as of rounding. A value
 * that vanishes with more digits is a sum of terms that cancel exactly, and becomes an exact 0.
 *
 * Errors: Error when a value exists in one of the two evaluations only.
 */
export function twice(
  digits: number,
  evaluate: (arithmetic: Arithmetic) => readonly (string | null)[],
): readonly (Audited | null)[] {
  const run = (arithmetic: Arithmetic) => arithmetic.forget(() => evaluate(arithmetic));
  const values = run(arithmeticOf(digits));
  const finer = run(arithmeticOf(digits + MORE_DIGITS));
  return values.map((text, k) => {
    const other = finer[k] ?? null;
    if ((text === null) !== (other === null)) throw new Error('a value exists with one working precision only');
    return text === null || other === null ? null : compared(text, other, digits);
  });
}

function compared(text: string, finer: string, digits: number): Audited {
  const [value, other] = [Decimal.parse(text), Decimal.parse(finer)];
  const vanishing = magnitude(value).times(Decimal.parse(`1e-${VANISHING_DIGITS}`));
  if (magnitude(other).compare(vanishing) <= 0) return { text: '0', error: '0' };
  const floor = value.times(Decimal.parse(`1e${UNCOUNTED_DIGITS - digits}`));
  return { text, error: magnitude(value.minus(other)).plus(magnitude(floor)).toString() };
}

function magnitude(value: Decimal): Decimal {
  return value.sign() < 0 ? value.negated() : value;
}
