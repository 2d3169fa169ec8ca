import { roundHalfEven } from './roundHalfEven.ts';

/** Digits of a double's decimal that are looked at; more cannot tell anything about the number behind a bound. */
const LOOKED_AT = 17;

/**
 * Whether every number within [value - bound, value + bound] rounds to the same digits as `value`, at each of the
 * numbers of digits in `counts` (at most 15). A bound of 0 is an exact value, and always settled.
 *
 * Method: rounding changes half a unit of the last digit away from a rounded number. The 17 digits of the double tell
 *         how far off that is; only when the bound comes near it are both ends rounded.
 */
export function isSettled(value: number, bound: number, counts: readonly number[]): boolean {
  if (bound === 0) return true;
  const [mantissa = '', power = '0'] = Math.abs(value)
    .toExponential(LOOKED_AT - 1)
    .split('e');
  const lastDigit = Number(`1e${Number(power) - LOOKED_AT + 1}`);
  const reach = bound / lastDigit + 2;
  // Just above a power of ten the interval may reach below it, where the digits are ten times finer.
  const nearPower = Number(mantissa.replace('.', '')) - tenTo(LOOKED_AT - 1) <= reach;
  return counts.every((count) => {
    if (nearPower) return endsAgree(value, bound, count);
    const tail = Number(mantissa.slice(count + 1));
    const half = 5 * tenTo(LOOKED_AT - count - 1);
    return reach < Math.abs(tail - half) || endsAgree(value, bound, count);
  });
}

function tenTo(power: number): number {
  return Number(`1e${power}`);
}

function endsAgree(value: number, bound: number, count: number): boolean {
  // The ends are rounded to doubles themselves: a unit in the last place more covers that.
  const reach = bound + Math.abs(value) * Number.EPSILON;
  if (!(reach < Math.abs(value))) return false;
  const [low, high] = [roundHalfEven(value - reach, count), roundHalfEven(value + reach, count)];
  return low.digits === high.digits && low.exponent === high.exponent;
}
