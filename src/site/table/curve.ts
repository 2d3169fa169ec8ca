import { line } from 'd3-shape';

/** Size of the drawing, in the units of its viewBox. */
export const CURVE = { width: 60, height: 16 } as const;
/** Drawn points; more cannot be seen at this size. */
const POINTS = 40;
/** Columns that span more than this factor are drawn in logarithms. */
const WIDE = 300;

/** Grids whose positive redshifts span more than this factor are drawn row by row, others over z. */
const LOGARITHMIC = 1e4;

/** The tiny curve over a column: which way it goes from the first row to the last, as an SVG path. */
export function curvePath(redshifts: readonly string[], values: readonly (number | null)[]): string {
  const across = abscissas(redshifts);
  const points = sample(values.map((value, i) => ({ x: across[i] ?? 0, value })));
  const known = points.flatMap(({ value }) => (value === null ? [] : [value]));
  if (known.length < 2) return '';
  const up = upwards(Math.min(...known), Math.max(...known));
  const path = line<{ x: number; value: number | null }>()
    .defined(({ value }) => value !== null)
    .x(({ x }) => 1 + x * (CURVE.width - 2))
    .y(({ value }) => 1 + (1 - up(value ?? 0)) * (CURVE.height - 2))
    .digits(1);
  return path(points) ?? '';
}

/** Where each row lies between the left and the right end, 0 to 1. */
function abscissas(redshifts: readonly string[]): number[] {
  const z = redshifts.map(Number);
  const first = z[0] ?? 0;
  const last = z.at(-1) ?? 1;
  const smallest = z.find((one) => one > 0) ?? last;
  const byRow = last / smallest > LOGARITHMIC || last === first;
  return z.map((one, i) => (byRow ? i / Math.max(1, z.length - 1) : (one - first) / (last - first)));
}

/** Height of a value between the lowest and the highest, 0 to 1. */
function upwards(lowest: number, highest: number): (value: number) => number {
  const scale = lowest > 0 && highest / lowest > WIDE ? Math.log : (value: number) => value;
  const span = scale(highest) - scale(lowest);
  return (value) => (span > 0 ? (scale(value) - scale(lowest)) / span : 0.5);
}

function sample<T>(all: readonly T[]): T[] {
  if (all.length <= POINTS) return [...all];
  return Array.from({ length: POINTS }, (_, i) => all[Math.round((i * (all.length - 1)) / (POINTS - 1))] as T);
}
