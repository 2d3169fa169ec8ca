import { expect, test } from 'vitest';
import { newtonPolynomial } from '../../src/numerics/newtonPolynomial.ts';

const NODES = [-1, -0.5, 0.25, 1, 4];

test('newtonPolynomial(nodes, values) through five points is the quartic that they lie on', () => {
  const quartic = (x: number) => 3 - x + 2 * x * x - 0.5 * x * x * x + 0.25 * x * x * x * x;
  const found = newtonPolynomial(NODES, NODES.map(quartic));
  for (const x of [...NODES, -0.75, 0, 2, 3.5, 6]) expect(Math.abs(found(x) - quartic(x))).toBeLessThan(1e-12);
});

test('newtonPolynomial through one point is constant', () => {
  expect(newtonPolynomial([2], [7])(100)).toBe(7);
});
