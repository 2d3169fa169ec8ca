import { line } from 'd3-shape';
import type { Column, EditionTables } from '../../tables/types.ts';
import { setsOf } from '../lookUp.ts';
import { columnValues, plotTable } from '../plotTables.ts';
import { setTitle } from '../setTitle.ts';
import { apart, type Side } from './apart.ts';
import { axisFor, type Tick } from './scales.ts';

/** One curve; positions run from 0 (left, top) to SPAN. */
export interface Curve {
  readonly title: string;
  /** The title in short, to stand at the end of the line. */
  readonly label: string;
  readonly letter: string;
  readonly path: string;
  /** Height of the label, 0 at the top, 1 at the foot. */
  readonly labelAt: number;
}

/** A column drawn over redshift for sets that can be told apart. */
export interface Plot {
  readonly curves: readonly Curve[];
  /** The side on which the curves are labelled; the axis of values stands on the other. */
  readonly side: Side;
  readonly across: readonly Tick[];
  readonly up: readonly Tick[];
  /** How many sets are not drawn because their curves would run into one that is. */
  readonly hidden: number;
}

/** Units of the drawing, in which paths are whole numbers. */
export const SPAN = 2000;
const POINTS = 120;
/** Letters of a label. */
const LABEL = 26;

/** Undefined where no grid suits a drawing, or the column exists in no set. */
export function plot(pressed: EditionTables, { id, topic }: Column): Plot | undefined {
  const all = setsOf(pressed).flatMap((set) => {
    const table = plotTable(pressed, set.id, topic);
    const values = table ? columnValues(table, id) : [];
    return table && values.some((value) => value !== null) ? [{ set, z: table.redshifts.map(Number), values }] : [];
  });
  const known = all.flatMap(({ values }) => values.filter((value) => value !== null));
  if (known.length === 0) return undefined;
  const vertical = axisFor(known, 5);
  const horizontal = axisFor([0, ...all.flatMap(({ z }) => z)], 10);
  const { chosen, side } = apart(
    all.map(({ values }) => values.map((v) => (v === null ? null : vertical.position(v)))),
  );
  return {
    side,
    across: horizontal.ticks,
    up: vertical.ticks,
    hidden: all.length - chosen.length,
    curves: chosen.flatMap(({ index, labelAt }, i) => {
      const curve = all[index];
      if (!curve) return [];
      return [
        {
          title: setTitle(curve.set),
          label: shortTitle(setTitle(curve.set)),
          letter: String.fromCharCode(97 + i),
          path: path(
            curve.z.map(horizontal.position),
            curve.values.map((v) => (v === null ? null : vertical.position(v))),
          ),
          labelAt: 1 - labelAt,
        },
      ];
    }),
  };
}

/** The first words of a title, as many as fit beside a plot. */
function shortTitle(title: string): string {
  const first = title.split(',')[0] ?? '';
  return first.length <= LABEL ? first : `${first.slice(0, first.lastIndexOf(' ', LABEL))} …`;
}

function path(across: readonly number[], up: readonly (number | null)[]): string {
  const count = Math.min(POINTS, across.length);
  const rows = Array.from({ length: count }, (_, i) => Math.round((i * (across.length - 1)) / (count - 1)));
  const draw = line<number>()
    .defined((row) => up[row] !== null)
    .x((row) => (across[row] ?? 0) * SPAN)
    .y((row) => (1 - (up[row] ?? 0)) * SPAN)
    .digits(0);
  return draw(rows) ?? '';
}
