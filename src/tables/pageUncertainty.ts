import { roundDecimalText } from '../numerics/roundDecimalText.ts';
import type { RoundedDigits } from '../numerics/roundHalfEven.ts';
import { pad, roundedCell, roundedPower, ZERO } from './pageCells.ts';
import { roundUncertainty, UNCERTAINTY_DIGITS } from './uncertaintyCell.ts';

/** How the values of a column are printed: in units of 10^exponent, padded to so many decimals. */
export interface ValueSetting {
  readonly exponent: number;
  readonly decimals: number;
}

/** A standard uncertainty by itself, as a page prints it: two digits, "0" for what is exact. */
export function pageUncertainty(u: number): string {
  return roundedCell(roundUncertainty(u), 0);
}

/**
 * A cell of a `.u.csv` as it stands below its value: in the power of ten of the column and with points aligned, so that
 * its digits stand below the digits of the value that they make uncertain. Where the value has no such decimals, the
 * uncertainty has a power of ten of its own. "" for a blank.
 *
 * Errors: RangeError if the cell is no decimal number.
 */
export function uncertaintyBelow(cell: string, { exponent, decimals }: ValueSetting): string {
  if (cell === '') return '';
  const rounded = roundDecimalText(cell, '0', UNCERTAINTY_DIGITS);
  if (rounded === 'undecided') throw new RangeError(`the uncertainty ${cell} does not round to two digits`);
  return `±${setBelow(rounded, exponent, decimals)}`;
}

function setBelow(rounded: RoundedDigits, shift: number, decimals: number): string {
  if (rounded.digits === ZERO) return pad(ZERO, decimals);
  const needed = UNCERTAINTY_DIGITS - 1 - (rounded.exponent - shift);
  return needed > decimals ? roundedPower(rounded, shift) : pad(roundedCell(rounded, shift), decimals);
}
