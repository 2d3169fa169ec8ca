import { roundDecimalText } from '../numerics/roundDecimalText.ts';
import type { RoundedDigits } from '../numerics/roundHalfEven.ts';
import { decimalText } from './csvCell.ts';

/** Significant digits of a standard uncertainty (JCGM 100:2008, 7.2.6). */
export const UNCERTAINTY_DIGITS = 2;

/** Digits to which a propagated uncertainty is good; the rest is the rounding of its derivatives. */
const GOOD_DIGITS = 9;

/**
 * A standard uncertainty to two significant digits, half to even. Ties are those of its first nine digits: where u is
 * a parameter's own uncertainty, as that of H at z = 0, it is a short decimal but for the noise of its derivative.
 */
export function roundUncertainty(u: number): RoundedDigits {
  const rounded = roundDecimalText(u.toExponential(GOOD_DIGITS - 1), '0', UNCERTAINTY_DIGITS);
  if (rounded === 'undecided') throw new RangeError(`the uncertainty ${u} does not round to two digits`);
  return rounded;
}

/** A standard uncertainty as a CSV cell: "" where there is none, "0" where the quantity is exact. */
export function uncertaintyCell(u: number | null): string {
  return u === null ? '' : decimalText(roundUncertainty(u));
}
