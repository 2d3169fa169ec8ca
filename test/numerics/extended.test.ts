import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, test } from 'vitest';
import { Arithmetic } from '../../src/numerics/extended/arithmetic.ts';
import { integrate } from '../../src/numerics/extended/integrate.ts';
import { integrateTail } from '../../src/numerics/extended/integrateTail.ts';
import { legendreRule } from '../../src/numerics/extended/legendreRule.ts';
import { startExtended } from '../../src/numerics/extended/library.ts';
import type { Real } from '../../src/numerics/extended/real.ts';
import { root } from '../../src/numerics/extended/root.ts';

beforeAll(startExtended);

/** |a - b| as a double; b is a decimal. */
const apart = (a: Real, arithmetic: Arithmetic, b: string) => a.minus(arithmetic.real(b)).magnitude().toNumber();

/** 50 digits each: OEIS A002162, A000796, A013661. */
const LN_2 = '0.69314718055994530941723212145817656807550013436026';
const PI = '3.14159265358979323846264338327950288419716939937511';
const ZETA_2 = '1.64493406684822643647241516664602518921894990120680';

describe.each([20, 34, 45])('with %i digits', (digits) => {
  const made = () => {
    const arithmetic = new Arithmetic(digits);
    return { arithmetic, allowed: 10 ** -digits };
  };

  test('a short integral and one of many octaves agree with the logarithm', () => {
    const { arithmetic, allowed } = made();
    const over = (hi: number) =>
      integrate(arithmetic, (x) => [x.reciprocal()], arithmetic.real(1), arithmetic.real(hi))[0] as Real;
    expect(apart(over(2), arithmetic, LN_2)).toBeLessThan(allowed);
    expect(apart(over(1024).over(10), arithmetic, LN_2)).toBeLessThan(allowed);
  });

  test('an interval without width has the integral 0', () => {
    const { arithmetic } = made();
    const zero = arithmetic.real(0);
    expect(integrate(arithmetic, (x) => [x.exp()], zero, zero)[0]?.sign()).toBe(0);
  });

  test('tails agree with closed forms: x/(e^x + 1) and sech x', () => {
    const { arithmetic, allowed } = made();
    const [fermi, sech] = integrateTail(
      arithmetic,
      (x) => [x.over(x.exp().plus(1)), x.cosh().reciprocal()],
      arithmetic.real(1),
    );
    expect(apart((fermi as Real).times(2), arithmetic, ZETA_2)).toBeLessThan(10 * allowed);
    expect(apart((sech as Real).times(2), arithmetic, PI)).toBeLessThan(10 * allowed);
  });

  test('a root is found to the working digits, and refused without a change of sign', () => {
    const { arithmetic, allowed } = made();
    const f = (x: Real) => x.exp().minus(2);
    const found = root(arithmetic, f, arithmetic.real(0), arithmetic.real(5));
    expect(apart(found, arithmetic, LN_2)).toBeLessThan(allowed);
    expect(() => root(arithmetic, f, arithmetic.real(1), arithmetic.real(5))).toThrow('no sign change');
  });
});

test('the 16-point rule is that of mpmath', () => {
  const reference = JSON.parse(readFileSync('test/reference/gaussLegendre16.json', 'utf8'));
  const arithmetic = new Arithmetic(34);
  const { nodes, weights } = legendreRule(arithmetic, 16);
  expect(reference.nodes).toHaveLength(16);
  for (const [k, node] of nodes.entries()) {
    const mirrored = 15 - k; // ours begin with the largest node
    expect(apart(node, arithmetic, reference.nodes[mirrored])).toBeLessThan(1e-29);
    expect(apart(weights[k] as Real, arithmetic, reference.weights[mirrored])).toBeLessThan(1e-29);
  }
});

describe('numbers and their scopes', () => {
  test('a number used after its scope is an error, not a wrong value', () => {
    const arithmetic = new Arithmetic(34);
    const lost = arithmetic.forget(() => arithmetic.real(3));
    arithmetic.real(4);
    expect(() => lost.plus(1)).toThrow('after its scope has ended');
  });

  test('a scope keeps what it returns, in any order, and outer numbers too', () => {
    const arithmetic = new Arithmetic(34);
    const outer = arithmetic.real(7);
    const kept = arithmetic.scope<[Real, Real, Real]>(() => {
      const [a, b] = [arithmetic.real(1), arithmetic.real(2)];
      return [b, a, outer];
    });
    arithmetic.real(9);
    expect(kept.map((one) => one.toNumber())).toEqual([2, 1, 7]);
    expect(arithmetic.scope<[Real]>(() => [outer])[0].toNumber()).toBe(7);
  });

  test('what is no finite number has no text', () => {
    const arithmetic = new Arithmetic(34);
    expect(() => arithmetic.real(1).over(0).toText()).toThrow(RangeError);
    expect(() => arithmetic.real('1,5')).toThrow('"1,5" is no decimal number');
  });
});
