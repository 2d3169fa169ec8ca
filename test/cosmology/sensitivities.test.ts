import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { MILESTONE_NAMES } from '../../src/cosmology/milestones.ts';
import type { Parameters, ScalarParameter } from '../../src/cosmology/parameters.ts';
import { QUANTITIES, type QuantityId } from '../../src/cosmology/quantities.ts';
import { type Sensitivity, sensitivities } from '../../src/cosmology/sensitivities.ts';
import { cellPlace, milestonePlace, sweep } from '../../src/cosmology/sweep.ts';
import { relativeDifference } from '../support/closeness.ts';
import { EINSTEIN_DE_SITTER, FLAT_LAMBDA, uncertain } from '../support/uncertainSet.ts';

interface Reference {
  readonly parameters: Parameters;
  readonly derivatives: readonly {
    readonly parameter: ScalarParameter;
    readonly milestones: Readonly<Record<string, string | null>>;
    readonly rows: readonly Readonly<Record<QuantityId | 'z', string | null>>[];
  }[];
}

const FOLDER = 'test/reference/derivatives';
const files = readdirSync(FOLDER).filter((name) => name.endsWith('.json'));
const columns = Object.keys(QUANTITIES) as QuantityId[];

/** Uncertainties as large as published ones, since the steps follow them. */
const U: Readonly<Record<ScalarParameter, string>> = {
  H0: '0.54',
  Omega_m: '0.0073',
  omega_b: '0.00015',
  omega_c: '0.0012',
  Omega_k: '0.002',
  Omega_DE: '0.01',
  w0: '0.06',
  wa: '0.2',
  T_CMB: '0.0006',
  N_eff: '0.17',
};

/** Six digits are promised of a derivative by which one u moves the value by more than this part of itself. */
const FELT = 1e-7;

const only = (parameters: Parameters, name: ScalarParameter, redshifts: readonly number[]): Sensitivity => {
  const [found] = sensitivities(uncertain(parameters, { [name]: U[name] }), redshifts);
  if (found === undefined) throw new Error(`${name} has an uncertainty, but no derivatives were found`);
  return found;
};

describe.each(files)('the derivatives of %s, against differences of 60-digit values', (file) => {
  const { parameters, derivatives } = JSON.parse(readFileSync(`${FOLDER}/${file}`, 'utf8')) as Reference;

  test.each(derivatives)('by $parameter have six digits, and errors within those stated', (reference) => {
    const { parameter, rows, milestones } = reference;
    const redshifts = rows.map(({ z }) => Number(z));
    const found = only(parameters, parameter, redshifts);
    const values = sweep(parameters, redshifts);
    const expected = [
      ...rows.flatMap((row, k) => columns.map((id) => [`${id} at ${row.z}`, cellPlace(k, id), row[id]] as const)),
      ...MILESTONE_NAMES.filter((name) => name !== 'fate').map(
        (name) => [name, milestonePlace(rows.length, name), milestones[name] ?? null] as const,
      ),
    ];
    const wrong = expected.flatMap(([name, place, text]) => {
      const value = found.derivatives[place] ?? Number.NaN;
      if (text === null) return Number.isNaN(value) ? [] : [`${name} is ${value}, but does not exist`];
      const error = Math.abs(value - Number(text));
      const felt = Math.abs(Number(text)) * Number(U[parameter]) > FELT * Math.abs(values[place] ?? 0);
      const sound = error <= (found.errors[place] ?? 0) + 1e-14 * Math.abs(Number(text));
      const accurate = !felt || relativeDifference(value, Number(text)) < 1e-6;
      return sound && accurate ? [] : [`${name} is ${value}, expected ${text}, stated error ${found.errors[place]}`];
    });
    expect(expected.length).toBeGreaterThan(200);
    expect(wrong).toEqual([]);
  });
});

test('every parameter that can be uncertain has a reference', () => {
  const known = files.flatMap((file) => {
    const { derivatives } = JSON.parse(readFileSync(`${FOLDER}/${file}`, 'utf8')) as Reference;
    return derivatives.map(({ parameter }) => parameter);
  });
  expect([...new Set(known)].sort()).toEqual(Object.keys(U).sort());
});

describe('closed forms', () => {
  const redshifts = [-0.75, 0.0078125, 0.5, 3, 1023];

  test('in Einstein-de Sitter space lengths and times vary as 1/H0, rates as H0, densities as H0 squared', () => {
    const { derivatives } = only(EINSTEIN_DE_SITTER, 'H0', redshifts);
    const values = sweep(EINSTEIN_DE_SITTER, redshifts);
    const powers: Partial<Record<QuantityId, number>> = {
      D_C_Mpc: -1,
      D_L_Mpc: -1,
      V_C_Gpc3: -3,
      dV_dz_Mpc3_per_deg2: -3,
      D_V_Mpc: -1,
      t_Gyr: -1,
      t_L_Gyr: -1,
      H_km_s_Mpc: 1,
      dv_dt_cm_s_yr: 1,
      rho_c_g_cm3: 2,
      particle_horizon_Mpc: -1,
    };
    for (const [row, z] of redshifts.entries()) {
      for (const [id, power] of Object.entries(powers) as [QuantityId, number][]) {
        const place = cellPlace(row, id);
        const value = values[place] ?? Number.NaN;
        if (Number.isNaN(value)) continue;
        const found = derivatives[place] ?? Number.NaN;
        expect(relativeDifference(found, (power * value) / 70), `${id} at z = ${z}`).toBeLessThan(1e-9);
      }
    }
  });

  test('what does not depend on H0 has the derivative 0 exactly', () => {
    const { derivatives } = only(EINSTEIN_DE_SITTER, 'H0', redshifts);
    for (const id of ['a', 'E', 'Omega_bc', 'q', 'v_rec_now_c', 'v_rec_then_c'] as const) {
      for (const row of [1, 2, 3, 4]) expect(derivatives[cellPlace(row, id)], id).toBe(0);
    }
  });

  test('the distance modulus falls by 5 log10(e) for each relative change of H0, at every redshift', () => {
    const { derivatives } = only(FLAT_LAMBDA, 'H0', redshifts);
    for (const row of [1, 2, 3, 4]) {
      const expected = -(5 * Math.LOG10E) / 70;
      expect(relativeDifference(derivatives[cellPlace(row, 'mu_mag')] ?? Number.NaN, expected)).toBeLessThan(1e-9);
    }
  });

  // H0 t0 = 2 asinh(sqrt((1-m)/m)) / (3 sqrt(1-m)), so d(H0 t0)/dm = H0 t0 / (2(1-m)) - 1 / (3 m (1-m)).
  test('the age of flat space with a cosmological constant follows its formula in Omega_m', () => {
    const { derivatives } = only(FLAT_LAMBDA, 'Omega_m', redshifts);
    const values = sweep(FLAT_LAMBDA, redshifts);
    const [age, unit] = (['age_today', 'hubble_time'] as const).map((name) => milestonePlace(redshifts.length, name));
    const time = values[unit ?? 0] ?? Number.NaN;
    const expected = (values[age ?? 0] ?? Number.NaN) / 1.4 - time / (3 * 0.3 * 0.7);
    expect(relativeDifference(derivatives[age ?? 0] ?? Number.NaN, expected)).toBeLessThan(1e-9);
  });
});

describe('the ends of the domain', () => {
  test('a density of 0 is moved towards positive values only', () => {
    const empty = { ...FLAT_LAMBDA, Omega_m: '0', Omega_k: '1' };
    const { derivatives } = only(empty, 'Omega_m', [0.5]);
    // E^2 = (1+z)^2 + Omega_m ((1+z)^3 - 1) with the dark energy giving way, so dE/dOmega_m = (1.5^3 - 1)/(2 x 1.5).
    expect(relativeDifference(derivatives[cellPlace(0, 'E')] ?? Number.NaN, 2.375 / 3)).toBeLessThan(1e-6);
  });

  test('an uncertainty larger than the value does not take the value below zero', () => {
    const wide = uncertain({ ...FLAT_LAMBDA, Omega_m: '0.001' }, { Omega_m: '0.5' });
    const [found] = sensitivities(wide, [0.5]);
    expect(found?.derivatives[cellPlace(0, 'E')]).toBeCloseTo(2.375 / (2 * Math.sqrt(1 + 0.001 * 2.375)), 9);
  });
});
