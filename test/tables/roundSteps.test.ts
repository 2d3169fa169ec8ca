import { describe, expect, test } from 'vitest';
import { Decimal } from '../../src/numerics/decimal.ts';
import { roundBorders, roundSteps, stepCount } from '../../src/tables/roundSteps.ts';

const d = Decimal.parse;

describe('roundSteps(width, smallest)', () => {
  test.each([
    ['1', '0.1', ['1', '0.5', '0.2', '0.1']],
    ['0.3', '0.01', ['0.1', '0.05', '0.02', '0.01']],
    ['0.007', '0.0005', ['0.001', '0.0005']],
    ['89.8', '0.1', ['0.2', '0.1']],
    ['5000', '200', ['5000', '1000', '500', '200']],
    ['0.03', '0.5', []],
  ])('of %s down to %s are %j', (width, smallest, steps) => {
    expect([...roundSteps(d(width), d(smallest))].map(String)).toEqual(steps);
  });

  test('divide the width exactly', () => {
    for (const step of roundSteps(d('0.987'), d('1e-6'))) {
      const whole = step.times(d(String(stepCount(d('0.987'), step))));
      expect(whole.compare(d('0.987'))).toBe(0);
    }
  });
});

describe('roundBorders(from, to, lowest)', () => {
  test.each([
    ['0', '3', '0.4', ['0', '0.5', '1', '2', '3']],
    ['0.013', '0.2', '0.013', ['0.013', '0.02', '0.05', '0.1', '0.2']],
    ['-0.9', '0.3', '0.1', ['-0.9', '-0.8', '-0.5', '0', '0.1', '0.2', '0.3']],
    ['-0.96', '-0.2', '-0.96', ['-0.96', '-0.95', '-0.9', '-0.8', '-0.5', '-0.2']],
    ['3', '4', '3', ['3', '4']],
  ])('from %s to %s, not below %s, are %j', (from, to, lowest, borders) => {
    expect(roundBorders(d(from), d(to), d(lowest)).map(String)).toEqual(borders);
  });
});
