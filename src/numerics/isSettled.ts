import { roundHalfEven } from './roundHalfEven.ts';

/** Powers of ten that doubles have: 10^-330 underflows, 10^309 overflows. */
const [SMALLEST, LARGEST] = [-330, 309];
const POWERS = Array.from({ length: LARGEST - SMALLEST + 1 }, (_, k) => Number(`1e${SMALLEST + k}`));

function tenTo(power: number): number {
  return POWERS[power - SMALLEST] ?? Number.NaN;
}

/**
 * Whether every number within [value - bound, value + bound] rounds to the same digits as `value`, at each of the
 * numbers of digits in `counts` (at most 12). A bound of 0 is an exact value, and always settled.
 *
 * Method: rounding changes half a unit of the last digit away from a rounded number. How far off that is, is seen from
 *         the value in those units; only when the bound, or the rounding of the division, comes near are both ends
 *         rounded.
 */
export function isSettled(value: number, bound: number, counts: readonly number[]): boolean {
  return (
    bound === 0 || counts.every((count) => isFarFromBoundary(value, bound, count) || endsAgree(value, bound, count))
  );
}

function isFarFromBoundary(value: number, bound: number, count: number): boolean {
  const size = Math.abs(value);
  const lowest = tenTo(count - 1);
  const unit = tenTo(Math.floor(Math.log10(size)) - count + 1);
  const inUnits = size / unit;
  // Two roundings of a number of `count` digits; then the logarithm may have missed the power of ten by one.
  const reach = bound / unit + inUnits * 2 * Number.EPSILON;
  const insideDecade = inUnits - lowest > reach + 1 && 10 * lowest - inUnits > reach + 1;
  return insideDecade && Math.abs(inUnits - Math.floor(inUnits) - 0.5) > reach;
}

function endsAgree(value: number, bound: number, count: number): boolean {
  // The ends are rounded to doubles themselves: a unit in the last place more covers that.
  const reach = bound + Math.abs(value) * Number.EPSILON;
  if (!(reach < Math.abs(value))) return false;
  const [low, high] = [roundHalfEven(value - reach, count), roundHalfEven(value + reach, count)];
  return low.digits === high.digits && low.exponent === high.exponent;
}
