import type { Background } from '../cosmology/background.ts';
import { type Epoch, epochs } from '../cosmology/epochs.ts';
import { errorBounds } from '../cosmology/errorBounds.ts';
import { integralErrors } from '../cosmology/integralErrors.ts';
import { QUANTITIES, type QuantityId } from '../cosmology/quantities.ts';
import { turningPoints } from '../cosmology/turningPoints.ts';

/** A cell as the fast evaluation leaves it; null where the quantity does not exist. */
export interface Evaluated {
  readonly value: number;
  /** Bound on |value - truth|; 0 for exact values. */
  readonly bound: number;
}

/** The columns at one epoch. */
export type EvaluatedRow = Readonly<Record<QuantityId, Evaluated | null>>;

const ALL = Object.keys(QUANTITIES) as readonly QuantityId[];

export interface EvaluatedGrid {
  /** As the fast kernel left them; null for epochs that never come. */
  readonly epochs: readonly (Epoch | null)[];
  readonly rows: readonly EvaluatedRow[];
}

/** Every column of a model at the given redshifts, each with its error bound. */
export function evaluateRows(model: Background, redshifts: readonly number[]): EvaluatedGrid {
  const found = epochs(model, redshifts);
  const errors = integralErrors(model, turningPoints(model), redshifts);
  const rows = found.map((epoch, k) => {
    const integral = errors[k];
    const bounds = epoch === null || integral === undefined ? null : errorBounds(model, epoch, integral);
    return Object.fromEntries(
      ALL.map((id) => {
        const value = epoch === null ? null : QUANTITIES[id](model, epoch);
        return [id, value === null || bounds === null ? null : { value, bound: bounds.of(id, value) }];
      }),
    ) as EvaluatedRow;
  });
  return { epochs: found, rows };
}
