/** Correlation coefficients, ones on the diagonal. */
export type CorrelationMatrix = readonly (readonly number[])[];

/** Contributions that cancel to less than this of the largest are rounding of the derivatives. */
const CANCELLED = 1e-9;

/**
 * The standard uncertainty sqrt(t R t^T) of a value, from the contributions t = c u of correlated parameters; NaN if
 * one of them does not exist.
 *
 * Source: JCGM 100:2008 (GUM), 5.2.2, eq. 16.
 */
export function combinedUncertainty(terms: readonly number[], r: CorrelationMatrix): number {
  let square = 0;
  let largest = 0;
  for (const [i, term] of terms.entries()) {
    square += term * term + term * correlatedWith(terms, r, i);
    largest = Math.max(largest, Math.abs(term)); // NaN stays NaN
  }
  const limit = CANCELLED * largest;
  return square <= limit * limit ? 0 : Math.sqrt(square);
}

/** The sum of r_ij t_j over the other parameters j. */
export function correlatedWith(terms: readonly number[], r: CorrelationMatrix, i: number): number {
  let sum = 0;
  for (const [j, other] of terms.entries()) if (j !== i) sum += (r[i]?.[j] as number) * other;
  return sum;
}
