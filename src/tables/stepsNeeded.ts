import type { Background } from '../cosmology/background.ts';
import type { QuantityId } from '../cosmology/quantities.ts';
import type { Decimal } from '../numerics/decimal.ts';
import { SMALLEST_STEP } from './gridPieces.ts';
import { type Method, neededStep, type Stretch, trials } from './neededStep.ts';
import { roundSteps } from './roundSteps.ts';

/** The step that each wanted error needs along a stretch, for both methods; undefined where there is none. */
export type StepsNeeded = Readonly<Record<Method, readonly (Decimal | undefined)[]>>;

/**
 * The largest round steps that divide a stretch and keep the relative error of interpolation within each of `wanted`,
 * in cells of `digits`. The smaller ones follow from the law of the error.
 */
export function stepsNeeded(
  model: Background,
  columns: readonly QuantityId[],
  stretch: Stretch,
  wanted: readonly number[],
  digits: number,
): ReadonlyMap<QuantityId, StepsNeeded> {
  const tried = [...trials(model, columns, stretch, SMALLEST_STEP)];
  const steps = [...roundSteps(stretch.to.minus(stretch.from), SMALLEST_STEP)];
  const needed = (column: QuantityId, method: Method) =>
    wanted.map((error) => neededStep(tried, column, method, { wanted: error, digits, steps }));
  return new Map(
    columns.map((column) => [column, { linear: needed(column, 'linear'), lagrange: needed(column, 'lagrange') }]),
  );
}
