import { expect, test } from 'vitest';
import { graduate } from '../../src/site/home/graduate.ts';
import { apart } from '../../src/site/quantity/apart.ts';

const positions = Array.from({ length: 101 }, (_, i) => i / 100);

test('an even scale is divided as far as the strokes keep their distance', () => {
  const values = positions.map((at) => 10 * at);
  expect(graduate(positions, values, 0.09).map(({ value }) => value)).toEqual([0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10]);
  expect(graduate(positions, values, 0.15).map(({ value }) => value)).toEqual([0, 2, 4, 6, 8, 10]);
});

test('a scale that narrows has fewer strokes where it is narrow', () => {
  const strokes = graduate(
    positions,
    positions.map((at) => 10 * at * at),
    0.03,
  );
  const near = strokes.filter(({ value }) => value < 2).length;
  expect(near).toBeGreaterThan(strokes.filter(({ value }) => value > 8).length);
  for (const [i, { at }] of strokes.entries())
    if (i > 0) expect(at - (strokes[i - 1]?.at ?? 0)).toBeGreaterThanOrEqual(0.027);
});

test('a scale that turns round carries its values on both sides', () => {
  const values = positions.map((at) => 4 * at * (1 - at));
  const half = graduate(positions, values, 0.02).filter(({ value }) => value === 0.5);
  expect(half).toHaveLength(2);
  expect(half[0]?.at).toBeCloseTo(0.1464, 3);
  expect(half[1]?.at).toBeCloseTo(0.8536, 3);
});

test('curves are labelled at the end where more of them can be told apart', () => {
  const right = apart([
    [0.5, 0.1],
    [0.5, 0.12],
    [0.5, 0.9],
  ]);
  expect(right).toEqual({
    side: 'right',
    chosen: [
      { index: 0, labelAt: 0.1 },
      { index: 2, labelAt: 0.9 },
    ],
  });
  expect(
    apart([
      [0.2, 1],
      [0.6, 1],
      [null, 1],
    ]).side,
  ).toBe('left');
});
