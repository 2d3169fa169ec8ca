import { readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { countTables } from '../../src/tables/countTables.ts';
import { differingTables } from '../../src/tables/differingTables.ts';
import type { EditionTables, MilestoneTable, Table } from '../../src/tables/types.ts';
import { writeTables } from '../../src/tables/writeTables.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';

/** Only what these functions read. */
const pressed = {
  edition: { number: '2026.10' },
  tables: [
    {
      id: 'a.times.coarse',
      csv: 'z,a\n0,1\n',
      uncertaintyCsv: 'z,u_a\n0,0\n',
      interpolationCsv: 'column\na\n',
      redshifts: ['0'],
      columns: [{}],
      audited: [new Map([[0, '1']])],
    },
    {
      id: 'a.distances.fine',
      csv: 'z,d,e\n0,1,2\n1,2,3\n',
      uncertaintyCsv: null,
      interpolationCsv: 'column\nd\ne\n',
      redshifts: ['0', '1'],
      columns: [{}, {}],
      audited: [new Map(), new Map()],
    },
  ] as unknown as readonly Table[],
  milestones: [
    { id: 'a.milestones', csv: 'name,value\n', milestones: [{}, { audited: '1.5' }, {}] },
  ] as unknown as readonly MilestoneTable[],
} as unknown as EditionTables;

const tables = join('editions', '2026.10', 'tables');

test('writeTables writes every CSV of an edition, byte for byte, to editions/NUMBER/tables', () => {
  const folder = temporaryFolder();
  expect(writeTables(folder, pressed)).toBe(6);
  expect(readdirSync(join(folder, tables)).sort()).toEqual([
    'a.distances.fine.csv',
    'a.distances.fine.interpolation.csv',
    'a.milestones.csv',
    'a.times.coarse.csv',
    'a.times.coarse.interpolation.csv',
    'a.times.coarse.u.csv',
  ]);
  expect(readFileSync(join(folder, tables, 'a.times.coarse.csv'), 'utf8')).toBe('z,a\n0,1\n');
  expect(readFileSync(join(folder, tables, 'a.times.coarse.u.csv'), 'utf8')).toBe('z,u_a\n0,0\n');
  expect(readFileSync(join(folder, tables, 'a.times.coarse.interpolation.csv'), 'utf8')).toBe('column\na\n');
});

test('countTables counts the z column and the lines of the milestones', () => {
  expect(countTables([pressed, pressed])).toEqual({ tables: 6, rows: 12, cells: 22, settled: 4 });
});

test('differingTables names changed, missing and surplus files, and no others', () => {
  const folder = temporaryFolder();
  writeTables(folder, pressed);
  expect(differingTables(folder, [pressed])).toEqual([]);
  writeFileSync(join(folder, tables, 'a.times.coarse.csv'), 'z,a\n0,1.0\n');
  writeFileSync(join(folder, tables, 'b.times.coarse.csv'), '');
  rmSync(join(folder, tables, 'a.milestones.csv'));
  rmSync(join(folder, tables, 'a.times.coarse.u.csv'));
  const names = ['a.milestones', 'a.times.coarse', 'a.times.coarse.u', 'b.times.coarse'];
  expect([...differingTables(folder, [pressed])].sort()).toEqual(names.map((name) => join(tables, `${name}.csv`)));
});
