import { expect, test } from 'vitest';
import { cellOf } from '../../src/client/search/cellOf.ts';
import { rangeOf } from '../../src/client/table/rangeOf.ts';
import { readUncertainties } from '../../src/client/table/readUncertainties.ts';
import { readView, writeView } from '../../src/client/table/viewState.ts';

const columns = ['D_C_Mpc', 'D_L_Mpc', 'mu_mag'];

test.each([
  ['', {}],
  ['?from=0.1&to=1', { from: '0.1', to: '1' }],
  ['?columns=mu_mag,D_C_Mpc', { columns: ['D_C_Mpc', 'mu_mag'] }],
  ['?columns=no_such_column', {}],
  ['?columns=D_C_Mpc,D_L_Mpc,mu_mag', {}],
  ['?u=1', { u: true }],
  ['?u=0', {}],
])('the address query %j is the view %j', (query, view) => {
  expect(readView(query, columns)).toEqual({ from: undefined, to: undefined, columns: undefined, ...view });
});

test('a view is written so that it is read again', () => {
  const view = { from: '0.1', to: undefined, columns: ['D_L_Mpc', 'mu_mag'], u: true as const };
  const query = writeView('', view);
  expect(query).toBe('?from=0.1&columns=D_L_Mpc,mu_mag&u=1');
  expect(readView(query, columns)).toEqual(view);
});

test('the whole table has no query, and what is not of the view stays', () => {
  expect(writeView('?from=1&to=2&columns=mu_mag&u=1', {})).toBe('');
  expect(writeView('?from=1&for=draft', { to: '2' })).toBe('?for=draft&to=2');
});

const uFile = 'z,u_D_C_Mpc,u_mu_mag\n0.00,0,\n0.05,1.7,0.017\n';

test('the uncertainties of a file are found by row and column, in the order of the table', () => {
  expect(readUncertainties(uFile, ['0.05', '0.00'], ['mu_mag', 'D_C_Mpc'])).toEqual([
    ['0.017', '1.7'],
    ['', '0'],
  ]);
});

test.each([
  ['a row', uFile, ['0.10'], ['D_C_Mpc']],
  ['a column', uFile, ['0.05'], ['D_L_Mpc']],
  ['everything', '<!doctype html>\n', ['0.05'], ['D_C_Mpc']],
])('a file that lacks %s is refused', (_, csv, rows, some) => {
  expect(() => readUncertainties(csv, rows, some)).toThrow(RangeError);
});

const redshifts = [0, 0.25, 0.5, 0.75, 1];

test.each([
  ['', '', { start: 0, end: 5 }],
  ['0.25', '0.75', { start: 1, end: 4 }],
  ['0.3', '0.6', { start: 2, end: 3 }],
  ['0,3', '', { start: 2, end: 5 }],
  ['', 'z=0.5', { start: 0, end: 3 }],
  ['0.5', '0.5', { start: 2, end: 3 }],
  ['2', '3', { start: 5, end: 5 }],
])('from %j to %j are the rows %j', (from, to, range) => {
  expect(rangeOf(redshifts, from, to)).toEqual(range);
});

test.each([
  ['half', '', '“half” is not a redshift.'],
  ['', '1 Mpc', '“1 Mpc” is not a redshift.'],
  ['1', '0.5', 'From 1 to 0.5 runs backwards.'],
])('from %j to %j is refused: %s', (from, to, message) => {
  expect(rangeOf(redshifts, from, to)).toBe(message);
});

const csv = 'z,D_C_Mpc,mu_mag\n0.00,0.000000000,\n0.05,219.2813456,36.81026417\n0.5,1,2\n';

test.each([
  ['0.05', 'mu_mag', '36.81026417'],
  ['0.00', 'mu_mag', ''],
  ['0.5', 'D_C_Mpc', '1'],
  ['0.50', 'D_C_Mpc', undefined],
  ['0.05', 'D_L_Mpc', undefined],
])('the cell of row %s and column %s is %j', (redshift, column, cell) => {
  expect(cellOf(csv, { redshift, column })).toBe(cell);
});
