import { describe, expect, test } from 'vitest';
import { milestoneLines } from '../../src/site/set/milestoneLines.ts';
import { uncertaintySentence } from '../../src/site/setCautions.ts';
import { budgetView } from '../../src/site/table/budgetView.ts';
import { cautions } from '../../src/site/table/cautions.ts';
import type { ErrorBudget } from '../../src/tables/uncertaintyTypes.ts';
import { shippedSet } from '../support/shippedSet.ts';

const lensing = shippedSet('planck-2018-lensing');
const flat = { ...shippedSet('desi-2025-flat'), correlations: [] };
const textbook = shippedSet('einstein-de-sitter');

const columns = [
  { id: 'D_C_Mpc', name: 'Comoving distance', symbol: '<i>C</i>' },
  { id: 'D_M_Mpc', name: 'Transverse comoving distance', symbol: '<i>M</i>' },
  { id: 'mu_mag', name: 'Distance modulus', symbol: '<i>μ</i>' },
];

describe('the error budget of a table', () => {
  const shares = [
    { parameter: 'H0', alone: 2.909, correlated: -1.292 },
    { parameter: 'omega_b', alone: 0.013, correlated: 0.056 },
    { parameter: 'omega_c', alone: 0.841, correlated: -1.527 },
  ] as const;
  const budgets: ErrorBudget[] = [
    { column: 'D_C_Mpc', redshift: '-0.5', u: 0, shares: [] },
    { column: 'D_M_Mpc', redshift: '-0.5', u: 0, shares: [] },
    { column: 'D_C_Mpc', redshift: '1.0', u: 12, shares },
    { column: 'D_M_Mpc', redshift: '1.0', u: 12, shares },
    { column: 'mu_mag', redshift: '1.0', u: 0.012, shares: shares.toReversed() },
  ];
  const view = budgetView({ set: lensing, budgets }, columns);

  test('has the parts by themselves in per cent, and behind them those of the correlations together', () => {
    expect(view?.redshifts).toEqual(['−0.5', '1.0']);
    expect(view?.parameters.map(({ name }) => name)).toEqual([
      'Hubble constant',
      'Baryons, physical density',
      'Cold dark matter, physical density',
    ]);
    expect(view?.lines[0]?.groups).toEqual([[], ['291', '1', '84', '−276']]);
  });

  test('names columns with the same parts in one line, and leaves a blank where there is no uncertainty', () => {
    expect(view?.lines.map((line) => line.columns.map(({ symbol }) => symbol))).toEqual([
      ['<i>C</i>', '<i>M</i>'],
      ['<i>μ</i>'],
    ]);
    expect(view?.lines[1]?.groups[0]).toBeNull();
  });

  test('names a quantity that stands in several units once', () => {
    const units = columns.map((column) => ({ ...column, symbol: '<i>ρ</i>' })).slice(0, 2);
    expect(budgetView({ set: lensing, budgets }, units)?.lines.map((line) => line.columns.length)).toEqual([1]);
  });

  test('has no part of correlations where the set gives none', () => {
    const half = { parameter: 'H0', alone: 0.504, correlated: 0 } as const;
    const rest = { parameter: 'Omega_m', alone: 0.496, correlated: 0 } as const;
    const independent = budgetView(
      { set: flat, budgets: [{ column: 'D_C_Mpc', redshift: '1.0', u: 12, shares: [half, rest] }] },
      columns,
    );
    expect(independent?.correlated).toBe(false);
    expect(independent?.lines[0]?.groups).toEqual([['50', '50']]);
  });

  test('is left out for a set without uncertainties', () => {
    expect(budgetView({ set: textbook, budgets: [] }, columns)).toBeNull();
  });
});

describe('the cautions of a table', () => {
  const table = {
    set: lensing,
    topic: 'distances',
    redshifts: ['1.0', '2.0'],
    beyondAntipode: [],
    nonlinear: [],
  } as const;

  test('say what paler digits mean, or that there are none', () => {
    expect(cautions(table, columns)).toEqual([uncertaintySentence(lensing)]);
    expect(uncertaintySentence(lensing)).toMatch(/known to 0\.8 per cent\. Digits in paler ink/);
    expect(uncertaintySentence(textbook)).toMatch(/gives no uncertainties.*no digit is paler/);
  });

  test('name the columns and redshifts where u is off, those of the same redshifts together', () => {
    const nonlinear = [
      { column: 'D_C_Mpc', from: '-0.90', to: '-0.75' },
      { column: 'D_M_Mpc', from: '-0.90', to: '-0.75' },
      { column: 'mu_mag', from: '2.0', to: '2.0' },
    ];
    expect(cautions({ ...table, nonlinear }, columns)[1]).toMatch(
      /10 per cent in <i>C<\/i>, <i>M<\/i> \(<i>z<\/i> = −0\.90 to −0\.75\); <i>μ<\/i> \(<i>z<\/i> = 2\.0\)\.$/,
    );
  });
});

describe('a milestone', () => {
  const printed = (value: number | string, u: number | null) => {
    const milestone = { name: 'age_today', unit: 'Gyr', value, u } as const;
    const { lines } = milestoneLines({
      id: 'set.milestones',
      set: lensing,
      milestones: [milestone],
      nonlinear: [],
      csv: '',
      checksum: '',
    });
    return [lines[0]?.value, lines[0]?.u];
  };

  test.each([
    [13.797129, 0.0242, ['13.79<i>713</i>', '±0.024\u2007\u2007']],
    [4450.6011, 36.1, ['445<i>0.601</i>', '±36\u2008\u2007\u2007\u2007']],
    [8.52273e-27, 1.37e-28, ['8.5<i>22730</i>\u2009×\u200910⁻²⁷', '±1.4\u2009×\u200910⁻²⁸']],
    [13.797129, null, ['13.79713', '']],
    ['expands forever', null, ['expands forever', '']],
  ])('of %j with the uncertainty %j is printed as %j', (value, u, texts) => {
    expect(printed(value, u)).toEqual(texts);
  });
});
