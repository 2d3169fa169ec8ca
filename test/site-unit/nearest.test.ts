import { expect, test } from 'vitest';
import { nearest } from '../../src/client/nearest.ts';
import { bestGrid, type Grid } from '../../src/client/search/bestGrid.ts';

test.each([
  [0.5, { at: 1 }],
  [0.7, { below: 1, above: 2 }],
  [-0.1, { below: undefined, above: 0 }],
  [3, { below: 2, above: undefined }],
])('%d stands at %j in 0, 0.5, 1', (z, standing) => {
  expect(nearest([0, 0.5, 1], z)).toEqual(standing);
});

test('an empty list has no neighbours', () => {
  expect(nearest([], 1)).toEqual({ below: undefined, above: undefined });
});

const grid = (id: string, ...numbers: number[]): Grid => ({ id, title: id, redshifts: numbers.map(String), numbers });
const coarse = grid('coarse', 0, 0.5, 1, 1.5, 2);
const fine = grid('fine', 0, 0.25, 0.5, 0.75, 1);

test.each([
  ['on both grids, the finer', 0.5, 'fine'],
  ['at the first row of both, the finer', 0, 'fine'],
  ['on one grid only, that one', 1.5, 'coarse'],
  ['between rows of both, the finer', 0.6, 'fine'],
  ['enclosed by one only, that one', 1.7, 'coarse'],
  ['beyond both, the one that reaches further', 5, 'coarse'],
])('a redshift %s', (_, z, expected) => {
  expect(bestGrid([coarse, fine], z)?.grid.id).toBe(expected);
});

test('without grids there is no best one', () => {
  expect(bestGrid([], 1)).toBeUndefined();
});
