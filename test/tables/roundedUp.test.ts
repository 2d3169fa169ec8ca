import fc from 'fast-check';
import { expect, test } from 'vitest';
import { roundedUp } from '../../src/tables/roundedUp.ts';

test.each([
  [0, '0'],
  [0.0013, '0.0013'],
  [0.001300001, '0.0014'],
  [0.00134, '0.0014'],
  [0.00136, '0.0014'],
  [9.91e-7, '1.0E-6'],
  [0.00009999, '0.00010'],
  [99.5, '100'],
  [-1.21, '-1.3'],
])('roundedUp(%f, 2) is %s', (bound, text) => {
  expect(roundedUp(bound, 2)).toBe(text);
});

test('roundedUp is never below the bound and less than a unit of the last digit above it', () => {
  fc.assert(
    fc.property(fc.double({ min: 1e-40, max: 1e40, noNaN: true }), (bound) => {
      const text = Number(roundedUp(bound, 2));
      const unit = Number(`1e${Math.floor(Math.log10(bound)) - 1}`);
      expect(text).toBeGreaterThanOrEqual(bound);
      expect(text).toBeLessThan(bound + unit * (1 + 1e-9));
    }),
    { seed: 3, numRuns: 2000 },
  );
});
