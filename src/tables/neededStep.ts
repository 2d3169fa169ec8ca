import type { Background } from '../cosmology/background.ts';
import { epochs } from '../cosmology/epochs.ts';
import type { QuantityId } from '../cosmology/quantities.ts';
import type { Decimal } from '../numerics/decimal.ts';
import { interpolationErrors } from './interpolationErrors.ts';
import type { ColumnInterpolation } from './interpolationTypes.ts';
import { roundSteps, stepCount } from './roundSteps.ts';

/** With two rows an error falls like the square of the step, with four like its fourth power. */
export const ORDER = { linear: 2, lagrange: 4 } as const;
export type Method = keyof typeof ORDER;

/** Steps that make more intervals than this in a stretch follow from the law of the error. */
const TRIED = 64;
/** Digits of cells whose rounding plays no part. */
const EXACT = 17;
/** Where the order that was found is lower than the law's by more than this, as near a zero of the column, it counts. */
const ORDER_SLACK = 0.5;
/** How much of the rounding of cells can enter a value interpolated between four evenly spaced rows. */
const ROUNDING_SHARE = 1.7;

/** A stretch of redshifts with one step. */
export interface Stretch {
  readonly from: Decimal;
  readonly to: Decimal;
}

/** Errors of the columns with one step all along a stretch. */
export interface Trial {
  readonly step: Decimal;
  readonly errors: readonly ColumnInterpolation[];
}

/** The errors with ever smaller round steps, rounding of cells apart, until the law of the error holds. */
export function* trials(
  model: Background,
  columns: readonly QuantityId[],
  { from, to }: Stretch,
  smallest: Decimal,
): Generator<Trial> {
  const width = to.minus(from);
  for (const step of roundSteps(width, smallest)) {
    const count = stepCount(width, step);
    const [lo, hi] = [from.toNumber(), to.toNumber()];
    const redshifts = Array.from({ length: count + 1 }, (_, k) => lo + (k / count) * (hi - lo));
    const rows = epochs(model, redshifts);
    yield { step, errors: interpolationErrors({ model, redshifts, epochs: rows, columns, digits: EXACT }) };
    if (count > TRIED) return;
  }
}

/**
 * The largest round step for which one column has an error of at most `wanted` in cells of `digits`: one that was
 * tried, otherwise by the law of the error from the last one tried. Undefined if none is large enough.
 */
export function neededStep(
  tried: Iterable<Trial>,
  column: QuantityId,
  method: Method,
  { wanted, digits, steps }: { wanted: number; digits: number; steps: Iterable<Decimal> },
): Decimal | undefined {
  const allowed = wanted - ROUNDING_SHARE * Number(`5e${-digits}`);
  let [last, before]: { step: number; error: number }[] = [];
  for (const { step, errors } of tried) {
    const error = errors.find((one) => one.column === column)?.[method]?.relative;
    if (error === undefined) continue;
    if (error <= allowed) return step;
    [last, before] = [{ step: step.toNumber(), error }, last];
  }
  if (last === undefined || allowed <= 0) return undefined;
  const found = before && Math.log(before.error / last.error) / Math.log(before.step / last.step);
  const order = found !== undefined && found < ORDER[method] - ORDER_SLACK ? Math.max(1, found) : ORDER[method];
  const largest = last.step * (allowed / last.error) ** (1 / order);
  for (const step of steps) if (step.toNumber() <= largest) return step;
  return undefined;
}
