import { describe, expect, test } from 'vitest';
import { spread } from '../../src/cosmology/nonlinearity.ts';
import { type Propagation, propagation } from '../../src/cosmology/propagation.ts';
import type { QuantityId } from '../../src/cosmology/quantities.ts';
import { cellPlace, milestonePlace } from '../../src/cosmology/sweep.ts';
import type { UncertainParameters } from '../../src/cosmology/uncertain.ts';
import { expectClose } from '../support/closeness.ts';
import { shippedSets } from '../support/shippedSet.ts';
import { EINSTEIN_DE_SITTER, FLAT_LAMBDA, uncertain } from '../support/uncertainSet.ts';

const REDSHIFTS = [-0.9, -0.5, 0, 0.5, 3];
const [FUTURE, HALF, TODAY, NEAR, FAR] = [0, 1, 2, 3, 4];

function propagated(set: UncertainParameters): Propagation {
  const found = propagation(set, REDSHIFTS);
  if (found === null) throw new Error('the set has no uncertainties');
  return found;
}

const uOf = ({ u }: Propagation, row: number, id: QuantityId) => u[cellPlace(row, id)];

describe('the law of propagation', () => {
  test('gives nothing for a set without uncertainties', () => {
    expect(propagation(uncertain(FLAT_LAMBDA, {}), REDSHIFTS)).toBeNull();
  });

  test('gives H at z = 0 the uncertainty of H0, and lengths its relative one', () => {
    const found = propagated(uncertain(EINSTEIN_DE_SITTER, { H0: '1.05' }));
    expectClose(uOf(found, TODAY, 'H_km_s_Mpc'), 1.05, 1e-10);
    // D_C(3) = c/H0 exactly.
    expectClose(uOf(found, FAR, 'D_C_Mpc'), (299792.458 / 70) * (1.05 / 70), 1e-9);
  });

  test('knows what is exact', () => {
    const found = propagated(uncertain(EINSTEIN_DE_SITTER, { H0: '1.05' }));
    expect(uOf(found, TODAY, 'D_C_Mpc')).toBe(0);
    for (const id of ['a', 'E', 'q', 'Omega_bc'] as const) expect(uOf(found, NEAR, id), id).toBe(0);
  });

  test('adds the variances of independent parameters', () => {
    const both = propagated(uncertain(FLAT_LAMBDA, { H0: '1', Omega_m: '0.01' }));
    const [H0, matter] = [{ H0: '1' }, { Omega_m: '0.01' }].map((u) => propagated(uncertain(FLAT_LAMBDA, u)));
    for (const id of ['D_L_Mpc', 't_Gyr', 'H_km_s_Mpc', 'mu_mag'] as const) {
      const parts = [H0, matter].map((one) => (one === undefined ? Number.NaN : (uOf(one, NEAR, id) ?? Number.NaN)));
      expectClose(uOf(both, NEAR, id), Math.hypot(...parts), 1e-12, id);
    }
  });

  // H^2 at high redshift is H0^2 Omega_m (1+z)^3: with r = -1 and equal relative weights 2 u(H0)/H0 = u(m)/m it is fixed.
  test('lets opposite contributions cancel', () => {
    const redshifts = [1e6];
    const free = propagation(uncertain(FLAT_LAMBDA, { H0: '0.7', Omega_m: '0.006' }), redshifts);
    const tied = propagation(
      uncertain(FLAT_LAMBDA, { H0: '0.7', Omega_m: '0.006' }, [['Omega_m', 'H0', '-1']]),
      redshifts,
    );
    const place = cellPlace(0, 'H_km_s_Mpc');
    expect((tied?.u[place] ?? Number.NaN) / (free?.u[place] ?? Number.NaN)).toBeLessThan(1e-6);
  });

  test('covers the milestones, but not words', () => {
    const found = propagated(uncertain(EINSTEIN_DE_SITTER, { H0: '1.05' }));
    const at = (name: 'age_today' | 'fate') => found.u[milestonePlace(REDSHIFTS.length, name)];
    expectClose(at('age_today'), ((2 / 3) * 977.792221 * 1.05) / 70 / 70, 1e-8);
    expect(at('fate')).toBeNaN();
  });
});

describe('values that may not exist', () => {
  test('have no uncertainty: the event horizon of w = -1 needs wa of 0 or more', () => {
    const found = propagated(uncertain(FLAT_LAMBDA, { wa: '0.1' }));
    expect(uOf(found, TODAY, 'event_horizon_Mpc')).toBeNaN();
    expect(uOf(found, TODAY, 't_Gyr')).toBeGreaterThan(0);
  });

  test('have none beyond the largest scale that all neighbours reach', () => {
    // Omega_m = 2 alone turns round at z = -0.5 exactly; a little less matter goes farther, a little more less far.
    const found = propagated(uncertain({ ...EINSTEIN_DE_SITTER, Omega_m: '2' }, { Omega_m: '0.01' }));
    expect(uOf(found, FUTURE, 't_Gyr')).toBeNaN();
    expect(uOf(found, HALF, 't_Gyr')).toBeNaN();
    expect(uOf(found, TODAY, 't_Gyr')).toBeGreaterThan(0);
  });
});

describe('the shares of an error budget', () => {
  test.each(shippedSets().filter(({ uncertainties }) => Object.keys(uncertainties).length > 0))(
    'of $id add up to 1 in every cell with an uncertainty',
    (set) => {
      const found = propagated(set);
      let cells = 0;
      for (const [place, u] of found.u.entries()) {
        const shares = found.shares(place);
        expect(shares.length > 0).toBe(u > 0);
        if (!(u > 0)) continue;
        cells++;
        const sum = shares.reduce((total, { alone, correlated }) => total + alone + correlated, 0);
        expect(Math.abs(sum - 1)).toBeLessThan(1e-9);
      }
      expect(cells).toBeGreaterThan(100);
    },
  );

  test('of independent parameters have no correlated part, and follow the squares of the contributions', () => {
    const found = propagated(uncertain(FLAT_LAMBDA, { H0: '1', Omega_m: '0.01' }));
    const alone = propagated(uncertain(FLAT_LAMBDA, { H0: '1' }));
    const place = cellPlace(NEAR, 't_Gyr');
    const [first, second] = found.shares(place);
    expect(first?.parameter).toBe('H0');
    expect([first?.correlated, second?.correlated].map(Math.abs as (x: number | undefined) => number)).toEqual([0, 0]);
    const ratio = (alone.u[place] ?? Number.NaN) / (found.u[place] ?? Number.NaN);
    expectClose(first?.alone, ratio * ratio, 1e-12);
  });

  test('of two correlated parameters split what the correlation takes away between them', () => {
    const found = propagated(uncertain(FLAT_LAMBDA, { H0: '1', Omega_m: '0.01' }, [['H0', 'Omega_m', '-0.5']]));
    const [first, second] = found.shares(cellPlace(FAR, 'H_km_s_Mpc'));
    expectClose(first?.correlated, -0.5 * Math.sqrt((first?.alone ?? 0) * (second?.alone ?? 0)), 1e-12);
    expectClose(second?.correlated, first?.correlated ?? Number.NaN, 1e-12);
  });
});

describe('the flag of a nonlinear column', () => {
  test('is set where the spread reaches values that do not exist', () => {
    // Matter of 1.5 turns round at a = 3: one and a half standard deviations more at a = 2.
    const wide = propagation(uncertain({ ...EINSTEIN_DE_SITTER, Omega_m: '1.5' }, { Omega_m: '0.4' }), [-0.55, 0.5]);
    expect(wide?.u[cellPlace(0, 't_Gyr')]).toBeGreaterThan(0);
    expect(wide?.isNonlinear(cellPlace(0, 't_Gyr'))).toBe(true);
    expect(wide?.isNonlinear(cellPlace(1, 'H_km_s_Mpc'))).toBe(false);
  });

  test('is set where the spread reaches parameters that no model has', () => {
    const flag = (u: string) => {
      const found = propagation(uncertain(EINSTEIN_DE_SITTER, { H0: u }), [0]);
      return found?.isNonlinear(cellPlace(0, 'H_km_s_Mpc'));
    };
    expect(flag('40')).toBe(false); // 70 - 40 sqrt(3) > 0
    expect(flag('41')).toBe(true);
  });

  // rho_c = 3 H0^2/(8 pi G): the standard deviation of x^2 for a normal x is 2 x u sqrt(1 + u^2/(2 x^2)).
  test('compares u with a spread that is exact for squares', () => {
    const set = uncertain(EINSTEIN_DE_SITTER, { H0: '30' });
    const place = cellPlace(0, 'rho_c_kg_m3');
    const u = propagation(set, [0])?.u[place] ?? Number.NaN;
    expectClose(spread(set, [0]).deviation[place], u * Math.sqrt(1 + 900 / (2 * 4900)), 1e-9);
  });
});
