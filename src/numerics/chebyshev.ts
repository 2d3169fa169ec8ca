import { CompensatedSum } from './compensatedSum.ts';

/** A function on [lo, hi] as a Chebyshev series. */
export interface ChebyshevSeries {
  readonly lo: number;
  readonly hi: number;
  /** c_0 is stored halved, so that the value is the plain sum of c_k T_k. */
  readonly coefficients: readonly number[];
}

/**
 * Interpolates f at the `size` Chebyshev points of [lo, hi].
 *
 * Source: Press et al., Numerical Recipes, 3rd ed., eq. 5.8.7.
 */
export function chebyshevSeries(f: (x: number) => number, lo: number, hi: number, size: number): ChebyshevSeries {
  // The angle k (2j+1) pi/2n is reduced in whole numbers: a large argument would cost the cosine its last digits.
  const cosine = (steps: number): number => Math.cos((Math.PI * (steps % (4 * size))) / (2 * size));
  const values = Array.from({ length: size }, (_, j) => f((lo + hi) / 2 + ((hi - lo) / 2) * cosine(2 * j + 1)));
  const coefficients = Array.from({ length: size }, (_, k) => {
    const sum = new CompensatedSum();
    for (const [j, value] of values.entries()) sum.add(value * cosine(k * (2 * j + 1)));
    return ((k === 0 ? 1 : 2) * sum.value) / size;
  });
  return { lo, hi, coefficients };
}

/** The series at x in [lo, hi], by Clenshaw's recurrence (Clenshaw 1955, Math. Comp. 9, 118). */
export function chebyshevValue(series: ChebyshevSeries, x: number): number {
  const t = (2 * x - series.lo - series.hi) / (series.hi - series.lo);
  let [b1, b2] = [0, 0];
  for (let k = series.coefficients.length - 1; k > 0; k--) {
    const b = 2 * t * b1 - b2 + (series.coefficients[k] ?? 0);
    b2 = b1;
    b1 = b;
  }
  return t * b1 - b2 + (series.coefficients[0] ?? 0);
}
