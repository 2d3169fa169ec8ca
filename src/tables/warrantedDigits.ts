import { roundHalfEven } from '../numerics/roundHalfEven.ts';
import { roundUncertainty } from './uncertaintyCell.ts';

/**
 * How many of the `digits` significant digits that are printed of a value its standard uncertainty warrants: those up
 * to the place of the first significant digit of u. All of them for a value without uncertainty (null) or exact in its
 * parameters (0); none where u is larger than the value in every place.
 */
export function warrantedDigits(value: number, u: number | null, digits: number): number {
  if (u === null || u === 0 || value === 0) return digits;
  const places = roundHalfEven(value, digits).exponent - roundUncertainty(u).exponent + 1;
  return Math.min(digits, Math.max(0, places));
}
