import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, test } from 'vitest';
import { relicEnergy, relicPressure } from '../../src/cosmology/audit/relic.ts';
import { startAudit } from '../../src/cosmology/audit/startAudit.ts';
import { Arithmetic } from '../../src/numerics/extended/arithmetic.ts';

beforeAll(startAudit);

/** Largest relative difference of both integrals to those in another arithmetic, over y from 1e-9 to 1e6. */
function largestDifference(digits: number, finerDigits: number): number {
  const [arithmetic, finer] = [new Arithmetic(digits), new Arithmetic(finerDigits)];
  let largest = 0;
  for (let power = -9; power <= 6; power++) {
    for (const y of [`1e${power}`, `3e${power}`]) {
      for (const integral of [relicEnergy, relicPressure]) {
        const text = arithmetic.forget(() => integral(arithmetic, arithmetic.real(y)).toText());
        const difference = finer.forget(() => {
          const value = integral(finer, finer.real(y));
          return value.minus(finer.real(text)).over(value).magnitude().toNumber();
        });
        largest = Math.max(largest, difference);
      }
    }
  }
  return largest;
}

describe('the Fermi-Dirac integrals of the audit', () => {
  test('agree with mpmath and PARI/GP to the 30 digits that these print', () => {
    const { rows } = JSON.parse(readFileSync('test/reference/fermiDirac.json', 'utf8'));
    const arithmetic = new Arithmetic(34);
    const apart = (integral: typeof relicEnergy, y: string, expected: string) =>
      arithmetic.forget(() => {
        const value = integral(arithmetic, arithmetic.real(y));
        return value.minus(arithmetic.real(expected)).over(value).magnitude().toNumber();
      });
    expect(rows.length).toBeGreaterThan(30);
    for (const [y, energy, pressure] of rows) {
      expect(apart(relicEnergy, y, energy), `R(${y})`).toBeLessThan(5e-30);
      expect(apart(relicPressure, y, pressure), `P(${y})`).toBeLessThan(5e-30);
    }
  });

  test.each([34, 50, 60])('have %i digits for every y', (digits) => {
    expect(largestDifference(digits, digits + 16)).toBeLessThan(10 ** -digits);
  });
});
