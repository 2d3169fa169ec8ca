import { ConvergenceError, DomainError } from '../numerics/errors.ts';
import { type Background, background } from './background.ts';
import { type Epoch, epochs } from './epochs.ts';
import { MILESTONE_NAMES, type MilestoneName } from './milestones.ts';
import { milestoneValues } from './milestoneValues.ts';
import type { Parameters } from './parameters.ts';
import { QUANTITIES, type QuantityId } from './quantities.ts';
import { turningPoints } from './turningPoints.ts';

/** Everything that the tables hold of one model, as one vector: the quantities row by row, then the milestones. */
export type Sweep = Float64Array;

const IDS = Object.keys(QUANTITIES) as readonly QuantityId[];
const FORMULAS = IDS.map((id) => QUANTITIES[id]);
const PLACES = new Map<string, number>(IDS.map((id, k) => [id, k]));

/** Where a quantity at the row of a redshift stands in a sweep. */
export function cellPlace(row: number, id: QuantityId): number {
  return row * IDS.length + (PLACES.get(id) as number);
}

/** Where a milestone stands in a sweep over so many rows. */
export function milestonePlace(rows: number, name: MilestoneName): number {
  return rows * IDS.length + MILESTONE_NAMES.indexOf(name);
}

/** Where what stands at a place of a sweep stands in one over other rows: `toRow` of the old one, of `rows` in all. */
export function placeAmong(place: number, oldRows: number, rows: number, toRow: (row: number) => number): number {
  const row = Math.floor(place / IDS.length);
  const shift = row < oldRows ? toRow(row) - row : rows - oldRows;
  return place + shift * IDS.length;
}

/**
 * All quantities at all redshifts, and all numeric milestones, of one model. NaN stands for what does not exist, words
 * included, and for everything that a model lacks which the kernel cannot evaluate: matter of negative density, or a
 * redshift beyond its bounce.
 */
export function sweep(parameters: Parameters, redshifts: readonly number[]): Sweep {
  const values = new Float64Array(redshifts.length * IDS.length + MILESTONE_NAMES.length).fill(Number.NaN);
  const model = background(parameters);
  if (!(model.H0 > 0) || model.matter < 0 || model.temperature < 0 || model.allMassless < 0) return values;
  try {
    fillRows(values, model, redshifts);
    fillMilestones(values, model, redshifts.length);
  } catch (error) {
    if (!(error instanceof DomainError || error instanceof ConvergenceError)) throw error;
  }
  return values;
}

function fillRows(values: Sweep, model: Background, redshifts: readonly number[]): void {
  const { bounce = Number.NEGATIVE_INFINITY } = turningPoints(model);
  const reached = redshifts.map((z, row) => ({ z, row })).filter(({ z }) => -Math.log1p(z) > bounce);
  const found = epochs(
    model,
    reached.map(({ z }) => z),
  );
  for (const [k, { row }] of reached.entries()) fillRow(values, model, found[k] ?? null, row * IDS.length);
}

function fillRow(values: Sweep, model: Background, epoch: Epoch | null, start: number): void {
  if (epoch === null) return;
  for (const [k, formula] of FORMULAS.entries()) values[start + k] = formula(model, epoch) ?? Number.NaN;
}

function fillMilestones(values: Sweep, model: Background, rows: number): void {
  const found = milestoneValues(model);
  for (const name of MILESTONE_NAMES) {
    const value = found[name];
    if (typeof value === 'number') values[milestonePlace(rows, name)] = value;
  }
}
