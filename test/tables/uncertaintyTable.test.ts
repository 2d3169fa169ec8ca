import { parse } from 'csv-parse/sync';
import { describe, expect, test } from 'vitest';
import { background } from '../../src/cosmology/background.ts';
import type { ParameterSet, RedshiftGrid } from '../../src/inputs/types.ts';
import { columnsOf } from '../../src/tables/columns.ts';
import { evaluateRows } from '../../src/tables/evaluateRows.ts';
import { milestoneUncertainty } from '../../src/tables/milestoneUncertainty.ts';
import { uncertaintiesOf, uncertaintyTable } from '../../src/tables/uncertaintyTable.ts';
import { expectClose } from '../support/closeness.ts';
import { shippedSet } from '../support/shippedSet.ts';

const grid: RedshiftGrid = {
  id: 'few',
  title: 'Few',
  redshifts: ['-0.90', '-0.50', '0.00', '0.01', '0.50', '1.00', '3.00', '1089.80'],
};
const other: RedshiftGrid = { id: 'other', title: 'Other', redshifts: ['0.5', '2'] };

function table(set: ParameterSet, topic: 'distances' | 'times' | 'densities' | 'horizons', one: RedshiftGrid = grid) {
  const columns = columnsOf(topic);
  const { rows } = evaluateRows(background(set.parameters), one.redshifts.map(Number));
  const values = rows.map((row) => columns.map(({ id }) => row[id]?.value ?? null));
  return { columns, values, ...uncertaintyTable(uncertaintiesOf(set, [grid, other]), one, columns, values) };
}

const lensing = shippedSet('planck-2018-lensing');

describe('a set with uncertainties', () => {
  const distances = table(lensing, 'distances');

  test('has a file with the column u_<column> for each column, and its redshifts as the grid writes them', () => {
    const [header, ...rows] = parse(distances.uncertaintyCsv ?? '') as string[][];
    expect(header).toEqual(['z', ...distances.columns.map(({ id }) => `u_${id}`)]);
    expect(rows.map(([z]) => z)).toEqual(grid.redshifts);
    expect(rows[4]?.[1]).toBe('11');
  });

  test('has an uncertainty where it has a value, and none where it has none', () => {
    for (const topic of ['distances', 'times', 'densities', 'horizons'] as const) {
      const { values, uncertainties } = table(lensing, topic);
      const blank = (rows: typeof values | typeof uncertainties) =>
        rows?.map((row) => row.map((cell) => cell === null));
      expect(blank(uncertainties), topic).toEqual(blank(values));
    }
  });

  test('has the same uncertainty for the same redshift in every grid', () => {
    const [row] = table(lensing, 'distances', other).uncertainties ?? [];
    expect(row).toEqual(distances.uncertainties?.[4]);
  });

  test('has error budgets at a low, a middle and a high redshift, each of which adds up to 1', () => {
    expect([...new Set(distances.budgets.map(({ redshift }) => redshift))]).toEqual(['0.01', '1.00', '1089.80']);
    expect([...new Set(table(lensing, 'times').budgets.map(({ redshift }) => redshift))]).toEqual([
      '-0.90',
      '0.50',
      '1089.80',
    ]);
    for (const { shares, u, column } of distances.budgets) {
      expect(shares.map(({ parameter }) => parameter)).toEqual(['H0', 'omega_b', 'omega_c']);
      expectClose(
        shares.reduce((sum, { alone, correlated }) => sum + alone + correlated, 0),
        1,
        1e-9,
        column,
      );
      expect(u).toBeGreaterThan(0);
    }
  });

  test('has error budgets without shares where the value is exact', () => {
    const { budgets } = table(lensing, 'times');
    expect(budgets.filter(({ column }) => column === 'a').map(({ u, shares }) => [u, shares])).toEqual([
      [0, []],
      [0, []],
      [0, []],
    ]);
  });

  test('has no error budget where nothing exists but the exact values of today', () => {
    const future = { ...grid, redshifts: ['-0.90', '-0.50', '0.00'] };
    expect(table(lensing, 'distances', future).budgets).toEqual([]);
  });

  test('is linear throughout if its uncertainties are small', () => {
    expect(distances.nonlinear).toEqual([]);
  });

  test('refuses a grid that the uncertainties were not propagated to', () => {
    const found = uncertaintiesOf(lensing, [other]);
    expect(() => uncertaintyTable(found, grid, columnsOf('times'), distances.values)).toThrow(/z = -0.90/);
  });
});

test('a set with evolving dark energy says for which columns and redshifts u is not to be relied on', () => {
  const { nonlinear } = table(shippedSet('desi-2025-w0wa'), 'densities');
  expect(nonlinear).toContainEqual({ column: 'rho_c_kg_m3', from: '-0.90', to: '-0.90' });
  expect(nonlinear).toContainEqual({ column: 'Omega_bc', from: '3.00', to: '3.00' });
  expect(nonlinear.filter(({ column }) => column === 'Omega_k')).toEqual([]);
});

test('a set without uncertainties has no file, no budget and no flag', () => {
  const { uncertainties, uncertaintyCsv, nonlinear, budgets } = table(shippedSet('round-70'), 'times');
  expect({ uncertainties, uncertaintyCsv, nonlinear, budgets }).toEqual({
    uncertainties: null,
    uncertaintyCsv: null,
    nonlinear: [],
    budgets: [],
  });
});

test('milestones have uncertainties, words and missing ones have none', () => {
  const found = milestoneUncertainty(uncertaintiesOf(lensing, [other]));
  expect(found.of('age_today')).toBeGreaterThan(0.02);
  expect(found.of('fate')).toBeNull();
  expect(found.of('t_crunch')).toBeNull();
  expect(found.nonlinear).toEqual([]);
  expect(milestoneUncertainty(null).of('age_today')).toBeNull();
});
