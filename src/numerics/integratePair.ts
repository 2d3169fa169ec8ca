import { CompensatedSum } from './compensatedSum.ts';
import { ConvergenceError } from './errors.ts';
import { NODES, RULE_SIZE, WEIGHTS } from './gaussLegendre.ts';

/** Writes two integrands at x into `out`. Both share their costly part, so both are integrated in one sweep. */
export type IntegrandPair = (x: number, out: Float64Array) => void;

export interface PairIntegral {
  readonly first: number;
  readonly second: number;
  /** Estimated truncation error of each integral; rounding is not included. */
  readonly firstError: number;
  readonly secondError: number;
  /** Calls of the integrand. */
  readonly evaluations: number;
}

/** Orders of the two highest Legendre coefficients that 16 nodes can resolve. */
const TOP_ORDERS = [RULE_SIZE - 2, RULE_SIZE - 1] as const;

/**
 * A panel is accepted when its estimated truncation error, relative to itself, is below a sixteenth of the unit
 * roundoff: adding up many panels then stays a matter of rounding alone.
 */
const ACCEPTED = 6.9e-18;
const DEEPEST = 60;

/** Signed nodes from left to right with their weights and the weighted Legendre values of TOP_ORDERS. */
const RULE = [
  ...NODES.map((x, j) => [-x, WEIGHTS[j] ?? 0] as const).reverse(),
  ...NODES.map((x, j) => [x, WEIGHTS[j] ?? 0] as const),
].map(([x, w]) => {
  const [top, next] = TOP_ORDERS.map((n) => ((2 * n + 1) / 2) * w * legendre(n, x));
  return { x, w, top: top ?? 0, next: next ?? 0 };
});

function legendre(n: number, x: number): number {
  let [previous, current] = [1, x];
  for (let k = 2; k <= n; k++) [previous, current] = [current, ((2 * k - 1) * x * current - (k - 1) * previous) / k];
  return current;
}

interface Panel {
  readonly values: readonly [number, number];
  /** Truncation error over value, for either integrand. */
  readonly errors: readonly [number, number];
}

/**
 * One panel by the 16-point rule, with an error estimate from the integrand's own Legendre series: a smooth integrand
 * has coefficients that fall geometrically, c_n ~ c_0 r^n, and the rule errs from order 32 on, so the error is about
 * c_0 r^32 < c_15^2 / c_0.
 */
function gaussPanel(integrand: IntegrandPair, lo: number, hi: number, out: Float64Array): Panel {
  const middle = (lo + hi) / 2;
  const half = (hi - lo) / 2;
  const sums = [0, 0, 0, 0, 0, 0];
  const [s0, s1] = [new CompensatedSum(), new CompensatedSum()];
  for (const { x, w, top, next } of RULE) {
    integrand(middle + half * x, out);
    const [f = 0, g = 0] = out;
    s0.add(w * f);
    s1.add(w * g);
    sums[0] = (sums[0] ?? 0) + top * f;
    sums[1] = (sums[1] ?? 0) + next * f;
    sums[2] = (sums[2] ?? 0) + top * g;
    sums[3] = (sums[3] ?? 0) + next * g;
  }
  const relative = (mean: number, a = 0, b = 0): number => {
    const fall = Math.max(Math.abs(a), Math.abs(b)) / mean;
    return mean === 0 ? 0 : fall * fall;
  };
  return {
    values: [s0.value * half, s1.value * half],
    errors: [relative(s0.value / 2, sums[0], sums[1]), relative(s1.value / 2, sums[2], sums[3])],
  };
}

/**
 * Integrals of two positive functions over [lo, hi], lo <= hi, in one sweep.
 *
 * Method:   16-point Gauss-Legendre panels, halved where the integrand's Legendre series has not died out; the panels
 *           are added from left to right with compensation, so the same input always gives the same bits.
 * Accuracy: a few units of roundoff for integrands that are analytic around [lo, hi].
 * Errors:   ConvergenceError with the panel where halving did not help.
 */
export function integratePair(integrand: IntegrandPair, lo: number, hi: number): PairIntegral {
  if (lo === hi) return { first: 0, second: 0, firstError: 0, secondError: 0, evaluations: 0 };
  const out = new Float64Array(2);
  const [first, second] = [new CompensatedSum(), new CompensatedSum()];
  let [firstError, secondError, panels] = [0, 0, 0];
  const waiting: [number, number, number][] = [[lo, hi, 0]];
  for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
    const [from, to, depth] = next;
    const { values, errors } = gaussPanel(integrand, from, to, out);
    panels++;
    if (errors[0] <= ACCEPTED && errors[1] <= ACCEPTED) {
      first.add(values[0]);
      second.add(values[1]);
      firstError += errors[0] * values[0];
      secondError += errors[1] * values[1];
      continue;
    }
    const middle = (from + to) / 2;
    if (depth >= DEEPEST || !(middle > from && middle < to)) {
      throw new ConvergenceError(
        `the integral over [${lo}, ${hi}] did not converge: relative error ${Math.max(...errors)} in the panel [${from}, ${to}]`,
      );
    }
    waiting.push([middle, to, depth + 1], [from, middle, depth + 1]);
  }
  return { first: first.value, second: second.value, firstError, secondError, evaluations: panels * RULE_SIZE };
}
