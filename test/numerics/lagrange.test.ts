import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { interpolated, lagrangeStencil } from '../../src/numerics/lagrange.ts';

const UNEVEN = [-1, -0.5, 0, 1, 1.25, 3, 4, 8];
const intervals = UNEVEN.slice(1).map((_, k) => k);

/** The value at a place t of 0 to 1 within an interval. */
function at(nodes: readonly number[], f: (x: number) => number, interval: number, points: number, t: number) {
  const [lo = 0, hi = 0] = nodes.slice(interval);
  const x = lo + t * (hi - lo);
  return { x, value: interpolated(nodes.map(f), lagrangeStencil(nodes, interval, points, x)) };
}

describe('lagrangeStencil(nodes, interval, points, x)', () => {
  test.each([
    [0, 0, 2],
    [1, 0, 2],
    [3, 2, 3],
    [6, 4, 6],
  ])('in interval %i takes four nodes from %i on, or two from the interval', (interval, first) => {
    const x = ((UNEVEN[interval] ?? 0) + (UNEVEN[interval + 1] ?? 0)) / 2;
    expect(lagrangeStencil(UNEVEN, interval, 4, x)).toMatchObject({ first, weights: { length: 4 } });
    expect(lagrangeStencil(UNEVEN, interval, 2, x)).toMatchObject({ first: interval, weights: [0.5, 0.5] });
  });

  test.each([
    [1, 2],
    [3, 4],
  ])('of degree %i repeats every polynomial of that degree, in every interval of an uneven grid', (degree, points) => {
    const coefficient = fc.integer({ min: -8, max: 8 });
    fc.assert(
      fc.property(
        fc.array(coefficient, { minLength: 1, maxLength: degree + 1 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (c, t) => {
          const f = (x: number) => c.reduceRight((sum, a) => sum * x + a, 0);
          for (const interval of intervals) {
            const { x, value } = at(UNEVEN, f, interval, points, t);
            expect(Math.abs(value - f(x))).toBeLessThan(1e-10);
          }
        },
      ),
      { seed: 7, numRuns: 200 },
    );
  });

  test('returns the value of a node at the node', () => {
    for (const interval of intervals) {
      expect(at(UNEVEN, Math.exp, interval, 4, 0).value).toBe(Math.exp(UNEVEN[interval] ?? 0));
      expect(at(UNEVEN, Math.exp, interval, 4, 1).value).toBe(Math.exp(UNEVEN[interval + 1] ?? 0));
    }
  });

  test.each([
    [2, 2, 4],
    [4, 4, 16],
  ])('with %i points is of order %i: half the step makes the error %i times smaller', (points, _, factor) => {
    const error = (steps: number) => {
      const nodes = Array.from({ length: steps + 1 }, (_, k) => k / steps);
      const errors = nodes.slice(1).map((_, k) => {
        const { x, value } = at(nodes, Math.exp, k, points, 0.5);
        return Math.abs(value - Math.exp(x));
      });
      return Math.max(...errors);
    };
    expect(error(50) / error(100)).toBeGreaterThan(0.95 * factor);
    expect(error(50) / error(100)).toBeLessThan(1.05 * factor);
  });

  test('uses all nodes where there are fewer than asked for', () => {
    const square = (x: number) => x * x;
    expect(at([0, 1, 3], square, 1, 4, 0.5).value).toBeCloseTo(4, 14);
    expect(at([0, 1], square, 0, 4, 0.5).value).toBe(0.5);
  });

  test.each([-1, 7, 0.5, Number.NaN])('refuses interval %f of eight nodes', (interval) => {
    expect(() => lagrangeStencil(UNEVEN, interval, 4, 0)).toThrow(`8 nodes have no interval ${interval}`);
  });
});
