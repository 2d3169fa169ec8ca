/** Sweeps of the cyclic Jacobi method converge quadratically: ten parameters need five or six. */
const MOST_SWEEPS = 50;

/**
 * Smallest eigenvalue of a real symmetric matrix.
 *
 * Source:   C. G. J. Jacobi (1846), J. reine angew. Math. 30, 51: rotations that zero one pair of elements at a time.
 * Domain:   square, symmetric, finite, at least one row; meant for some tens of rows.
 * Accuracy: a few units of rounding of the largest element.
 */
export function smallestEigenvalue(matrix: readonly (readonly number[])[]): number {
  const a = matrix.map((row) => [...row]);
  for (let sweep = 0; sweep < MOST_SWEEPS && offDiagonal(a) > 0; sweep++) {
    for (let p = 0; p < a.length; p++) {
      for (let q = p + 1; q < a.length; q++) rotate(a, p, q);
    }
  }
  return Math.min(...a.map((_, i) => at(a, i, i)));
}

/** Turns rows and columns p and q so that their common element becomes zero. */
function rotate(a: number[][], p: number, q: number): void {
  const common = at(a, p, q);
  if (common === 0) return;
  const theta = (at(a, q, q) - at(a, p, p)) / (2 * common);
  // The smaller of the two angles; with it the method converges.
  const t = (theta < 0 ? -1 : 1) / (Math.abs(theta) + Math.hypot(theta, 1));
  const cosine = 1 / Math.hypot(t, 1);
  const sine = t * cosine;
  for (let k = 0; k < a.length; k++) combine(a, [k, p], [k, q], cosine, sine);
  for (let k = 0; k < a.length; k++) combine(a, [p, k], [q, k], cosine, sine);
  set(a, p, q, 0);
  set(a, q, p, 0);
}

type Index = readonly [number, number];

function combine(a: number[][], first: Index, second: Index, cosine: number, sine: number): void {
  const x = at(a, ...first);
  const y = at(a, ...second);
  set(a, ...first, cosine * x - sine * y);
  set(a, ...second, sine * x + cosine * y);
}

/** Largest element off the diagonal, or 0 when all are below the rounding of the diagonal. */
function offDiagonal(a: readonly (readonly number[])[]): number {
  const sizes = (keep: (i: number, j: number) => boolean) =>
    Math.max(0, ...a.flatMap((row, i) => row.filter((_, j) => keep(i, j)).map(Math.abs)));
  const off = sizes((i, j) => i !== j);
  return off > Number.EPSILON * Number.EPSILON * sizes((i, j) => i === j) ? off : 0;
}

function at(a: readonly (readonly number[])[], i: number, j: number): number {
  return a[i]?.[j] ?? Number.NaN;
}

function set(a: number[][], i: number, j: number, value: number): void {
  const row = a[i];
  if (row !== undefined) row[j] = value;
}
