import type { Arithmetic } from './arithmetic.ts';
import { legendreRule } from './legendreRule.ts';
import type { Real } from './real.ts';

/** Several positive functions of one variable, evaluated together. */
export type Integrands = (x: Real) => readonly Real[];

/** Distance of the nearest singularity of the integrands, as a fraction of the upper end. Only the cost depends on it. */
const SINGULARITY = 0.8;
const LEAST_ORDER = 2;
const MOST_HALVINGS = 60;

/**
 * Integrals of positive, analytic functions from lo to hi, 0 <= lo <= hi, each to the working digits.
 *
 * Method: Gauss-Legendre with two orders; where they differ by more than the working digits allow, the interval is
 *         halved. The first order comes from the width of the interval: it converges like rho^(-2n), where rho is the
 *         sum of the half axes of the ellipse around the interval that reaches to the nearest singularity.
 * Errors: Error when 60 halvings are not enough.
 */
export function integrate(arithmetic: Arithmetic, f: Integrands, lo: Real, hi: Real): readonly Real[] {
  return arithmetic.scope(() => adaptive(arithmetic, f, lo, hi, MOST_HALVINGS));
}

function adaptive(arithmetic: Arithmetic, f: Integrands, lo: Real, hi: Real, halvings: number): readonly Real[] {
  const order = firstOrder(arithmetic, lo.toNumber(), hi.minus(lo).toNumber());
  if (order !== null) {
    const rough = applyRule(arithmetic, f, lo, hi, order);
    const fine = applyRule(arithmetic, f, lo, hi, order + Math.max(2, Math.ceil(order / 5)));
    if (fine.every((value, k) => agree(arithmetic, value, rough[k] as Real))) return fine;
  }
  if (halvings === 0) throw new Error(`an integral from ${lo.toNumber()} to ${hi.toNumber()} does not converge`);
  const middle = lo.plus(hi).over(2);
  const lower = adaptive(arithmetic, f, lo, middle, halvings - 1);
  const upper = adaptive(arithmetic, f, middle, hi, halvings - 1);
  return lower.map((value, k) => value.plus(upper[k] as Real));
}

/** The order that the width calls for; null where it is better to halve at once. */
function firstOrder({ digits }: Arithmetic, lo: number, width: number): number | null {
  if (width === 0) return LEAST_ORDER;
  const distance = 1 + (2 * SINGULARITY * (lo + width)) / width;
  const rho = distance + Math.sqrt(distance * distance - 1);
  const order = Math.ceil((digits * Math.LN10) / (2 * Math.log(rho))) + LEAST_ORDER;
  return order <= digits ? order : null;
}

function applyRule(arithmetic: Arithmetic, f: Integrands, lo: Real, hi: Real, order: number): readonly Real[] {
  const { nodes, weights } = legendreRule(arithmetic, order);
  return arithmetic.scope(() => {
    const halfWidth = hi.minus(lo).over(2);
    const centre = lo.plus(hi).over(2);
    let sums: readonly Real[] | undefined;
    for (const [k, node] of nodes.entries()) {
      const before = sums;
      sums = arithmetic.scope(() => {
        const values = f(centre.plus(halfWidth.times(node))).map((value) => value.times(weights[k] as Real));
        return before === undefined ? values : values.map((value, j) => value.plus(before[j] as Real));
      });
    }
    return (sums ?? []).map((sum) => sum.times(halfWidth));
  });
}

function agree(arithmetic: Arithmetic, fine: Real, rough: Real): boolean {
  const tolerance = fine.magnitude().times(arithmetic.powerOfTen(-arithmetic.digits));
  return !tolerance.below(fine.minus(rough).magnitude());
}
