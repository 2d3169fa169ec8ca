import { line } from 'd3-shape';

/** Size of the drawing, in the units of its viewBox. */
export const CURVE = { width: 60, height: 16 } as const;
/** Drawn points; more cannot be seen at this size. */
const POINTS = 40;
/** Columns that span more than this factor are drawn in logarithms. */
const WIDE = 300;

/** The tiny curve over a column: which way it goes from the first row to the last, as an SVG path. */
export function curvePath(values: readonly (number | null)[]): string {
  const drawn = sample(values);
  const known = drawn.filter((value) => value !== null);
  if (known.length < 2) return '';
  const lowest = Math.min(...known);
  const highest = Math.max(...known);
  const scale = lowest > 0 && highest / lowest > WIDE ? Math.log : (value: number) => value;
  const span = scale(highest) - scale(lowest);
  const height = (value: number) => (span > 0 ? (scale(value) - scale(lowest)) / span : 0.5);
  const path = line<number | null>()
    .defined((value) => value !== null)
    .x((_, i) => 1 + (i / (drawn.length - 1)) * (CURVE.width - 2))
    .y((value) => 1 + (1 - height(value ?? 0)) * (CURVE.height - 2))
    .digits(1);
  return path(drawn) ?? '';
}

function sample<T>(values: readonly T[]): T[] {
  if (values.length <= POINTS) return [...values];
  return Array.from({ length: POINTS }, (_, i) => values[Math.round((i * (values.length - 1)) / (POINTS - 1))] as T);
}
