import { epochs } from '../cosmology/epochs.ts';
import { MOST_REDSHIFTS } from '../inputs/expandGrid.ts';
import { type Segment, segmentSteps } from '../inputs/segmentSteps.ts';
import { Decimal } from '../numerics/decimal.ts';
import { type GridWish, NoAdvice } from './gridWish.ts';
import { interpolationErrors } from './interpolationErrors.ts';
import type { LargestError } from './interpolationTypes.ts';
import { neededStep, type Stretch, trials } from './neededStep.ts';
import { roundSteps } from './roundSteps.ts';

/** Steps below this are refused: so many decimals in a redshift help nobody. */
export const SMALLEST_STEP = Decimal.parse('1e-9');
/** Rows of the neighbouring pieces that can take part in interpolating within one. */
const NEIGHBOURS = 3;

/** A stretch of a grid with its step and its rows, both ends included. */
export interface Piece extends Stretch {
  readonly step: Decimal;
  readonly redshifts: readonly number[];
}

/** A stretch with the step that would serve it if it stood alone. */
export function firstPiece(wish: GridWish, stretch: Stretch): Piece {
  const { model, column, method, wanted, digits } = wish;
  const steps = [...roundSteps(stretch.to.minus(stretch.from), SMALLEST_STEP)];
  const tried = trials(model, [column], stretch, SMALLEST_STEP);
  const step = neededStep(tried, column, method, { wanted, digits, steps });
  return piece(wish, stretch, step);
}

/**
 * Makes the steps of pieces smaller until none has a larger error than wanted within the whole grid, and returns the
 * largest error that is left.
 */
export function madeFine(wish: GridWish, pieces: Piece[]): LargestError {
  const found = new Map<number, LargestError>();
  const waiting = new Set(pieces.keys());
  for (const k of waiting) {
    waiting.delete(k);
    const error = errorWithin(wish, pieces, k);
    found.set(k, error);
    if (error.relative <= wish.wanted) continue;
    pieces[k] = finer(wish, pieces[k] as Piece);
    refuseTooMany(wish, pieces);
    for (const again of [k - 1, k, k + 1]) if (again in pieces) waiting.add(again);
  }
  return [...found.values()].reduce((a, b) => (b.relative > a.relative ? b : a));
}

/** Pieces as the segments of a redshift grid; neighbours with the same step are one. */
export function segmentsOf(pieces: readonly Piece[]): readonly Segment[] {
  const segments: Segment[] = [];
  for (const { from, to, step } of pieces) {
    const last = segments.at(-1);
    if (last !== undefined && Decimal.parse(last.step).compare(step) === 0) {
      segments[segments.length - 1] = { ...last, to: String(to) };
    } else {
      segments.push({ from: String(from), to: String(to), step: String(step) });
    }
  }
  return segments;
}

function piece(wish: GridWish, { from, to }: Stretch, step: Decimal | undefined): Piece {
  const made = step && segmentSteps({ from: String(from), to: String(to), step: String(step) }, MOST_REDSHIFTS);
  if (!step || !made || 'wrong' in made) throw tooFine(wish, `between z = ${from} and ${to}`);
  return { from, to, step, redshifts: made.redshifts.map((redshift) => redshift.toNumber()) };
}

function finer(wish: GridWish, old: Piece): Piece {
  for (const step of roundSteps(old.to.minus(old.from), SMALLEST_STEP)) {
    if (step.compare(old.step) < 0) return piece(wish, old, step);
  }
  return piece(wish, old, undefined);
}

/** The largest error in one piece, with the rows around it that take part. */
function errorWithin({ model, column, method, digits }: GridWish, pieces: readonly Piece[], k: number): LargestError {
  const own = pieces[k]?.redshifts ?? [];
  const part = [own[0] ?? 0, own.at(-1) ?? 0] as const;
  const all = [...new Set(pieces.flatMap(({ redshifts }) => redshifts))];
  const redshifts = all.slice(Math.max(0, all.indexOf(part[0]) - NEIGHBOURS), all.indexOf(part[1]) + NEIGHBOURS + 1);
  const rows = epochs(model, redshifts);
  const [found] = interpolationErrors({ model, redshifts, epochs: rows, columns: [column], digits, part });
  const error = found?.[method];
  if (!error) throw new NoAdvice(`${column} cannot be interpolated between z = ${part[0]} and ${part[1]}.`);
  return error;
}

function refuseTooMany(wish: GridWish, pieces: readonly Piece[]): void {
  const rows = pieces.reduce((sum, { redshifts }) => sum + redshifts.length, 0);
  if (rows > MOST_REDSHIFTS) throw tooFine(wish, `from z = ${wish.from} to ${wish.to}`);
}

function tooFine({ column, wanted, digits }: GridWish, where: string): NoAdvice {
  return new NoAdvice(
    `An error of ${wanted.toExponential()} for ${column} ${where} would take more than ${MOST_REDSHIFTS.toLocaleString('en-US')} rows, ` +
      `or steps below ${SMALLEST_STEP}, or more than the ${digits} digits of a cell. Allow a larger error, choose a ` +
      'smaller range, or round ends.',
  );
}
