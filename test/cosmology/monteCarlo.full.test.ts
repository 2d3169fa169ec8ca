import { describe, expect, test } from 'vitest';
import { shippedSet } from '../support/shippedSet.ts';
import { compared, misjudged } from './monteCarloAgreement.ts';

const DRAWS = 100_000;
const NOISE = 1 / Math.sqrt(2 * DRAWS);
const REDSHIFTS = [-0.75, 0.01, 0.5, 3, 10, 1100];

describe('100 000 draws of the parameters', () => {
  test.each(['planck-2018-lensing', 'planck-2018-curved', 'wmap-9-combined', 'local-h0-2022'])(
    'confirm the law of propagation to 0.03 u for %s',
    (id) => {
      const all = compared(shippedSet(id), REDSHIFTS, DRAWS, 11);
      const apart = all.filter(({ drawn }) => !(Math.abs(drawn - 1) < 4 * NOISE + 0.03));
      expect(apart.map(({ name, drawn }) => `${name}: ${drawn}`)).toEqual([]);
      expect(misjudged(all, NOISE)).toEqual([]);
    },
  );

  test('refute it for desi-2025-w0wa where the table says so, and nowhere else', () => {
    expect(misjudged(compared(shippedSet('desi-2025-w0wa'), REDSHIFTS, DRAWS, 12), NOISE)).toEqual([]);
  });
});
