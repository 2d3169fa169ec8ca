import type { Arithmetic } from './arithmetic.ts';
import type { Integrands } from './integrate.ts';
import type { Real } from './real.ts';

/** Steps of t are halved from 1/4 to at most 1/2^13. */
const FIRST_STEP = 0.25;
const MOST_HALVINGS = 11;
/** Terms are left out when this many digits below the sum; two more than the working digits. */
const SPARE_DIGITS = 2;

/**
 * Integrals from 0 to infinity of positive, analytic functions of x that fall at least like exp(-x/scale).
 *
 * Method: trapezoidal rule in t, where x = scale exp(t - exp(-t)), steps halved until the working digits stay. The
 *         rule converges exponentially, since the transformed functions fall doubly exponentially at both ends.
 * Source: Takahasi & Mori (1974), Publ. RIMS 9, 721; the transformation is theirs for exponentially decaying functions.
 * Errors: Error when the step 1/2^13 is not fine enough.
 */
export function integrateTail(arithmetic: Arithmetic, f: Integrands, scale: Real): readonly Real[] {
  return arithmetic.scope(() => {
    let sums = lattice(arithmetic, f, scale, 0, FIRST_STEP);
    let step = FIRST_STEP;
    for (let halving = 0; halving < MOST_HALVINGS; halving++) {
      // The new nodes lie halfway between the old ones.
      const between = lattice(arithmetic, f, scale, step / 2, step);
      const finer = sums.map((sum, k) => sum.plus(between[k] as Real).over(2));
      const settled = finer.every((sum, k) => negligible(arithmetic, sum.minus(sums[k] as Real), sum, 0));
      if (settled) return finer;
      sums = finer;
      step /= 2;
    }
    throw new Error(`an integral to infinity does not converge with the step ${step}`);
  });
}

/** Trapezoidal sums over t = start + k step for all integers k. */
function lattice(arithmetic: Arithmetic, f: Integrands, scale: Real, start: number, step: number): readonly Real[] {
  const upwards = oneWay(arithmetic, f, scale, start, step, undefined);
  const all = oneWay(arithmetic, f, scale, start - step, -step, upwards);
  return all.map((sum) => sum.times(step));
}

function oneWay(
  arithmetic: Arithmetic,
  f: Integrands,
  scale: Real,
  start: number,
  step: number,
  from: readonly Real[] | undefined,
): readonly Real[] {
  let sums = from;
  for (let t = start, done = false; !done; t += step) {
    const before = sums;
    sums = arithmetic.scope(() => {
      const terms = termsAt(arithmetic, f, scale, t);
      // Past the peak of the transformed functions, which lies near t = 0, terms only fall.
      done =
        Math.abs(t) > 1 &&
        before !== undefined &&
        terms.every((term, k) => negligible(arithmetic, term, before[k] as Real, SPARE_DIGITS));
      return before === undefined ? terms : terms.map((term, k) => term.plus(before[k] as Real));
    });
  }
  return sums ?? [];
}

/** f(x) dx/dt at t. */
function termsAt(arithmetic: Arithmetic, f: Integrands, scale: Real, t: number): readonly Real[] {
  const decay = arithmetic.real(-t).exp();
  const x = scale.times(decay.negated().plus(t).exp());
  const slope = x.times(decay.plus(1));
  return f(x).map((value) => value.times(slope));
}

function negligible(arithmetic: Arithmetic, term: Real, sum: Real, spare: number): boolean {
  const limit = sum.magnitude().times(arithmetic.powerOfTen(-arithmetic.digits - spare));
  return !limit.below(term.magnitude());
}
