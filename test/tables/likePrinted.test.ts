import { expect, test } from 'vitest';
import { likePrinted } from '../../src/tables/likePrinted.ts';

test.each([
  ['two decimals more than the printed ones', 13.797129, '13.80', 2, '13.7971'],
  ['a whole number', 46.1616, '47', 2, '46.16'],
  ['the printed power of ten, not its own', 9.20387e-26, '92.0E-27', 1, '92.04E-27'],
  ['a printed power above ten', 9.25062867e25, '0.9250629e26', 2, '0.925062867E26'],
  ['a minus sign', -0.0123, '0.012', 1, '-0.0123'],
  ['a zero for a small value', 0.00001, '0.5', 1, '0.00'],
  ['an exact zero', 0, '0.1', 1, '0.00'],
  ['all decimals after rounding up to the next power of ten', 9.9996, '9.9', 2, '10.000'],
  ['a tie to even', 0.125, '0.1', 1, '0.12'],
])('likePrinted gives %s', (_, value, printed, more, expected) => {
  expect(likePrinted(value, printed, more)).toBe(expected);
});
