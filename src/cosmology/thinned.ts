/** Some of a list of rows, to stand for all. */
export interface Thinned {
  /** Indexes of the rows kept, ascending. */
  readonly rows: readonly number[];
  /** For each row of the list, which of the rows kept lies nearest. */
  readonly nearest: readonly number[];
}

/** Rows kept lie at least this far apart in ln(1+z): what varies from column to column hardly varies over it. */
const APART = 0.1;

/**
 * Thins ascending redshifts to at most ten for each factor e in 1+z. Kept besides: z = 0 does not stand for its
 * neighbours, because distances vanish there, and nothing else stands for it.
 */
export function thinned(redshifts: readonly number[]): Thinned {
  const rows: number[] = [];
  let last = Number.NEGATIVE_INFINITY;
  for (const [row, z] of redshifts.entries()) {
    if (z !== 0 && Math.log1p(z) - last < APART) continue;
    rows.push(row);
    last = z === 0 ? Number.NEGATIVE_INFINITY : Math.log1p(z);
  }
  return { rows, nearest: redshifts.map((z) => nearest(redshifts, rows, z)) };
}

function nearest(redshifts: readonly number[], rows: readonly number[], z: number): number {
  let best = 0;
  let distance = Number.POSITIVE_INFINITY;
  for (const [k, row] of rows.entries()) {
    const there = redshifts[row] as number;
    const away = (there === 0) !== (z === 0) ? Number.MAX_VALUE : Math.abs(Math.log1p(there) - Math.log1p(z));
    if (away < distance) [best, distance] = [k, away];
  }
  return best;
}
