import { expect, test } from 'vitest';
import { columnsOf } from '../../src/tables/columns.ts';
import { interpolationTable } from '../../src/tables/interpolationTable.ts';

const [first, second] = columnsOf('distances');

test('interpolationTable keeps the columns of its table, in their order, and rounds errors up', () => {
  if (!first || !second) throw new Error('two columns are needed');
  const found = [
    { column: 't_Gyr', linear: null, lagrange: null },
    { column: second.id, linear: null, lagrange: null },
    {
      column: first.id,
      linear: { relative: 0.00121, z: 0.0143761, absolute: 44.01 },
      lagrange: { relative: 9.91e-8, z: 0, absolute: 0 },
    },
  ] as const;
  const { interpolation, interpolationCsv } = interpolationTable(found, [first, second]);
  expect(interpolation.map(({ column }) => column)).toEqual([first.id, second.id]);
  expect(interpolationCsv.split('\n')).toEqual([
    'column,linear_relative,linear_z,lagrange_relative,lagrange_z,linear_absolute,lagrange_absolute',
    `${first.id},0.0013,0.01438,1.0E-7,0,45,0`,
    `${second.id},,,,,,`,
    '',
  ]);
});
