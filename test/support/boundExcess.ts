import { background } from '../../src/cosmology/background.ts';
import type { Parameters } from '../../src/cosmology/parameters.ts';
import type { QuantityId } from '../../src/cosmology/quantities.ts';
import { Decimal } from '../../src/numerics/decimal.ts';
import { evaluateRows } from '../../src/tables/evaluateRows.ts';

export interface Model {
  readonly parameters: Parameters;
  readonly redshifts: readonly string[];
  /** `values[row][column]` */
  readonly values: readonly (readonly (string | null)[])[];
}

export interface Excess {
  readonly triples: number;
  /** Bound over true error, where there is one; sorted. */
  readonly ratios: readonly number[];
  readonly violations: readonly string[];
}

/** |value - truth|, exactly: a double is a finite decimal. */
export function trueError(value: number, truth: string): number {
  const error = Decimal.parse(value.toExponential(60)).minus(Decimal.parse(truth)).toNumber();
  return Math.abs(error);
}

/** How the bounds of all cells compare with their true errors. */
export function excess(columns: readonly QuantityId[], models: readonly Model[]): Excess {
  const ratios: number[] = [];
  const violations: string[] = [];
  let triples = 0;
  for (const { parameters, redshifts, values } of models) {
    const { rows } = evaluateRows(background(parameters), redshifts.map(Number));
    for (const [k, row] of rows.entries()) {
      for (const [c, id] of columns.entries()) {
        const [cell, truth] = [row[id], values[k]?.[c] ?? null];
        if (cell === null || truth === null) continue;
        triples++;
        const error = trueError(cell.value, truth);
        if (error > 0) ratios.push(cell.bound / error);
        if (!(cell.bound >= error)) {
          violations.push(`${id} at z = ${redshifts[k]} of ${JSON.stringify(parameters)}: ${error} > ${cell.bound}`);
        }
      }
    }
  }
  return { triples, ratios: ratios.sort((a, b) => a - b), violations };
}

export const median = (sorted: readonly number[]): number => sorted[Math.floor(sorted.length / 2)] ?? Number.NaN;
