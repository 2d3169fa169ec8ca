import { DomainError } from './errors.ts';

/**
 * The root of a continuous f between lo and hi, where f changes sign, to the last bit that f can tell.
 *
 * Method: regula falsi in the Illinois form, with a bisection whenever it has not halved the interval in three steps
 *         (Dahlquist & Bjorck 1974, sect. 6.4.3).
 * Errors: DomainError if f has the same sign at both ends.
 */
export function findRoot(f: (x: number) => number, lo: number, hi: number): number {
  let [a, b, fa, fb] = [lo, hi, f(lo), f(hi)];
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (!(fa * fb < 0)) throw new DomainError(`no sign change between ${lo} (${fa}) and ${hi} (${fb})`);
  let width = Math.abs(b - a);
  for (let step = 1; ; step++) {
    const bisect = step % 3 === 0 && Math.abs(b - a) > width / 2;
    if (step % 3 === 0) width = Math.abs(b - a);
    const secant = b - (fb * (b - a)) / (fb - fa);
    const inside = secant > Math.min(a, b) && secant < Math.max(a, b);
    const x = bisect || !inside ? (a + b) / 2 : secant;
    if (x === a || x === b) return Math.abs(fa) < Math.abs(fb) ? a : b;
    const fx = f(x);
    if (fx === 0) return x;
    if (fx * fb < 0) {
      [a, fa] = [b, fb];
    } else {
      fa /= 2;
    }
    [b, fb] = [x, fx];
    if (step > 500) return b;
  }
}
