import type { Background } from '../cosmology/background.ts';
import { type Epoch, epochs } from '../cosmology/epochs.ts';
import type { Peak, Places } from './peak.ts';

/** Places in one interval, and the model there. */
export interface Between extends Places {
  /** null for epochs that never come. */
  readonly epochs: readonly (Epoch | null)[];
}

/**
 * Parts of an interval at whose ends it is looked at. They find the smooth maxima; a short table has wide intervals, in
 * which a column can bend more than once, and costs little.
 */
const PARTS = 8;
const PARTS_OF_SHORT = 32;
/** Intervals of a short table. */
const SHORT = 64;
/** The first place next to either row: where the column is small there, the error over the value rises steeply. */
const NEXT_TO_ROW = 1 / 64;

/**
 * Stands for the row at z = 0. Many columns begin there at zero, and the error over the value has a limit that can be
 * read off so close to it.
 */
export const NEXT_TO_ZERO = 2 ** -20;

/** Parts into which a peak is taken to pieces. */
const FINER = 8;

/** The model in every interval of a grid, rows included; `part`, if given, leaves out the intervals outside of it. */
export function betweenRows(
  model: Background,
  redshifts: readonly number[],
  part: readonly [number, number] = [Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY],
): readonly Between[] {
  const parts = redshifts.length <= SHORT ? PARTS_OF_SHORT : PARTS;
  const inside = Array.from({ length: parts - 1 }, (_, k) => (k + 1) / parts);
  const shares = [...new Set([NEXT_TO_ROW, ...inside, 1 - NEXT_TO_ROW])];
  const intervals = redshifts.slice(1).map((to, interval) => {
    const from = redshifts[interval] ?? to;
    const lowest = from === 0 ? NEXT_TO_ZERO * to : from;
    return { interval, z: [lowest, ...shares.map((share) => from + share * (to - from)), to] };
  });
  return evaluated(
    model,
    intervals.filter((_, k) => (redshifts[k] ?? 0) >= part[0] && (redshifts[k + 1] ?? 0) <= part[1]),
  );
}

/** The model at more places around each of the peaks; many columns have theirs in the same place. */
export function aroundPeaks(model: Background, peaks: readonly Peak[]): (peak: Peak) => Between {
  const key = ({ interval, from, to }: Peak) => `${interval} ${from} ${to}`;
  const wanted = [...new Map(peaks.map((peak) => [key(peak), peak])).values()];
  const places = wanted.map(({ interval, from, to }) => ({
    interval,
    z: Array.from({ length: FINER + 1 }, (_, k) => from + (k / FINER) * (to - from)),
  }));
  const found = new Map(evaluated(model, places).map((between, k) => [key(wanted[k] as Peak), between]));
  return (peak) => found.get(key(peak)) as Between;
}

/** All places in one sweep. */
function evaluated(model: Background, places: readonly Places[]): readonly Between[] {
  const found = epochs(
    model,
    places.flatMap(({ z }) => z),
  );
  let next = 0;
  return places.map((place) => {
    const start = next;
    next += place.z.length;
    return { ...place, epochs: found.slice(start, next) };
  });
}
