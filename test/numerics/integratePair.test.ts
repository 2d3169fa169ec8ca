import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { ConvergenceError } from '../../src/numerics/errors.ts';
import { NODES, WEIGHTS } from '../../src/numerics/gaussLegendre.ts';
import { type IntegrandPair, integratePair } from '../../src/numerics/integratePair.ts';
import { expectClose } from '../support/closeness.ts';

const pair =
  (f: (x: number) => number, g: (x: number) => number): IntegrandPair =>
  (x, out) => {
    out[0] = f(x);
    out[1] = g(x);
  };

test('the nodes and weights are those of the 16-point Gauss-Legendre rule', () => {
  const { nodes, weights } = JSON.parse(readFileSync('test/reference/gaussLegendre16.json', 'utf8')) as {
    nodes: string[];
    weights: string[];
  };
  const positive = nodes.map((x, k) => [Number(x), Number(weights[k])] as const).filter(([x]) => x > 0);
  expect(NODES).toEqual(positive.map(([x]) => x));
  expect(WEIGHTS).toEqual(positive.map(([, w]) => w));
});

describe('integratePair(integrand, lo, hi)', () => {
  test('gives closed forms to rounding, both integrals in one sweep', () => {
    const { first, second } = integratePair(
      pair(Math.exp, (x) => 1 / (1 + x * x)),
      0,
      1,
    );
    expectClose(first, Math.E - 1, 4e-16, 'int exp');
    expectClose(second, Math.PI / 4, 4e-16, 'int 1/(1+x^2)');
  });

  test('needs one panel of 16 nodes for a polynomial that its Legendre series resolves', () => {
    const polynomial = pair(
      (x) => 1 + x * x * x,
      (x) => x * x,
    );
    const { first, second, evaluations } = integratePair(polynomial, 0, 1);
    expectClose(first, 1.25, 4e-16);
    expectClose(second, 1 / 3, 4e-16);
    expect(evaluations).toBe(16);
  });

  test('halves panels where the integrand bends, and reports an error and a cost', () => {
    const { first, firstError, evaluations } = integratePair(
      pair(
        (x) => 1 / (x * x + 1e-4),
        () => 1,
      ),
      -1,
      1,
    );
    expectClose(first, 200 * Math.atan(100), 2e-15);
    expect(firstError).toBeLessThan(1e-15 * first);
    expect(evaluations).toBe(496);
  });

  test('an empty interval is zero', () => {
    expect(
      integratePair(
        pair(
          () => 1 / 0,
          () => 1,
        ),
        2,
        2,
      ),
    ).toMatchObject({ first: 0, second: 0, evaluations: 0 });
  });

  test('a pole is a convergence error that names the panel', () => {
    const pole = pair(
      (x) => 1 / x,
      () => 1,
    );
    expect(() => integratePair(pole, 0, 1)).toThrow(ConvergenceError);
    expect(() => integratePair(pole, 0, 1)).toThrow(/the integral over \[0, 1\] did not converge.*panel \[0, /);
  });
});
