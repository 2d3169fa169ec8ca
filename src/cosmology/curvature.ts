/** Below this |x| the series is used; its twelfth term, x^12/25!, is then far below the unit roundoff. */
const SERIES_LIMIT = 0.5;

/**
 * sinh(sqrt x)/sqrt x, continued to sin(sqrt(-x))/sqrt(-x) for x < 0: turns a line-of-sight comoving distance into a
 * transverse one, x = Omega_k (D_C/D_H)^2. Negative beyond the antipode of a closed space, x < -pi^2.
 *
 * Source: Hogg (1999), astro-ph/9905116, eq. 16; full accuracy for x -> 0 by the series sum x^k/(2k+1)!.
 */
export function transverseFactor(x: number): number {
  if (Math.abs(x) < SERIES_LIMIT) return series(x, (k) => 2 * k * (2 * k + 1));
  const r = Math.sqrt(Math.abs(x));
  return x > 0 ? Math.sinh(r) / r : Math.sin(r) / r;
}

/**
 * 3 (sinh(2r) - 2r)/(4 r^3), r = sqrt x, continued to x < 0: the volume out to a comoving distance over that of the
 * Euclidean ball. It goes on growing beyond the antipode, where light has crossed the same space before.
 *
 * Source: integral of Hogg (1999), eq. 28, in terms of D_C; series 3 sum (4x)^k 2/( (2k+3)! ) for x -> 0.
 */
export function volumeFactor(x: number): number {
  if (Math.abs(x) < SERIES_LIMIT) return series(4 * x, (k) => (2 * k + 2) * (2 * k + 3));
  const r = Math.sqrt(Math.abs(x));
  const difference = x > 0 ? Math.sinh(2 * r) - 2 * r : 2 * r - Math.sin(2 * r);
  return (3 * difference) / (4 * r * r * r);
}

/** 1 + x/d(1) (1 + x/d(2) (1 + ...)), from the inside out. */
function series(x: number, divisor: (k: number) => number): number {
  let value = 1;
  for (let k = 14; k > 0; k--) value = 1 + (x / divisor(k)) * value;
  return value;
}
