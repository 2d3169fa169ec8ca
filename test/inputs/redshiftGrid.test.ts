import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { contentOf, report } from './goodContent.ts';

const grid = (text: string) => `title: Grid\n${text}\n`;
const bad = (text: string) => report({ 'redshift-grids/short.yaml': grid(text) });
const redshifts = (text: string) =>
  contentOf({ 'redshift-grids/short.yaml': grid(text) }).redshiftGrids[0]?.redshifts.join(' ');

describe('redshifts', () => {
  test('have the decimals of their step, or of an end that has more', () => {
    expect(redshifts('segments: [{from: 0, to: 0.04, step: 0.01}]')).toBe('0.00 0.01 0.02 0.03 0.04');
    expect(redshifts('segments: [{from: 0, to: 1.00, step: 0.5}]')).toBe('0.00 0.50 1.00');
    expect(redshifts('segments: [{from: 0.000, to: 1, step: 0.5}]')).toBe('0.000 0.500 1.000');
    expect(redshifts('segments: [{from: 0, to: 2e-3, step: 1e-3}]')).toBe('0.000 0.001 0.002');
  });
  test('keep the first writing where segments join', () => {
    expect(redshifts('segments: [{from: 0, to: 1, step: 0.50}, {from: 1, to: 3, step: 1}]')).toBe('0.00 0.50 1.00 2 3');
  });
  test('may leave a gap between segments', () => {
    expect(redshifts('segments: [{from: 0, to: 1, step: 1}, {from: 3, to: 4, step: 1}]')).toBe('0 1 3 4');
  });
  test('of single values keep their own digits and take their places', () => {
    expect(redshifts('segments: [{from: 0, to: 1, step: 0.5}]\nvalues: [1e-4, 0.7300, 1089.80]')).toBe(
      '0.0 0.0001 0.5 0.7300 1.0 1089.80',
    );
  });
  test('reach into the future', () => {
    expect(redshifts('segments: [{from: -0.5, to: 0.5, step: 0.25}]')).toBe('-0.50 -0.25 0.00 0.25 0.50');
    expect(redshifts('values: [-0.999, -0.0, 5]')).toBe('-0.999 0.0 5');
  });
  test('of any segment are from + k x step to the last digit', () => {
    const segment = fc.record({
      from: fc.integer({ min: -99, max: 999 }),
      step: fc.integer({ min: 1, max: 999 }),
      count: fc.integer({ min: 1, max: 50 }),
    });
    fc.assert(
      fc.property(segment, ({ from, step, count }) => {
        const hundredths = (k: number) =>
          (k < 0 ? '-' : '') + String(Math.abs(k)).padStart(3, '0').replace(/(..)$/, '.$1');
        const expected = Array.from({ length: count + 1 }, (_, k) => hundredths(from + k * step));
        const text = `segments: [{from: ${hundredths(from)}, to: ${expected[count]}, step: ${hundredths(step)}}]`;
        expect(redshifts(text)).toBe(expected.join(' '));
      }),
    );
  });
});

describe('refused', () => {
  test('nothing', () =>
    expect(report({ 'redshift-grids/short.yaml': 'title: Grid\n' })).toMatchInlineSnapshot(`
    "redshift-grids/short.yaml:1:1  the grid has no redshifts  expected segments, or values, or both
    1 problem in 1 file"
  `));
  test('empty lists', () =>
    expect(bad('segments: []\nvalues: []')).toMatchInlineSnapshot(`
    "redshift-grids/short.yaml:1:1  the grid has no redshifts  expected segments, or values, or both
    1 problem in 1 file"
  `));
  test('a step that misses the end', () =>
    expect(bad('segments: [{from: 0, to: 1, step: 0.3}]')).toMatchInlineSnapshot(`
      "redshift-grids/short.yaml:2:35  step 0.3 does not lead from 0 to 1  expected a step that divides the segment: around its end come 0.9 and 1.2
      1 problem in 1 file"
    `));
  test('a step of zero', () =>
    expect(bad('segments: [{from: 0, to: 1, step: 0}]')).toMatchInlineSnapshot(`
    "redshift-grids/short.yaml:2:35  segments entry 1.step is 0  expected a step in redshift, greater than 0
    1 problem in 1 file"
  `));
  test('a step below zero', () =>
    expect(bad('segments: [{from: 1, to: 0, step: -0.1}]')).toMatchInlineSnapshot(`
    "redshift-grids/short.yaml:2:35  segments entry 1.step is -0.1  expected a step in redshift, greater than 0
    1 problem in 1 file"
  `));
  test('an end before the start', () =>
    expect(bad('segments: [{from: 1, to: 0, step: 0.1}]')).toMatchInlineSnapshot(`
      "redshift-grids/short.yaml:2:26  the segment ends at 0  expected more than its start, 1
      1 problem in 1 file"
    `));
  test('a step too small', () =>
    expect(bad('segments: [{from: 0, to: 1, step: 1e-300}]')).toMatchInlineSnapshot(`
      "redshift-grids/short.yaml:2:35  step 1e-300 makes about 1.0e+300 redshifts  expected at most 100000 more in this grid
      1 problem in 1 file"
    `));
  test('segments out of order', () =>
    expect(bad('segments: [{from: 3, to: 10, step: 0.1}, {from: 0, to: 3, step: 0.01}]')).toMatchInlineSnapshot(`
      "redshift-grids/short.yaml:2:49  the segment starts at 0, below the one before  expected at least 10.0
      1 problem in 1 file"
    `));
  test('segments that overlap', () =>
    expect(bad('segments: [{from: 0, to: 3, step: 1}, {from: 2.5, to: 3.5, step: 1}]')).toMatchInlineSnapshot(`
      "redshift-grids/short.yaml:2:46  the segment starts at 2.5, below the one before  expected at least 3
      1 problem in 1 file"
    `));
  test('values out of order, and twice', () =>
    expect(bad('values: [1, 0.5, 0.50, 2]')).toMatchInlineSnapshot(`
      "redshift-grids/short.yaml:2:13  0.5 comes after 1  expected redshifts in ascending order
      redshift-grids/short.yaml:2:18  0.50 is given twice  expected each redshift once
      2 problems in 1 file"
    `));
  test('a value of a segment', () =>
    expect(bad('segments: [{from: 0, to: 1, step: 0.1}]\nvalues: [0.50]')).toMatchInlineSnapshot(`
      "redshift-grids/short.yaml:3:10  0.50 is already in a segment  expected each redshift once
      1 problem in 1 file"
    `));
  test('a redshift of -1', () =>
    expect(bad('values: [-1]')).toMatchInlineSnapshot(`
    "redshift-grids/short.yaml:2:10  values entry 1 is -1  expected a redshift, greater than -1 and at most 1e6
    1 problem in 1 file"
  `));
  test('a redshift without end', () =>
    expect(bad('values: [1e300, .inf]')).toMatchInlineSnapshot(`
    "redshift-grids/short.yaml:2:10  values entry 1 is 1e300  expected a redshift, greater than -1 and at most 1e6
    redshift-grids/short.yaml:2:17  values entry 2 is .inf  expected a redshift, finite and in decimal digits
    2 problems in 1 file"
  `));
  test('a segment without step', () =>
    expect(bad('segments: [{from: 0, to: 1}]')).toMatchInlineSnapshot(`
    "redshift-grids/short.yaml:2:12  segments entry 1.step is missing  expected a step in redshift
    1 problem in 1 file"
  `));
  test('other keys', () =>
    expect(bad('segments: [{start: 0, end: 1, step: 1}]\nredshifts: [1]')).toMatchInlineSnapshot(`
      "redshift-grids/short.yaml:2:12  segments entry 1.from is missing  expected a redshift
      redshift-grids/short.yaml:2:12  segments entry 1.to is missing  expected a redshift
      redshift-grids/short.yaml:2:13  unknown key segments entry 1.start  did you mean from?
      redshift-grids/short.yaml:2:23  unknown key segments entry 1.end  did you mean to?
      redshift-grids/short.yaml:3:1  unknown key redshifts  did you mean values?
      5 problems in 1 file"
    `));
  test('a value that is no number', () =>
    expect(bad('values: [0,5, z]')).toMatchInlineSnapshot(`
    "redshift-grids/short.yaml:2:15  values entry 3 is the text "z"  expected a redshift
    1 problem in 1 file"
  `));
});
