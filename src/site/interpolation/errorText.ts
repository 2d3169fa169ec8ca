import { ERROR_DIGITS } from '../../tables/interpolationTable.ts';
import { roundedUp } from '../../tables/roundedUp.ts';
import { writtenNumber } from '../writtenNumber.ts';

/** A largest error as HTML: two digits, rounded up; "" where there is none. */
export function errorText(relative: number | undefined): string {
  return relative === undefined ? '' : writtenNumber(roundedUp(relative, ERROR_DIGITS));
}
