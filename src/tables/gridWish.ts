import type { Background } from '../cosmology/background.ts';
import type { QuantityId } from '../cosmology/quantities.ts';
import type { Decimal } from '../numerics/decimal.ts';
import type { Method } from './neededStep.ts';

/** What a redshift grid shall be good for. */
export interface GridWish {
  readonly model: Background;
  readonly column: QuantityId;
  readonly method: Method;
  /** Largest relative error of interpolation. */
  readonly wanted: number;
  readonly from: Decimal;
  readonly to: Decimal;
  /** Significant digits of the cells. */
  readonly digits: number;
}

/** No grid meets the wish; the message says why, and what would. */
export class NoAdvice extends Error {
  override name = 'NoAdvice';
}
