import { scaleLinear, scaleLog } from 'd3-scale';
import { writtenNumber } from '../writtenNumber.ts';

/** A stroke on an axis; `at` runs from 0 (left, bottom) to 1. */
export interface Tick {
  readonly at: number;
  /** "" for a stroke without a number. */
  readonly text: string;
}

export interface Axis {
  readonly position: (value: number) => number;
  readonly ticks: readonly Tick[];
}

/** Columns that span more than this factor are drawn in logarithms. */
const WIDE = 300;

/** An axis that holds all values, with about `count` numbers. */
export function axisFor(values: readonly number[], count: number): Axis {
  const lowest = Math.min(...values);
  const highest = Math.max(...values);
  return lowest > 0 && highest / lowest > WIDE ? logarithmic(lowest, highest, count) : linear(lowest, highest, count);
}

function linear(lowest: number, highest: number, count: number): Axis {
  const scale = scaleLinear([lowest, highest], [0, 1]).nice(count);
  const format = scale.tickFormat(count);
  return {
    position: scale,
    ticks: scale
      .ticks(count)
      .map((value) => ({ at: scale(value), text: writtenNumber(format(value).replace('−', '-').replaceAll(',', '')) })),
  };
}

/** Powers of ten only; where they are many, not every one is numbered. */
function logarithmic(lowest: number, highest: number, count: number): Axis {
  const scale = scaleLog([lowest, highest], [0, 1]).nice();
  const [from, to] = scale.domain().map((value) => Math.round(Math.log10(value)));
  const powers = Array.from({ length: (to ?? 0) - (from ?? 0) + 1 }, (_, i) => (from ?? 0) + i);
  const every = Math.ceil(powers.length / count);
  return {
    position: scale,
    ticks: powers.map((power) => ({
      at: scale(Number(`1e${power}`)),
      text: power % every === 0 ? `10${raised(power)}` : '',
    })),
  };
}

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

function raised(power: number): string {
  const digits = [...String(Math.abs(power))].map((digit) => RAISED[Number(digit)]).join('');
  return power < 0 ? `⁻${digits}` : digits;
}
