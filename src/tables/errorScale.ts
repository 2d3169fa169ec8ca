import { NEXT_TO_ZERO } from './betweenRows.ts';

/** Next to z = 0 a column in proportion to z is this far above one that grows like z squared. */
const PROPORTIONAL = Math.sqrt(NEXT_TO_ZERO * NEXT_TO_ZERO * NEXT_TO_ZERO);

/**
 * What an error in one interval is divided by: null for the true value at the same place.
 *
 * Near a zero of the column the error over the value has no bound, unless the zero is at a row and the column grows
 * from it in proportion, so that the error vanishes with the value. Otherwise it is the largest value in the interval.
 *
 * @param values true values from one end of the interval to the other
 * @param fromZero the interval begins at z = 0, and its second value is the one next to zero
 */
export function errorScale(values: readonly number[], fromZero: boolean): number | null {
  let [zeros, lowest, highest] = [0, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  for (const value of values) {
    if (value === 0) zeros++;
    if (value < lowest) lowest = value;
    if (value > highest) highest = value;
  }
  const crosses = lowest < 0 && highest > 0;
  if (zeros === 0 && !crosses) return null;
  const [first, second = 0] = values;
  const last = values.at(-1) ?? 0;
  const proportional = fromZero && first === 0 && Math.abs(second) > PROPORTIONAL * Math.abs(last);
  return proportional && zeros === 1 && !crosses ? null : Math.max(-lowest, highest);
}
