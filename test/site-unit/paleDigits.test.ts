import { describe, expect, test } from 'vitest';
import { paleDigits } from '../../src/site/paleDigits.ts';
import { uncertaintyBelow } from '../../src/tables/pageUncertainty.ts';

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
    ['0.35', '44.40056', 0, 5, '±0.35\u2007\u2007\u2007'],
    ['12', '1952.345', 0, 3, '±12\u2008\u2007\u2007\u2007'],
    ['1.4E-28', '8.532178', -27, 6, '±0.14\u2007\u2007\u2007\u2007'],
    ['8.7E-7', '0.00005402118', 0, 11, '±0.00000087\u2007\u2007\u2007'],
    ['5.5E-7', '1.000000', 0, 6, '±5.5\u2009×\u200910⁻⁷'],
    ['0.00021', '8.532178\u2009×\u200910⁻³', 0, 6, '±2.1\u2009×\u200910⁻⁴'],
    ['2000000000', '1.263210', 11, 6, '±0.020\u2007\u2007\u2007'],
    ['2000000000', '126\u2009321\u2009000\u2009000', 0, 0, '±2.0\u2009×\u200910⁹'],
    ['45000', '602\u2009118.4', 0, 1, '±45\u2009000\u2008\u2007'],
    ['0', '1.000000', 0, 2, '±0\u2008\u2007\u2007'],
    ['', '', 0, 2, ''],
  ])('%j below %j in units of 10^%i with %i decimals is %j', (cell, value, exponent, decimals, text) => {
    expect(uncertaintyBelow(cell, value, { exponent, decimals })).toBe(text);
  });

  test('that is no number is refused', () => {
    expect(() => uncertaintyBelow('<!doctype html>', '1.00', { exponent: 0, decimals: 2 })).toThrow(RangeError);
  });
});
