import { describe, expect, test } from 'vitest';
import { background } from '../../src/cosmology/background.ts';
import type { QuantityId } from '../../src/cosmology/quantities.ts';
import { readContent } from '../../src/inputs/readContent.ts';
import { segmentSteps } from '../../src/inputs/segmentSteps.ts';
import { Decimal } from '../../src/numerics/decimal.ts';
import { type GridAdvice, gridAdvice } from '../../src/tables/gridAdvice.ts';
import type { GridWish } from '../../src/tables/gridWish.ts';
import { EINSTEIN_DE_SITTER, everyInterval } from './bruteErrors.ts';

const result = readContent('content');
if ('problems' in result) throw new Error('the shipped content has problems');
const found = result.content.parameterSets.find(({ id }) => id === 'planck-2018-lensing');
if (!found) throw new Error('no such parameter set');
const planck = background(found.parameters);

function wish(column: QuantityId, method: GridWish['method'], wanted: number, from: string, to: string): GridWish {
  return { model: planck, column, method, wanted, from: Decimal.parse(from), to: Decimal.parse(to), digits: 10 };
}

/** The redshifts of the advised segments, expanded as those of a grid's file are; every step `coarser` times as wide. */
function redshiftsOf({ segments }: GridAdvice, coarser = 1): readonly number[] {
  const all = segments.flatMap((segment) => {
    const steps = segmentSteps(segment, 1e6);
    if ('wrong' in steps) throw new Error(`${segment.step} does not divide ${segment.from} to ${segment.to}`);
    const last = steps.redshifts.length - 1;
    return steps.redshifts.filter((_, k) => k % coarser === 0 || k === last).map((z) => z.toNumber());
  });
  return [...new Set(all)];
}

/** The largest relative error over dense places, each interval by itself. */
function largestError({ model, column, method }: GridWish, redshifts: readonly number[]): number {
  return Math.max(
    ...everyInterval(
      model,
      redshifts,
      9,
    )(column).flatMap((interval) =>
      interval[method].map((value, k) => Math.abs(value / (interval.truths[k] ?? Number.NaN) - 1)),
    ),
  );
}

describe('gridAdvice(wish)', () => {
  test.each([
    wish('D_L_Mpc', 'lagrange', 1e-6, '0', '10'),
    wish('D_L_Mpc', 'linear', 1e-4, '0', '10'),
    wish('t_Gyr', 'lagrange', 1e-7, '-0.9', '3'),
    wish('V_C_Gpc3', 'lagrange', 1e-5, '0.013', '1089.8'),
    wish('mu_mag', 'linear', 1e-4, '0.01', '2'),
    wish('dz_dt_per_Gyr', 'linear', 1e-3, '0', '1.5'),
    wish('event_horizon_Mpc', 'lagrange', 1e-8, '0', '2'),
  ])('advises a grid for $column, $method, $wanted that meets the wish', (one) => {
    const advice = gridAdvice(one);
    const redshifts = redshiftsOf(advice);
    expect(advice.rows).toBe(redshifts.length);
    expect(redshifts[0]).toBe(one.from.toNumber());
    expect(redshifts.at(-1)).toBe(one.to.toNumber());
    const error = largestError(one, redshifts);
    expect(error).toBeLessThanOrEqual(advice.largest.relative);
    expect(advice.largest.relative).toBeLessThanOrEqual(one.wanted);
    for (const { step } of advice.segments) expect(step).toMatch(/^0*\.?0*[125]0*$/);
  });

  test('does not advise more rows than needed: with every third row alone the wish is not met', () => {
    for (const one of [wish('t_Gyr', 'linear', 1e-5, '0', '10'), wish('a', 'lagrange', 1e-6, '0', '10')]) {
      expect(largestError(one, redshiftsOf(gridAdvice(one), 3))).toBeGreaterThan(one.wanted);
    }
  });

  test('joins stretches with the same step; a column that is a line needs few rows', () => {
    expect(gridAdvice(wish('T_CMB_K', 'linear', 1e-6, '1', '10'))).toMatchObject({
      segments: [
        { from: '1', to: '5', step: '1' },
        { from: '5', to: '10', step: '5' },
      ],
      rows: 6,
    });
  });

  test('follows the law h^2/(4(1+h)) of the scale factor, by which 1.1e-6 at z = 0 needs steps of 0.002', () => {
    const { segments } = gridAdvice({ ...wish('a', 'linear', 1.1e-6, '0', '1'), model: EINSTEIN_DE_SITTER });
    expect(segments[0]?.step).toBe('0.002');
  });

  test.each<[string, GridWish]>([
    ['The range must rise; it goes from 3 to 3.', wish('a', 'linear', 1e-3, '3', '3')],
    ['mu_mag has no value at z = 0. Choose', wish('mu_mag', 'linear', 1e-3, '0', '3')],
    ['D_C_Mpc has no value at z = -0.5. Choose', wish('D_C_Mpc', 'linear', 1e-3, '-0.5', '3')],
    ['Next to z = 0, no step is small enough for V_C_Gpc3.', wish('V_C_Gpc3', 'linear', 1e-3, '0', '3')],
    ['An error of 1e-11 for a between z = ', wish('a', 'lagrange', 1e-11, '0', '3')],
  ])('refuses: %s', (message, one) => {
    expect(() => gridAdvice(one)).toThrow(message);
  });

  test('refuses a range beyond the bounce of a model without Big Bang', () => {
    const model = background({
      ...found.parameters,
      Omega_m: '0.1',
      omega_b: undefined,
      omega_c: undefined,
      Omega_k: undefined,
      Omega_DE: '1.6',
      T_CMB: '0',
      N_eff: '0',
      m_nu: [],
    });
    expect(() => gridAdvice({ ...wish('H_km_s_Mpc', 'linear', 1e-3, '0', '3'), model })).toThrow(
      /This set has no Big Bang but a bounce at z = 0\.\d+; the range must end below\./,
    );
  });
});
