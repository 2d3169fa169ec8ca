import type { Arithmetic } from './arithmetic.ts';
import type { Real } from './real.ts';

/** A quadrature rule on [-1, 1]. */
export interface Rule {
  readonly nodes: readonly Real[];
  readonly weights: readonly Real[];
}

/**
 * The Gauss-Legendre rule with `order` nodes, exact for polynomials of degree 2 order - 1: the nodes are the roots of
 * the Legendre polynomial P_n, the weights 2/((1 - x^2) P_n'(x)^2).
 *
 * Source: Abramowitz & Stegun (1964), 25.4.29; P_n by its recurrence 22.7.10, P_n' by 22.8.5.
 * Method: Newton's iteration from x = cos(pi (k - 1/4)/(n + 1/2)), 22.16.6.
 */
export function legendreRule(arithmetic: Arithmetic, order: number): Rule {
  const all = arithmetic.remember(`Legendre ${order}`, () => {
    const pairs = Array.from({ length: order }, (_, k) => nodeAndWeight(arithmetic, order, k + 1));
    return [...pairs.map(([node]) => node), ...pairs.map(([, weight]) => weight)];
  });
  return { nodes: all.slice(0, order), weights: all.slice(order) };
}

function nodeAndWeight(arithmetic: Arithmetic, order: number, k: number): readonly [Real, Real] {
  return arithmetic.scope<[Real, Real]>(() => {
    let x = arithmetic.real(Math.cos((Math.PI * (k - 0.25)) / (order + 0.5)));
    // The start is good to four digits and each step doubles them; two steps more than that takes cost nothing.
    const steps = Math.ceil(Math.log2(arithmetic.bits / 12)) + 2;
    for (let step = 0; step < steps; step++) {
      const { value, slope } = legendre(arithmetic, order, x);
      x = x.minus(value.over(slope));
    }
    const { slope } = legendre(arithmetic, order, x);
    const weight = x.squared().negated().plus(1).times(slope.squared()).reciprocal().times(2);
    return [x, weight];
  });
}

/** P_n(x) and P_n'(x), |x| < 1. */
function legendre(arithmetic: Arithmetic, order: number, x: Real): { value: Real; slope: Real } {
  let before = arithmetic.real(1);
  let value = x;
  for (let n = 2; n <= order; n++) {
    const next = x
      .times(value)
      .times(2 * n - 1)
      .minus(before.times(n - 1))
      .over(n);
    [before, value] = [value, next];
  }
  const slope = x.times(value).minus(before).times(order).over(x.squared().minus(1));
  return { value, slope };
}
