import { expect, test } from 'vitest';
import { isRound, lastPlace } from '../../src/site/table/roundness.ts';
import { rowGroups } from '../../src/site/table/rowGroups.ts';
import { thumbIndex } from '../../src/site/table/thumbIndex.ts';

const hundredths = Array.from({ length: 301 }, (_, i) => (i / 100).toFixed(2));
const tenths = Array.from({ length: 70 }, (_, i) => (3.1 + i / 10).toFixed(1));
const survey = [...hundredths, ...tenths];

function groups(redshifts: readonly string[]): string[] {
  return rowGroups(redshifts).map(({ start, end }) => redshifts.slice(start, end).join(' '));
}

test('rows stand in fives that begin at multiples of five, also behind a change of step', () => {
  expect(groups(survey).slice(58, 63)).toEqual([
    '2.90 2.91 2.92 2.93 2.94',
    '2.95 2.96 2.97 2.98 2.99',
    '3.00 3.1 3.2 3.3 3.4',
    '3.5 3.6 3.7 3.8 3.9',
    '4.0 4.1 4.2 4.3 4.4',
  ]);
});

test('uneven rows stand in fives as they come, and no group is cut to one or two', () => {
  expect(groups('0 0.01 0.02 0.05 0.1 0.3 0.4 0.5 0.6 0.7'.split(' '))).toEqual([
    '0 0.01 0.02 0.05 0.1',
    '0.3 0.4 0.5 0.6 0.7',
  ]);
  expect(groups('-0.90 -0.75 -0.60 -0.45 -0.30 -0.15 0.00'.split(' '))).toEqual([
    '-0.90 -0.75 -0.60 -0.45 -0.30',
    '-0.15 0.00',
  ]);
});

test('every row is in exactly one group of at most five', () => {
  const parts = rowGroups(survey);
  expect(parts.flatMap(({ start, end }) => survey.slice(start, end))).toEqual(survey);
  expect(Math.max(...parts.map(({ start, end }) => end - start))).toBe(5);
});

test('the last place of a decimal', () => {
  expect(['0.37', '0.50', '1.00', '-0.75', '1089.80', '1200', '10000'].map(lastPlace)).toEqual([
    -2, -1, 0, -2, -1, 2, 4,
  ]);
  expect(lastPlace('0.00')).toBe(Number.POSITIVE_INFINITY);
});

test('tenths are heavier among hundredths, whole numbers among tenths', () => {
  const heavy = survey.filter((_, row) => isRound(survey, row));
  expect(heavy.slice(0, 4)).toEqual(['0.00', '0.10', '0.20', '0.30']);
  expect(heavy.slice(-3)).toEqual(['8.0', '9.0', '10.0']);
});

test('the thumb index runs from first to last row over round values; short tables have none', () => {
  const thumbs = thumbIndex(survey);
  expect(thumbs[0]).toEqual({ row: 'z=0.00', text: '0' });
  expect(thumbs.at(-1)).toEqual({ row: 'z=10.0', text: '10' });
  expect(thumbs.map(({ text }) => text)).toContain('0.5');
  expect(thumbs.length).toBeLessThan(22);
  expect(thumbIndex(hundredths.slice(0, 40))).toEqual([]);
});
