import { expect, test } from 'vitest';
import { warrantedDigits } from '../../src/tables/warrantedDigits.ts';

test.each([
  // 13.79713 +- 0.024: the hundredths are the last place that u warrants.
  [13.79712865, 0.024, 7, 4],
  [3401.966, 26, 7, 3],
  [67.36, 0.54, 7, 3],
  [14153.21, 24, 7, 4],
  [-0.5325, 0.011, 7, 2],
  [8.522730151e-27, 1.4e-28, 7, 2],
  [0.3153, 0.0000002, 7, 7],
  [0.3153, 1e-12, 7, 7],
])('of %s with u = %s, %s digits printed, %s are warranted', (value, u, digits, warranted) => {
  expect(warrantedDigits(value, u, digits)).toBe(warranted);
});

test('u is rounded before its first digit is looked at', () => {
  expect(warrantedDigits(13.8, 0.0996, 7)).toBe(3);
  expect(warrantedDigits(13.8, 0.0994, 7)).toBe(4);
});

test('so is the value', () => {
  expect(warrantedDigits(9.99999996, 0.02, 7)).toBe(4);
});

test('no digit is warranted where u exceeds the value in every place', () => {
  expect(warrantedDigits(0.03, 1.2, 7)).toBe(0);
  expect(warrantedDigits(0.7, 1.2, 7)).toBe(0);
  expect(warrantedDigits(1.7, 1.2, 7)).toBe(1);
});

test('every digit is warranted of an exact value, of a zero, and where no uncertainty is given', () => {
  expect(warrantedDigits(0.5, 0, 7)).toBe(7);
  expect(warrantedDigits(0, 0.1, 7)).toBe(7);
  expect(warrantedDigits(0.5, null, 7)).toBe(7);
});
