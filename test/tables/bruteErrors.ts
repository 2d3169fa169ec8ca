import { type Background, background } from '../../src/cosmology/background.ts';
import { type Epoch, epochs } from '../../src/cosmology/epochs.ts';
import { QUANTITIES, type QuantityId } from '../../src/cosmology/quantities.ts';

/** A column between two rows, looked at in many places. */
export interface Interval {
  readonly rows: readonly [number, number];
  readonly z: readonly number[];
  readonly truths: readonly number[];
  /** Interpolated from the rows, linearly and by four points. */
  readonly linear: readonly number[];
  readonly lagrange: readonly number[];
}

/** So close to the lower row, as a share of the interval, that the limit towards it is read off. */
const NEXT_TO_ROW = 1e-6;

/**
 * Interpolation by Neville's scheme at `count` places in every interval whose ends have values, for one column after
 * the other. Written without the program's own interpolation, to judge it.
 */
export function everyInterval(
  model: Background,
  redshifts: readonly number[],
  count: number,
): (id: QuantityId) => readonly Interval[] {
  const shares = [NEXT_TO_ROW, ...Array.from({ length: count }, (_, i) => (i + 0.5) / count)];
  const z = redshifts.slice(1).map((hi, k) => shares.map((share) => within(redshifts[k] ?? 0, hi, share)));
  const [rows, places] = [epochs(model, redshifts), z.map((some) => epochs(model, some))];
  return (id) => {
    const value = (epoch: Epoch | null) => (epoch === null ? null : QUANTITIES[id](model, epoch));
    const all = rows.map(value);
    const usable = redshifts.flatMap((_, k) => (all[k] === null ? [] : [k]));
    return usable
      .filter((k) => usable.includes(k + 1))
      .map((k) => {
        const by = (around: readonly number[]) => {
          const points = around.map((row) => [redshifts[row] ?? 0, all[row] ?? 0] as const);
          return (z[k] ?? []).map((x) => neville(points, x));
        };
        return {
          rows: [all[k] ?? 0, all[k + 1] ?? 0],
          z: z[k] ?? [],
          truths: (places[k] ?? []).map((epoch) => value(epoch) ?? Number.NaN),
          linear: by([k, k + 1]),
          lagrange: by(nearestFour(usable, k)),
        };
      });
  };
}

function within(lo: number, hi: number, share: number): number {
  return lo + share * (hi - lo);
}

/** Two rows on either side, or the first or last four; blanks of these models stand at the beginning only. */
function nearestFour(usable: readonly number[], k: number): readonly number[] {
  const at = usable.indexOf(k);
  const first = Math.max(0, Math.min(at - 1, usable.length - 4));
  return usable.slice(first, first + 4);
}

function neville(points: readonly (readonly [number, number])[], x: number): number {
  let level = points.map(([, value]) => value);
  for (let width = 1; width < points.length; width++) {
    level = level.slice(1).map((right, i) => {
      const [a, b] = [points[i]?.[0] ?? 0, points[i + width]?.[0] ?? 0];
      return ((x - a) * right - (x - b) * (level[i] ?? 0)) / (b - a);
    });
  }
  return level[0] ?? Number.NaN;
}

/** Matter only, flat. */
export const EINSTEIN_DE_SITTER = background({
  H0: '50',
  Omega_m: '1',
  w0: '-1',
  wa: '0',
  T_CMB: '0',
  N_eff: '0',
  m_nu: [],
});
