import { expect, test } from 'vitest';
import { choleskyFactor } from '../../src/numerics/choleskyFactor.ts';
import { standardNormals } from '../support/standardNormals.ts';

const product = (factor: readonly (readonly number[])[]) =>
  factor.map((a) => factor.map((b) => a.reduce((sum, x, k) => sum + x * (b[k] ?? 0), 0)));

test('the factor of 4, 12, -16; 12, 37, -43; -16, -43, 98 is that of the textbook', () => {
  const matrix = [
    [4, 12, -16],
    [12, 37, -43],
    [-16, -43, 98],
  ];
  expect(choleskyFactor(matrix)).toEqual([
    [2, 0, 0],
    [6, 1, 0],
    [-8, 5, 3],
  ]);
});

test('factor times transpose gives back 200 random covariance matrices', () => {
  const normals = standardNormals(20260401);
  for (let n = 1; n <= 5; n++) {
    for (let count = 0; count < 40; count++) {
      const root = Array.from({ length: n }, () => Array.from({ length: n }, normals));
      const matrix = product(root);
      const back = product(choleskyFactor(matrix));
      const largest = Math.max(...matrix.flat().map(Math.abs));
      for (const [i, row] of matrix.entries())
        for (const [j, x] of row.entries()) expect(Math.abs((back[i]?.[j] ?? 0) - x)).toBeLessThan(1e-11 * largest);
    }
  }
});

test('a row that depends on those before it gets a zero on the diagonal', () => {
  const matrix = [
    [1, -1, 0.5],
    [-1, 1, -0.5],
    [0.5, -0.5, 1],
  ];
  const factor = choleskyFactor(matrix);
  expect(factor[1]).toEqual([-1, 0, 0]);
  expect(product(factor)).toEqual(matrix.map((row) => row.map((x) => expect.closeTo(x, 14))));
});

test('a matrix with a negative eigenvalue is refused', () => {
  expect(() =>
    choleskyFactor([
      [1, 1.1],
      [1.1, 1],
    ]),
  ).toThrow(RangeError);
});
