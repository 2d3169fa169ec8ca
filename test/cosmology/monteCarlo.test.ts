import { describe, expect, test } from 'vitest';
import { shippedSet } from '../support/shippedSet.ts';
import { compared, misjudged } from './monteCarloAgreement.ts';

const DRAWS = 4000;
const NOISE = 1 / Math.sqrt(2 * DRAWS);

describe('4000 draws of the parameters', () => {
  test('confirm the law of propagation for a flat model with a wide Omega_m', () => {
    const all = compared(shippedSet('local-h0-2022'), [-0.75, 0.01, 0.5, 3, 1100], DRAWS, 1);
    expect(all.length).toBeGreaterThan(130);
    expect(all.filter(({ flagged }) => flagged)).toEqual([]);
    expect(all.filter(({ drawn }) => !(Math.abs(drawn - 1) < 4 * NOISE + 0.02)).map(({ name }) => name)).toEqual([]);
    expect(misjudged(all, NOISE)).toEqual([]);
  }, 60_000);

  test('confirm it where correlations take most of u away', () => {
    const all = compared(shippedSet('planck-2018-lensing'), [0.5, 1100], DRAWS, 2);
    expect(all.filter(({ drawn }) => !(Math.abs(drawn - 1) < 4 * NOISE)).map(({ name }) => name)).toEqual([]);
  }, 60_000);

  test('refute it for evolving dark energy where the table says so, and nowhere else', () => {
    const all = compared(shippedSet('desi-2025-w0wa'), [-0.75, 0.5, 3], DRAWS, 3);
    const flagged = all.filter((one) => one.flagged);
    expect(flagged.map(({ name }) => name)).toContain('rho_c_kg_m3 at z = -0.75');
    expect(flagged.length).toBeLessThan(all.length / 4);
    expect(misjudged(all, NOISE)).toEqual([]);
  }, 60_000);
});
