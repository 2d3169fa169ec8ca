import { describe, expect, test } from 'vitest';
import type { ScalarParameter } from '../../src/cosmology/parameters.ts';
import type { ParameterSet } from '../../src/inputs/types.ts';
import { uncertaintyText } from '../../src/site/methods/uncertaintyText.ts';
import { uncertaintyComparisons } from '../../src/site/uncertainty/comparisons.ts';
import { impliedCorrelations, impliedCovariance } from '../../src/site/uncertainty/impliedCovariance.ts';
import { PRINTED_ROWS, type PrintedRows } from '../../src/site/uncertainty/printedRows.ts';
import { expectClose } from '../support/closeness.ts';
import { shippedSet, shippedSets } from '../support/shippedSet.ts';

const relative = ({ value, u }: { readonly value: string; readonly u: string }) => Number(u) / Number(value);
const u = (set: ParameterSet, name: ScalarParameter) => Number(set.uncertainties[name]);

function covarianceOf(set: ParameterSet, { Omega_m, tight }: PrintedRows) {
  return impliedCovariance({
    h: u(set, 'H0') / Number(set.parameters.H0),
    Omega_m: relative(Omega_m),
    tight: relative(tight),
    power: tight.power,
  });
}

/** The value of Omega_m h^2 that the paper prints, as the notes of the sets use it. */
const OMEGA_M_H2: Readonly<Record<string, number>> = {
  'planck-2018-lensing': 0.143,
  'planck-2018-bao': 0.1424,
  'planck-2015-ext': 0.1417,
  'wmap-9-combined': 0.1376,
};

describe('the correlations of a shipped set', () => {
  test.each(PRINTED_ROWS)('are those which the printed rows imply: $set', (rows) => {
    const set = shippedSet(rows.set);
    const implied = impliedCorrelations(covarianceOf(set, rows), {
      omega_b: u(set, 'omega_b'),
      omega_c: u(set, 'omega_c'),
      omega_m: OMEGA_M_H2[rows.set] ?? Number.NaN,
    });
    const stated = Object.fromEntries(set.correlations.map(([a, b, r]) => [`${a}_${b}`, r]));
    const rounded = Object.fromEntries(Object.entries(implied).map(([pair, r]) => [pair, r.toFixed(3)]));
    expect(stated).toEqual(rounded);
  });

  test('are derived by sums that give the printed uncertainties back', () => {
    for (const rows of PRINTED_ROWS) {
      const set = shippedSet(rows.set);
      const { xx, xy, yy } = covarianceOf(set, rows);
      const variance = (p: number) => yy + 2 * (p - 2) * xy + (p - 2) * (p - 2) * xx; // of y + (p - 2) x
      expectClose(Math.sqrt(variance(0)), relative(rows.Omega_m), 1e-12, `${rows.set}, Omega_m`);
      expectClose(Math.sqrt(variance(rows.tight.power)), relative(rows.tight), 1e-12, `${rows.set}, tight row`);
    }
  });
});

describe('published uncertainties of derived values', () => {
  const all = uncertaintyComparisons(shippedSets());

  test('are compared for every set with printed rows', () => {
    expect([...new Set(all.map(({ set }) => set.id))]).toEqual(PRINTED_ROWS.map(({ set }) => set));
    expect(all.length).toBeGreaterThanOrEqual(17);
  });

  test.each(all)('$set.id: u($of) = $published agrees with $ours within the rounding of the printed rows', (one) => {
    expect(one.agrees).toBe(true);
    expect(one.ours).toBeGreaterThanOrEqual(one.from);
    expect(one.ours).toBeLessThanOrEqual(one.to);
    expect(one.to / one.from).toBeLessThan(1.7);
    expect(one.ours / Number(one.published)).toBeGreaterThan(0.92);
    expect(one.ours / Number(one.published)).toBeLessThan(1.06);
  });

  test('would not agree if H0 and the densities were taken as independent', () => {
    const independent = shippedSets().map((set) => ({ ...set, correlations: [] }));
    const ages = uncertaintyComparisons(independent).filter(({ of }) => of === 'age_today');
    for (const { set, ours, to } of ages) expect(ours, set.id).toBeGreaterThan(to);
  });

  test('are left out for sets that are not there', () => {
    expect(uncertaintyComparisons([shippedSet('round-70')])).toEqual([]);
  });
});

describe('the methods page', () => {
  const body = (sets: readonly ParameterSet[]) => uncertaintyText(sets)[0]?.body ?? '';

  test('prints each comparison and its verdict', () => {
    const lines = body(shippedSets())
      .split('\n')
      .filter((line) => /^\| (planck|wmap)/.test(line));
    expect(lines).toHaveLength(uncertaintyComparisons(shippedSets()).length);
    expect(lines.every((line) => line.endsWith('| yes |'))).toBe(true);
    expect(lines[2]).toBe('| planck-2018-lensing | $t_0$ (Gyr) | 0.023 | 0.0242 | 0.0229 to 0.0254 | yes |');
  });

  test('names the sets that lack correlations, and says how far off the curved one is', () => {
    const text = body(shippedSets());
    expect(text).toContain('act-2025, desi-2025-w0wa, planck-2018-curved');
    expect(text).toContain('$u(D_M(z_*))$ 165 Mpc');
  });

  test('says nothing of sets that are not there', () => {
    const text = body([shippedSet('round-70')]);
    expect(text).not.toMatch(/planck|act-2025|desi|\| set/);
    expect(text).toContain('law of propagation');
  });
});
