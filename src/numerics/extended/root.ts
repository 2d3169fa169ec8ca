import type { Arithmetic } from './arithmetic.ts';
import type { Real } from './real.ts';

const MOST_STEPS = 200;
/** The root is taken as found when a step moves it by less than this many digits beyond the working digits. */
const SPARE_DIGITS = 4;

/**
 * The root of a continuous function between lo and hi, where it changes sign, to a little more than the working digits.
 *
 * Source: Ridders (1979), IEEE Transactions on Circuits and Systems 26, 979. Each step takes out the exponential factor
 *         that would make the function linear in three equidistant points; the root stays enclosed.
 * Errors: Error when f has one sign at both ends, or when the steps do not end.
 */
export function root(arithmetic: Arithmetic, f: (x: Real) => Real, lo: Real, hi: Real): Real {
  const [found] = arithmetic.scope<[Real]>(() => [search(arithmetic, f, lo, hi)]);
  return found;
}

function search(arithmetic: Arithmetic, f: (x: Real) => Real, lo: Real, hi: Real): Real {
  let [a, b, fa, fb] = [lo, hi, f(lo), f(hi)];
  if (fa.sign() === 0) return a;
  if (fb.sign() === 0) return b;
  if (fa.sign() === fb.sign()) throw new Error(`no sign change between ${lo.toNumber()} and ${hi.toNumber()}`);
  let last = a;
  for (let step = 0; step < MOST_STEPS; step++) {
    const middle = a.plus(b).over(2);
    const fm = f(middle);
    if (fm.sign() === 0) return middle;
    const stretch = fm.over(fm.squared().minus(fa.times(fb)).sqrt());
    const x = middle.plus(middle.minus(a).times(stretch).times(fa.sign()));
    const fx = f(x);
    const moved = x.minus(last).magnitude();
    if (fx.sign() === 0 || moved.below(x.magnitude().times(arithmetic.powerOfTen(-arithmetic.digits - SPARE_DIGITS))))
      return x;
    last = x;
    if (fm.sign() !== fx.sign()) [a, fa, b, fb] = [middle, fm, x, fx];
    else if (fa.sign() !== fx.sign()) [b, fb] = [x, fx];
    else [a, fa] = [x, fx];
  }
  throw new Error(`no root found between ${lo.toNumber()} and ${hi.toNumber()}`);
}
