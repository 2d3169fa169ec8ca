import { roundDecimalText } from '../numerics/roundDecimalText.ts';
import { type RoundedDigits, roundHalfEven } from '../numerics/roundHalfEven.ts';

/**
 * A value to `digits` significant digits. Where its double could not decide, the decimal text of the audit does; that
 * text is exact, or has many digits more than any page or file.
 */
export function roundValue(value: number, audited: string | undefined, digits: number): RoundedDigits {
  if (audited === undefined) return roundHalfEven(value, digits);
  const rounded = roundDecimalText(audited, '0', digits);
  if (rounded === 'undecided') throw new RangeError(`the audited value ${audited} does not round to ${digits} digits`);
  return rounded;
}
