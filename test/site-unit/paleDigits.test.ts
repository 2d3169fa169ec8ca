import { describe, expect, test } from 'vitest';
import { paleDigits } from '../../src/site/paleDigits.ts';
import { pageUncertainty, uncertaintyBelow } from '../../src/tables/pageUncertainty.ts';

describe('digits that the uncertainty does not warrant', () => {
  test.each([
    ['1952.345', 7, '1952.345'],
    ['1952.345', 4, '1952.<i>345</i>'],
    ['1952.345', 2, '19<i>52.345</i>'],
    ['1952.345', 0, '<i>1952.345</i>'],
    ['−0.5273', 1, '−0.5<i>273</i>'],
    ['−0.001273', 0, '<i>−0.001273</i>'],
    ['0.001273', 2, '0.0012<i>73</i>'],
    ['1\u2009952\u2009345', 4, '1\u2009952\u2009<i>345</i>'],
    ['219.2813\u2007\u2007', 3, '219.<i>2813</i>\u2007\u2007'],
    ['8.532178\u2009×\u200910⁻²⁷', 3, '8.53<i>2178</i>\u2009×\u200910⁻²⁷'],
    ['0', 3, '0'],
  ])('%j with %i warranted is %j', (text, warranted, html) => {
    expect(paleDigits(text, warranted)).toBe(html);
  });
});

describe('an uncertainty below its value', () => {
  test.each([
    ['0.35', 0, 4, '±0.35\u2007\u2007'],
    ['12', 0, 3, '±12\u2008\u2007\u2007\u2007'],
    ['1.4E-28', -27, 6, '±0.14\u2007\u2007\u2007\u2007'],
    ['5.5E-7', 0, 6, '±5.5\u2009×\u200910⁻⁷'],
    ['2000000000', 11, 6, '±0.020\u2007\u2007\u2007'],
    ['45000', 0, 1, '±45\u2009000\u2008\u2007'],
    ['0', 0, 2, '±0\u2008\u2007\u2007'],
    ['', 0, 2, ''],
  ])('%j in units of 10^%i with %i decimals is %j', (cell, exponent, decimals, text) => {
    expect(uncertaintyBelow(cell, { exponent, decimals })).toBe(text);
  });

  test('by itself has two digits, or is 0', () => {
    expect([0, 0.0242, 36.4, 1.449e-28, 2.5e-6].map(pageUncertainty)).toEqual([
      '0',
      '0.024',
      '36',
      '1.4\u2009×\u200910⁻²⁸',
      '2.5\u2009×\u200910⁻⁶',
    ]);
  });

  test('that is no number is refused', () => {
    expect(() => uncertaintyBelow('<!doctype html>', { exponent: 0, decimals: 2 })).toThrow(RangeError);
  });
});
