import type { Background } from '../cosmology/background.ts';
import type { Epoch } from '../cosmology/epochs.ts';
import type { QuantityId } from '../cosmology/quantities.ts';
import { aroundPeaks, type Between, betweenRows, NEXT_TO_ZERO } from './betweenRows.ts';
import { errorScale } from './errorScale.ts';
import { type GridColumn, gridColumn, type Run } from './gridColumn.ts';
import type { ColumnInterpolation, LargestError } from './interpolationTypes.ts';
import { intervalErrors, MEASURES, type Measure } from './intervalErrors.ts';
import { type Peak, peakOf } from './peak.ts';

/** The largest errors are found to half a per cent from below, so that much is added. */
const FOUND_TO = 0.005;

/** A model on a grid, and the columns to look at. */
export interface Interpolated {
  readonly model: Background;
  readonly redshifts: readonly number[];
  /** The model at each redshift; null for epochs that never come. */
  readonly epochs: readonly (Epoch | null)[];
  readonly columns: readonly QuantityId[];
  /** Significant digits of the cells. */
  readonly digits: number;
  /** Only the intervals between these redshifts; all rows may take part in interpolating there. */
  readonly part?: readonly [number, number];
}

/**
 * The largest error of interpolating each column in z between the rows of a grid.
 *
 * An error is the difference from the true value plus what the rounding of the cells to `digits` can add. It is found
 * by evaluating the model at several places in every interval, and at more around the largest.
 *
 * The relative error is the error over the true value. In an interval where the column passes through zero, or leaves
 * zero faster than in proportion to z, as volumes do at z = 0, that has no bound; there it is the error over the
 * largest value in the interval. Intervals with a blank end are left out, as are those across an antipode of closed
 * space for columns that have a kink there.
 *
 * @returns one for each column; errors are never smaller than the true ones and at most 1 % larger
 */
export function interpolationErrors(asked: Interpolated): readonly ColumnInterpolation[] {
  const { model, redshifts, epochs, digits } = asked;
  const between = betweenRows(model, redshifts, asked.part);
  const columns = asked.columns.map((id) => gridColumn(id, model, redshifts, epochs, digits));
  const rough = columns.map((column) => roughPeaks(column, between));
  const finer = aroundPeaks(
    model,
    rough.flatMap((peaks) => Object.values(peaks)),
  );
  return columns.map((column, k) => {
    const peaks = refined(column, rough[k] ?? {}, finer);
    return {
      column: asked.columns[k] as QuantityId,
      linear: largest(peaks.linearRelative, peaks.linearAbsolute, redshifts),
      lagrange: largest(peaks.lagrangeRelative, peaks.lagrangeAbsolute, redshifts),
    };
  });
}

/** A peak with what is needed to look at it again. */
interface FoundPeak extends Peak {
  readonly run: Run;
  readonly scale: number | null;
}
/** None of them where nothing can be interpolated. */
type FoundPeaks = Readonly<Partial<Record<Measure, FoundPeak>>>;

function roughPeaks(column: GridColumn, between: readonly Between[]): FoundPeaks {
  const peaks: Partial<Record<Measure, FoundPeak>> = {};
  for (const places of between) {
    const run = column.runs[places.interval] ?? null;
    if (run === null) continue;
    const truths = places.epochs.map(column.at);
    const values = [column.cells[places.interval] ?? null, ...truths].filter((value) => value !== null);
    const scale = errorScale(values, column.redshifts[places.interval] === 0);
    const errors = intervalErrors(column, run, places, truths, scale);
    for (const measure of MEASURES) {
      const peak = peakOf(places, errors[measure], peaks[measure]?.size);
      if (peak !== null) peaks[measure] = { ...peak, run, scale };
    }
  }
  return peaks;
}

/** Each peak as it comes out of the finer places around it. */
function refined(column: GridColumn, peaks: FoundPeaks, finer: (peak: Peak) => Between): FoundPeaks {
  const found: Partial<Record<Measure, FoundPeak>> = {};
  for (const measure of MEASURES) {
    const peak = peaks[measure];
    if (!peak) continue;
    const places = finer(peak);
    const errors = intervalErrors(column, peak.run, places, places.epochs.map(column.at), peak.scale);
    found[measure] = { ...peak, ...peakOf(places, errors[measure]) };
  }
  return found;
}

function largest(
  relative: FoundPeak | undefined,
  absolute: FoundPeak | undefined,
  redshifts: readonly number[],
): LargestError | null {
  if (!relative || !absolute) return null;
  const [from = 0, to = 0] = redshifts.slice(relative.interval, relative.interval + 2);
  const atRow = relative.z - from <= 2 * NEXT_TO_ZERO * (to - from);
  return {
    relative: relative.size * (1 + FOUND_TO),
    z: atRow ? from : relative.z,
    absolute: absolute.size * (1 + FOUND_TO),
  };
}
