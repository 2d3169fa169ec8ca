import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { background } from '../../src/cosmology/background.ts';
import { epochs } from '../../src/cosmology/epochs.ts';
import { MILESTONE_NAMES } from '../../src/cosmology/milestones.ts';
import { milestoneValues } from '../../src/cosmology/milestoneValues.ts';
import type { Parameters } from '../../src/cosmology/parameters.ts';
import { QUANTITIES, type QuantityId } from '../../src/cosmology/quantities.ts';
import { relativeDifference } from '../support/closeness.ts';

type Row = Readonly<Record<QuantityId | 'z', string | null>>;

interface Reference {
  readonly parameters: Parameters;
  readonly milestones: Readonly<Record<string, string | null>>;
  readonly rows: readonly Row[];
}

/** The accuracy promised for the double evaluation, relative to the terms that cancel. */
const PROMISED = 2e-14;

const FOLDER = 'test/reference/values';
const files = readdirSync(FOLDER).filter((name) => name.endsWith('.json'));
const columns = Object.keys(QUANTITIES) as QuantityId[];

const read = (file: string) => JSON.parse(readFileSync(`${FOLDER}/${file}`, 'utf8')) as Reference;
const number = (row: Row, id: QuantityId): number => Number(row[id] ?? Number.NaN);

/**
 * Size of the terms that cancel in a column over its value, from the reference values alone: 1 where nothing does.
 * E^2 is a sum of components; D_M is a sine of D_C; the drift is a difference of 1+z and E; q and w_eff are sums.
 */
function cancellation(row: Row, id: QuantityId): number {
  const sumOfComponents = ['Omega_bc', 'Omega_nu', 'Omega_gamma', 'Omega_DE', 'Omega_k'] as const;
  const expansion = sumOfComponents.reduce((sum, name) => sum + Math.abs(number(row, name)), 0) || 1;
  const closed = -number(row, 'Omega_k') * (number(row, 'E') * number(row, 'a')) ** 2;
  const angle = closed > 0 ? Math.sqrt(closed) * number(row, 'v_rec_now_c') : 0;
  const sine = angle > 0 ? Math.max(1, Math.abs(angle / Math.tan(angle))) : 1;
  const drift = Math.abs((1 / number(row, 'a') + number(row, 'E')) / (1 / number(row, 'a') - number(row, 'E')));
  switch (id) {
    case 'D_C_Mpc':
    case 'chi_Mpc':
    case 'v_rec_now_c':
    case 'V_C_Gpc3':
    case 'a':
    case 'T_CMB_K':
    case 't_Gyr':
    case 't_L_Gyr':
    case 'eta_Gyr':
    case 'particle_horizon_Mpc':
    case 'event_horizon_Mpc':
      return 1;
    case 'mu_mag':
      return sine * Math.max(1, 1 / Math.abs(number(row, id)));
    case 'D_M_Mpc':
    case 'D_A_Mpc':
    case 'D_L_Mpc':
    case 'kpc_per_arcsec':
      return sine;
    case 'dV_dz_Mpc3_per_deg2':
    case 'D_V_Mpc':
      return 2 * sine + expansion;
    case 'dz_dt_per_Gyr':
    case 'dv_dt_cm_s_yr':
      return Number(row.z) < 1e-3 ? 1 : drift;
    case 'q':
    case 'w_eff':
      return expansion + expansion / Math.abs(number(row, id));
    default:
      return expansion;
  }
}

/** Every cell of a model that misses the promise, as a sentence. */
function misses({ parameters, rows }: Reference): readonly string[] {
  const model = background(parameters);
  const found = epochs(
    model,
    rows.map((row) => Number(row.z)),
  );
  return rows.flatMap((row, k) =>
    columns.flatMap((id) => {
      const [epoch, expected] = [found[k] ?? null, row[id]];
      const value = epoch === null ? null : QUANTITIES[id](model, epoch);
      if (value === null || expected === null) {
        return value === null && expected === null ? [] : [`${id} at z = ${row.z} is ${value}, expected ${expected}`];
      }
      const difference = relativeDifference(value, Number(expected));
      const allowed = PROMISED * cancellation(row, id);
      return difference <= allowed
        ? []
        : [`${id} at z = ${row.z} is ${value}, expected ${expected}: off by ${difference}, allowed ${allowed}`];
    }),
  );
}

test('the reference covers every column and at least eight models', () => {
  expect(files.length).toBeGreaterThanOrEqual(15);
  for (const file of files) {
    const [row] = read(file).rows;
    expect(Object.keys(row ?? {}).sort()).toEqual(['z', ...columns].sort());
  }
});

describe('every column agrees with the 30-digit reference to 2e-14', () => {
  test.each(files)('%s', (file) => {
    expect(misses(read(file))).toEqual([]);
  });
});

describe('every milestone agrees with the 30-digit reference to 2e-14', () => {
  test.each(files)('%s', (file) => {
    const { parameters, milestones } = read(file);
    const values = milestoneValues(background(parameters));
    const wrong = MILESTONE_NAMES.filter((name) => {
      const [value, expected] = [values[name], milestones[name] ?? null];
      if (typeof value !== 'number' || expected === null) return value !== expected;
      return relativeDifference(value, Number(expected)) > PROMISED;
    });
    expect(wrong.map((name) => `${name} is ${values[name]}, expected ${milestones[name]}`)).toEqual([]);
  });
});

test('the order of the rows does not matter, and a row alone gives what it gives among others', () => {
  const model = background(read('planckLike.json').parameters);
  const redshifts = [3, -0.5, 1e-4, 1089.8, 0.5, 0];
  const [together, reversed] = [epochs(model, redshifts), epochs(model, redshifts.toReversed()).toReversed()];
  expect(together).toEqual(reversed);
  for (const [k, z] of redshifts.entries()) {
    const [alone] = epochs(model, [z]);
    expect(relativeDifference(alone?.age ?? Number.NaN, together[k]?.age ?? Number.NaN)).toBeLessThan(1e-15);
  }
});
