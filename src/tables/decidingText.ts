import type { Audited } from '../cosmology/audit/audited.ts';
import { roundDecimalText } from '../numerics/roundDecimalText.ts';
import { decimalText } from './csvCell.ts';

/** Digits that the audit works with when it settles a cell. */
export const WORKING_DIGITS = 34;
/**
 * Digits that are kept of a settled value. The ten behind them absorb the rounding of the audit, so that a value which
 * is exactly a tie, such as 2.7255 x 1.001, stands there as one and goes to even. A value that only comes as near to a
 * tie as 1e-24 of itself would be taken for one; among all cells ever printed none is to be expected.
 */
const KEPT_DIGITS = 24;
/** Relative error that leaves the kept digits as they are, but for a unit of the last. */
const LARGEST_ERROR = 1e-25;

/**
 * The decimal text that decides all roundings of an audited value.
 *
 * Errors: RangeError when the audit is not sure of the kept digits.
 */
export function decidingText({ text, error }: Audited): string {
  const kept = roundDecimalText(text, '0', KEPT_DIGITS);
  if (kept === 'undecided' || Number(error) > LARGEST_ERROR * Math.abs(Number(text))) {
    throw new RangeError(`the audit gives ${text} within ${error}, too little to settle a cell`);
  }
  return decimalText(kept);
}
