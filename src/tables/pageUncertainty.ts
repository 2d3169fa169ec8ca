import { roundDecimalText } from '../numerics/roundDecimalText.ts';
import { LARGEST_PLAIN, pad, roundedPlain, roundedPower, ZERO } from './pageCells.ts';
import { UNCERTAINTY_DIGITS } from './uncertaintyCell.ts';

/** How the values of a column are printed: in units of 10^exponent, padded to so many decimals. */
export interface ValueSetting {
  readonly exponent: number;
  readonly decimals: number;
}

/**
 * A cell of a `.u.csv` as a page prints it below its value: in the power of ten of the column and with points aligned,
 * so that its digits stand below the digits of the value that they make uncertain. It has a power of ten of its own where
 * the value has one, or has no such decimals. "" for a blank.
 *
 * Errors: RangeError if the cell is no decimal number.
 */
export function uncertaintyBelow(cell: string, value: string, { exponent, decimals }: ValueSetting): string {
  if (cell === '') return '';
  const rounded = roundDecimalText(cell, '0', UNCERTAINTY_DIGITS);
  if (rounded === 'undecided') throw new RangeError(`the uncertainty ${cell} does not round to two digits`);
  if (rounded.digits === ZERO) return `±${pad(ZERO, decimals)}`;
  const size = rounded.exponent - exponent;
  const needed = UNCERTAINTY_DIGITS - 1 - size;
  const power = value.includes('×') || needed > decimals || size > LARGEST_PLAIN;
  return `±${power ? roundedPower(rounded, exponent) : pad(roundedPlain(rounded, exponent), decimals)}`;
}
