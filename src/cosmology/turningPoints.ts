import { findRoot } from '../numerics/findRoot.ts';
import type { Background } from './background.ts';
import { conformalRateSquared } from './conformalRate.ts';

/** Epochs where the expansion rate vanishes, as ln a; undefined where it never does. */
export interface TurningPoints {
  /** The last bounce before today: there was no Big Bang. */
  readonly bounce?: number | undefined;
  /** The first maximum after today: the model recollapses. */
  readonly maximum?: number | undefined;
}

const STEP = 0.02;
/** Beyond these ends a single component rules: radiation or matter before a = 1e-30, one power of a after e^700. */
const EARLIEST = -70;
const LATEST = 700;

/**
 * The turning points of a model on either side of today.
 *
 * Method: (aE)^2 is followed in small steps of ln a; a step over a sign change, or a minimum that dips below zero
 *         between two steps, is refined to the last bit.
 */
export function turningPoints(model: Background): TurningPoints {
  return { bounce: firstZero(model, EARLIEST), maximum: firstZero(model, LATEST) };
}

function firstZero(model: Background, end: number): number | undefined {
  const rate = (s: number) => conformalRateSquared(model, s);
  const direction = Math.sign(end);
  let [before, here] = [0, 0];
  let [valueBefore, value] = [rate(0), rate(0)];
  for (let step = STEP; Math.abs(here) < Math.abs(end); ) {
    const next = here + direction * step;
    const valueNext = rate(next);
    if (valueNext <= 0) return findRoot(rate, here, next);
    if (value < valueBefore && value < valueNext) {
      const lowest = minimum(rate, before, next);
      if (rate(lowest) <= 0) return findRoot(rate, before, lowest);
    }
    [before, valueBefore, here, value] = [here, value, next, valueNext];
    if (!Number.isFinite(value)) return undefined;
    if (Math.abs(here) > 5) step *= 1.01;
  }
  return undefined;
}

/** The place of the lowest value between two ends of a unimodal function (golden section, Kiefer 1953). */
function minimum(f: (x: number) => number, from: number, to: number): number {
  const ratio = (Math.sqrt(5) - 1) / 2;
  let [a, b] = [from, to];
  let [c, d] = [b - ratio * (b - a), a + ratio * (b - a)];
  while (Math.abs(b - a) > 1e-9) {
    if (f(c) < f(d)) b = d;
    else a = c;
    [c, d] = [b - ratio * (b - a), a + ratio * (b - a)];
  }
  return (a + b) / 2;
}
