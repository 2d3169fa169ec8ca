import { beforeAll, expect, test } from 'vitest';
import type { Content, Edition } from '../../src/inputs/types.ts';
import type { Press } from '../../src/site/press.ts';
import { searchIndex } from '../../src/site/searchIndex.ts';
import type { SearchIndex } from '../../src/site/searchIndexTypes.ts';
import { pressEdition } from '../../src/tables/pressEdition.ts';
import { readPressable } from '../../src/tables/readPressable.ts';

/** Two small editions of the shipped sets: the newer one has one set and one grid more. */
async function smallPress(): Promise<Press> {
  const read = readPressable('content');
  if ('problems' in read) throw new Error('the shipped content has problems');
  const shipped = read.content.editions[0] as Edition;
  const older: Edition = {
    ...shipped,
    number: '2025.9',
    parameterSets: ['round-70'],
    redshiftGrids: ['future'],
    topics: ['times'],
  };
  const newer: Edition = {
    ...older,
    number: '2025.10',
    parameterSets: ['round-70', 'wmap-9-combined'],
    redshiftGrids: ['future', 'reading'],
  };
  const content: Content = { ...read.content, editions: [older, newer] };
  return { content, editions: [await pressEdition(content, older), await pressEdition(content, newer)] };
}

let pressed: Press;
let index: SearchIndex;
beforeAll(async () => {
  pressed = await smallPress();
  index = searchIndex(pressed);
});

test('the current edition comes first, and its published sets before the others', () => {
  expect(index.editions.map(({ number }) => number)).toEqual(['2025.10', '2025.9']);
  const [current] = index.editions;
  expect(current?.sets.map((at) => index.sets[at]?.id)).toEqual(['wmap-9-combined', 'round-70']);
});

test('a set and a grid that two editions share stand there once', () => {
  expect(index.sets.map(({ id }) => id).sort()).toEqual(['round-70', 'wmap-9-combined']);
  expect(index.grids.map(({ id }) => id)).toEqual(['future', 'reading']);
  expect(index.editions[1]?.grids).toEqual([0]);
});

test('redshifts, parameters and milestones are those of the edition, to the digit', () => {
  const table = pressed.editions[1]?.tables.find(({ grid }) => grid.id === 'reading');
  expect(index.grids[1]?.redshifts.split(' ')).toEqual(table?.redshifts);
  const set = index.sets.find(({ id }) => id === 'wmap-9-combined');
  const csv = pressed.editions[1]?.milestones.find((one) => one.set.id === set?.id)?.csv ?? '';
  const age = csv.split('\n').find((line) => line.startsWith('age_today,'));
  expect(set?.milestones.age_today).toBe(age?.split(',')[1]);
  const keeper = pressed.content.parameterSets.find(({ id }) => id === set?.id);
  expect(set?.parameters.H0).toEqual([keeper?.parameters.H0, keeper?.uncertainties.H0]);
});

test('a table that is missing is known to be', () => {
  const [older, newer] = pressed.editions;
  if (!older || !newer) throw new Error('two editions were pressed');
  const without = { ...newer, tables: newer.tables.filter(({ id }) => id !== 'round-70.times.future') };
  const [current] = searchIndex({ ...pressed, editions: [older, without] }).editions;
  expect(current?.missing).toEqual(['round-70.times.future']);
});

test('quantities are found by symbol, by name and by the name without what is in brackets', () => {
  const names = (id: string) => index.columns.find((column) => column.id === id)?.also ?? [];
  expect(names('Omega_bc')).toContain('Omega_bc');
  expect(names('rho_c_kg_m3')).toContain('Critical density');
  expect(names('D_L_Mpc')).toContain('D_L');
  expect(index.columns.at(-1)?.id).toBe('z');
});
