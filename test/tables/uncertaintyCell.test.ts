import { expect, test } from 'vitest';
import { uncertaintyCell } from '../../src/tables/uncertaintyCell.ts';

test.each([
  [0.54, '0.54'],
  [24.3, '24'],
  [0.0996, '0.10'],
  [0.001034, '0.0010'],
  [0.00009956, '0.00010'],
  [0.0000995, '0.00010'],
  [0.00009949, '9.9E-5'],
  [1.23456e-28, '1.2E-28'],
  [137, '140'],
  [3.45e12, '3.4E12'],
  [0, '0'],
  [null, ''],
])('%s is %j: two significant digits', (u, cell) => {
  expect(uncertaintyCell(u)).toBe(cell);
});

test.each([
  [0.285, '0.28'],
  [0.275, '0.28'],
  [0.265, '0.26'],
  [1.05, '1.0'],
])('%s, a tie of its decimal, goes to the even digit whatever the last bits of the double say', (u, cell) => {
  for (const noise of [-4e-12, -1e-16, 0, 1e-16, 4e-12]) expect(uncertaintyCell(u * (1 + noise))).toBe(cell);
});

test('what lies a millionth beside a tie is no tie', () => {
  expect(uncertaintyCell(0.265001)).toBe('0.27');
  expect(uncertaintyCell(0.284999)).toBe('0.28');
});
