import { lagrangeStencil, type Stencil } from '../numerics/lagrange.ts';
import type { Between } from './betweenRows.ts';
import type { GridColumn, Run } from './gridColumn.ts';

/** What is measured: either method, over the value and in the unit of the column. */
export const MEASURES = ['linearRelative', 'linearAbsolute', 'lagrangeRelative', 'lagrangeAbsolute'] as const;
export type Measure = (typeof MEASURES)[number];

/** One error for each place. */
export type Errors = Readonly<Record<Measure, readonly number[]>>;

/**
 * The errors of both methods at places within one interval of a run: the difference from the truth, plus half a unit
 * of the last digit of every cell as it enters.
 *
 * @param truths true values at the places; where one is null there is no error
 * @param scale divisor of the relative error; null for the true value
 */
export function intervalErrors(
  column: GridColumn,
  run: Run,
  places: Between,
  truths: readonly (number | null)[],
  scale: number | null,
): Errors {
  const linearAbsolute = absoluteErrors(column, stencils(column, run, places, 2), truths);
  const lagrangeAbsolute = absoluteErrors(column, stencils(column, run, places, 4), truths);
  const relative = (error: number, k: number) => (error === 0 ? 0 : error / (scale ?? Math.abs(truths[k] ?? 0)));
  return {
    linearAbsolute,
    lagrangeAbsolute,
    linearRelative: linearAbsolute.map(relative),
    lagrangeRelative: lagrangeAbsolute.map(relative),
  };
}

function absoluteErrors(
  { cells, halfUnits }: GridColumn,
  stencilAt: readonly Stencil[],
  truths: readonly (number | null)[],
): number[] {
  return stencilAt.map(({ first, weights }, k) => {
    const truth = truths[k] ?? null;
    if (truth === null) return 0;
    let [value, rounding] = [0, 0];
    for (let j = 0; j < weights.length; j++) {
      const weight = weights[j] ?? 0;
      value += weight * (cells[first + j] ?? 0);
      rounding += Math.abs(weight) * (halfUnits[first + j] ?? 0);
    }
    return Math.abs(value - truth) + rounding;
  });
}

/** Stencils by places, then by run and number of points: they are the same for most columns. */
const known = new WeakMap<Between, Map<string, readonly Stencil[]>>();

function stencils({ redshifts }: GridColumn, { start, end }: Run, places: Between, points: number): readonly Stencil[] {
  const here = known.get(places) ?? new Map<string, readonly Stencil[]>();
  known.set(places, here);
  // All rows that either method can take: two before the interval and two after it, or more on one side.
  const from = Math.max(start, places.interval - 2);
  const nodes = redshifts.slice(from, Math.min(end, places.interval + 4));
  const key = `${from} ${nodes.length} ${points}`;
  const found = here.get(key);
  if (found !== undefined) return found;
  const made = places.z.map((z) => {
    const { first, weights } = lagrangeStencil(nodes, places.interval - from, points, z);
    return { first: from + first, weights };
  });
  here.set(key, made);
  return made;
}
