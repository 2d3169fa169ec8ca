import { describe, expect, test } from 'vitest';
import { background } from '../../src/cosmology/background.ts';
import { epochs } from '../../src/cosmology/epochs.ts';
import type { QuantityId } from '../../src/cosmology/quantities.ts';
import { Decimal } from '../../src/numerics/decimal.ts';
import { interpolationErrors } from '../../src/tables/interpolationErrors.ts';
import { roundSteps, stepCount } from '../../src/tables/roundSteps.ts';
import { stepsNeeded } from '../../src/tables/stepsNeeded.ts';

const MODEL = background({
  H0: '67.4',
  Omega_m: '0.315',
  w0: '-1',
  wa: '0',
  T_CMB: '2.7255',
  N_eff: '3.046',
  m_nu: ['0.06', '0', '0'],
});
const FROM = Decimal.parse('0.1');
const TO = Decimal.parse('1');
const WIDTH = TO.minus(FROM);
const WANTED = [1e-4, 1e-6, 1e-8];
const COLUMNS: readonly QuantityId[] = ['D_L_Mpc', 't_Gyr', 'mu_mag', 'E', 'Omega_DE', 'event_horizon_Mpc'];

function errorWith(column: QuantityId, method: 'linear' | 'lagrange', step: Decimal): number {
  const count = stepCount(WIDTH, step);
  const redshifts = Array.from({ length: count + 1 }, (_, k) => 0.1 + (0.9 * k) / count);
  const rows = epochs(MODEL, redshifts);
  const [found] = interpolationErrors({ model: MODEL, redshifts, epochs: rows, columns: [column], digits: 10 });
  return found?.[method]?.relative ?? Number.NaN;
}

describe('stepsNeeded(model, columns, stretch, wanted, digits)', () => {
  const needed = stepsNeeded(MODEL, COLUMNS, { from: FROM, to: TO }, WANTED, 10);

  test.each(COLUMNS.flatMap((column) => WANTED.map((error, k) => [column, error, k] as const)))(
    'for %s and %f gives steps that keep the error, where the next larger would not',
    (column, wanted, k) => {
      for (const method of ['linear', 'lagrange'] as const) {
        const step = needed.get(column)?.[method][k];
        if (!step) throw new Error('no step');
        expect(errorWith(column, method, step) / wanted).toBeLessThanOrEqual(1);
        const larger = [...roundSteps(WIDTH, step)].at(-2);
        if (larger) expect(errorWith(column, method, larger) / wanted).toBeGreaterThan(1);
      }
    },
  );

  test('gives none where the rounding of the cells alone is larger than the error wanted', () => {
    const [none] = stepsNeeded(MODEL, ['t_Gyr'], { from: FROM, to: TO }, [1e-6], 5).get('t_Gyr')?.linear ?? ['missing'];
    expect(none).toBeUndefined();
  });
});
