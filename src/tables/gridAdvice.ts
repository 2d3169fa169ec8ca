import { epochs } from '../cosmology/epochs.ts';
import { QUANTITIES } from '../cosmology/quantities.ts';
import { turningPoints } from '../cosmology/turningPoints.ts';
import type { Segment } from '../inputs/segmentSteps.ts';
import { Decimal } from '../numerics/decimal.ts';
import { firstPiece, madeFine, SMALLEST_STEP, segmentsOf } from './gridPieces.ts';
import { type GridWish, NoAdvice } from './gridWish.ts';
import { interpolationErrors } from './interpolationErrors.ts';
import type { LargestError } from './interpolationTypes.ts';
import { roundBorders, roundSteps } from './roundSteps.ts';

/** A grid that meets the wish. */
export interface GridAdvice {
  /** As a redshift grid's file has them; steps are 1, 2 and 5 times powers of ten. */
  readonly segments: readonly Segment[];
  readonly rows: number;
  /** What this grid really has. */
  readonly largest: LargestError;
}

/** Steps of the first stretch above z = 0: with so many, four points have rows on either side. */
const FIRST_STEPS = '4';
/** With so many digits the rounding of cells plays no part. */
const EXACT = 17;

/**
 * The grid on which interpolating a column has no larger error than wanted, as `interpolationErrors` finds it. Each
 * stretch between two round redshifts gets the largest round step that serves it.
 *
 * @throws NoAdvice if there is none
 */
export function gridAdvice(wish: GridWish): GridAdvice {
  const { from, to } = wish;
  refuseOutOfRange(wish);
  refuseBlanks(wish, [from, to]);
  const borders = roundBorders(from, to, from.sign() <= 0 && to.sign() > 0 ? lowestBorder(wish) : from);
  refuseBlanks(wish, borders);
  const pieces = borders.slice(1).map((end, k) => firstPiece(wish, { from: borders[k] ?? end, to: end }));
  const largest = madeFine(wish, pieces);
  const rows = 1 + pieces.reduce((sum, { redshifts }) => sum + redshifts.length - 1, 0);
  return { segments: segmentsOf(pieces), rows, largest };
}

function refuseOutOfRange({ model, from, to }: GridWish): void {
  if (from.compare(to) >= 0) throw new NoAdvice(`The range must rise; it goes from ${from} to ${to}.`);
  const { bounce } = turningPoints(model);
  if (bounce === undefined || to.toNumber() < Math.expm1(-bounce)) return;
  const limit = Math.expm1(-bounce).toPrecision(6);
  throw new NoAdvice(`This set has no Big Bang but a bounce at z = ${limit}; the range must end below.`);
}

function refuseBlanks({ model, column }: GridWish, redshifts: readonly Decimal[]): void {
  const found = epochs(
    model,
    redshifts.map((redshift) => redshift.toNumber()),
  );
  const blank = redshifts.find((_, k) => {
    const epoch = found[k] ?? null;
    return epoch === null || QUANTITIES[column](model, epoch) === null;
  });
  if (blank === undefined) return;
  throw new NoAdvice(`${column} has no value at z = ${blank}. Choose a range where it exists, with --from and --to.`);
}

/** The end of the first stretch above z = 0: some steps of the size that serves right at the beginning. */
function lowestBorder({ model, column, method, wanted, to }: GridWish): Decimal {
  const first = Decimal.parse(FIRST_STEPS);
  const span = Decimal.parse(`1e${Math.ceil(Math.log10(to.toNumber()))}`);
  for (const step of roundSteps(span, SMALLEST_STEP)) {
    const border = step.times(first);
    if (border.compare(to) > 0) continue;
    const redshifts = Array.from({ length: first.toNumber() + 1 }, (_, k) => k * step.toNumber());
    const rows = epochs(model, redshifts);
    const [found] = interpolationErrors({ model, redshifts, epochs: rows, columns: [column], digits: EXACT });
    if ((found?.[method]?.relative ?? 0) <= wanted) return border;
  }
  throw new NoAdvice(`Next to z = 0, no step is small enough for ${column}. Begin above it, as in --from 0.001.`);
}
