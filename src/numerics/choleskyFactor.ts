/** A pivot this small against its diagonal element is nothing but rounding: the row depends on those before it. */
const ROUNDING = 1e-12;

/**
 * The lower triangular L with L L^T = matrix, for a symmetric matrix without negative eigenvalues. Rows that depend on
 * those before them get a zero on the diagonal.
 *
 * Source: A.-L. Cholesky; e.g. Golub & Van Loan, Matrix Computations, 4th ed., sect. 4.2.
 * Errors: RangeError where a pivot is negative beyond rounding.
 */
export function choleskyFactor(matrix: readonly (readonly number[])[]): readonly (readonly number[])[] {
  const factor = matrix.map((row) => row.map(() => 0));
  for (const [i, row] of matrix.entries()) {
    const own = factor[i] as number[];
    for (let j = 0; j < i; j++) {
      const other = factor[j] as number[];
      const pivot = other[j] as number;
      own[j] = pivot === 0 ? 0 : ((row[j] as number) - product(own, other, j)) / pivot;
    }
    const diagonal = row[i] as number;
    const rest = diagonal - product(own, own, i);
    if (rest < -ROUNDING * diagonal) throw new RangeError(`the matrix has a negative eigenvalue: pivot ${rest}`);
    own[i] = rest <= ROUNDING * diagonal ? 0 : Math.sqrt(rest);
  }
  return factor;
}

/** Scalar product of the first `count` elements. */
function product(a: readonly number[], b: readonly number[], count: number): number {
  let sum = 0;
  for (let k = 0; k < count; k++) sum += (a[k] as number) * (b[k] as number);
  return sum;
}
