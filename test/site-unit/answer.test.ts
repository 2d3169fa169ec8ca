import { expect, test } from 'vitest';
import { answer } from '../../src/client/search/answer.ts';
import { openLibrary } from '../../src/client/search/library.ts';
import { sampleIndex } from './sampleIndex.ts';

const library = openLibrary(sampleIndex);
const ask = (text: string) => answer(text, library);
const addresses = (text: string): string[] => ask(text).hits.map((hit) => hit.href);
const table = (id: string): string => `/editions/2026.1/tables/${id}/`;
const row = (id: string, z: string): string => `${table(id)}#z=${z}`;

test.each([
  ['luminosity distance 0.5 planck'],
  ['planck D_L at z = 0.50'],
  ['D L 0,5 planck'],
  ['photometric distances, z0.5, Planck'],
  ['luminosty distance .5 planc'],
])('%j leads to the rows 0.50 of the named sets on the finest grid that has them', (text) => {
  expect(addresses(text).slice(0, 2)).toEqual([
    row('planck-2018.distances.survey', '0.50'),
    row('planck-2015.distances.survey', '0.50'),
  ]);
});

test('a row says set, grid and edition, and where its value stands', () => {
  expect(ask('D_L z=0.5').hits[0]).toEqual({
    href: '/editions/2026.1/tables/planck-2018.distances.survey/#z=0.50',
    title: 'Luminosity distance at z = 0.50',
    detail: 'Planck 2018 base ΛCDM · Survey grid · edition 2026.1',
    cell: {
      csv: '/editions/2026.1/tables/planck-2018.distances.survey.csv',
      redshift: '0.50',
      column: 'D_L_Mpc',
      unit: 'Mpc',
    },
  });
});

test('a bare redshift leads to every topic of the first set', () => {
  expect(ask('0.73').hits.map((hit) => hit.title)).toEqual(
    ['Distances', 'Times', 'Densities', 'Horizons'].map((topic) => `${topic} at z = 0.73`),
  );
});

test('a redshift between two rows leads to both and says so', () => {
  const { hits, notes } = ask('age at 2.33');
  expect(notes).toEqual(['2.33 is not on “Reading grid”; nearest 2.3 and 2.4.']);
  expect(hits.slice(0, 2).map((hit) => hit.href)).toEqual([
    row('planck-2018.times.reading', '2.3'),
    row('planck-2018.times.reading', '2.4'),
  ]);
});

test.each([
  ['z=20000', '20000 lies beyond every row of “Logarithmic grid”, which ends at 10000.'],
  ['z=-0.5', '−0.5 lies below every row of “Reading grid”, which begins at 0.0.'],
])('%j is told that it is off the grids', (text, note) => {
  expect(ask(text).notes).toEqual([note]);
});

test('a named grid is kept to, even where another has the redshift', () => {
  expect(addresses('age 0.73 planck 2018 reading')[0]).toBe('/editions/2026.1/tables/planck-2018.times.reading/#z=0.7');
});

test('a table that the edition does not have is not offered', () => {
  expect(addresses('D_L 1089.80 plain convention').filter((href) => href.includes('plain.distances.long'))).toEqual([]);
});

test('an edition is taken as written, not as a number', () => {
  expect(addresses('2025.2 age 0.5')[0]).toBe('/editions/2025.2/tables/planck-2018.times.reading/#z=0.5');
});

test.each([
  ['H0 planck', 'Hubble constant', '67.36 ± 0.54 km/s/Mpc'],
  ['Ω_m', 'Matter density', '0.3153 ± 0.0073'],
  ['t₀', 'Age today', '13.797 Gyr'],
  ['when does acceleration begin', 'Redshift at which acceleration begins', '0.63'],
  ['67.36', 'Hubble constant', '67.36 ± 0.54 km/s/Mpc'],
  ['H0 70', 'Hubble constant', '70 km/s/Mpc'],
  ['13.77 Gyr', 'Age today', '13.772 Gyr'],
  ['w0 -1', 'Dark energy equation of state today', '-1'],
])('%j finds the value of %s first: %s', (text, title, value) => {
  const [hit] = ask(text).hits;
  const { written, u, unit } = hit?.value ?? { written: '', unit: '' };
  expect(hit?.title).toBe(title);
  expect([written, ...(u === undefined ? [] : ['±', u]), unit].join(' ').trim()).toBe(value);
});

test('a milestone leads to its line on the page of the set', () => {
  expect(addresses('age today wmap')[0]).toBe('/editions/2026.1/sets/wmap-9/#age_today');
});

test('numbers in the name of a set are not redshifts', () => {
  expect(addresses('planck 2018')).toEqual(['/editions/2026.1/sets/planck-2018/']);
  expect(addresses('0.3/0.7/70')).toEqual(['/editions/2026.1/sets/plain/']);
  expect(addresses('0.3')[0]).toBe('/editions/2026.1/tables/planck-2018.distances.survey/#z=0.30');
});

test('a quantity without a redshift leads to its page and to the tables that print it', () => {
  expect(addresses('critical density').slice(0, 3)).toEqual([
    '/quantities/rho_c_kg_m3/',
    '/quantities/rho_c_g_cm3/',
    table('planck-2018.densities.reading'),
  ]);
});

test('a topic and a grid lead to the table', () => {
  expect(addresses('times survey wmap')).toContain(table('wmap-9.times.survey'));
});

test('"a" is the scale factor by itself and before a redshift, an article elsewhere', () => {
  expect(addresses('a')[0]).toBe('/quantities/a/');
  expect(addresses('a at 1')[0]).toBe('/editions/2026.1/tables/planck-2018.times.survey/#z=1.00');
  expect(ask('a luminosity distance').reading).toBe('Luminosity distance');
});

test('a symbol typed to the letter is not another one with the same letters', () => {
  const rows = (text: string) => [...new Set(ask(text).hits.map((hit) => hit.title.replace(/ at z = .*/, '')))];
  expect(rows('D_M 0.5')).toEqual(['Transverse comoving distance']);
  expect(rows('DM 0.5')).toEqual(['Distance modulus']);
  expect(rows('dm 0.5')).toEqual(['Transverse comoving distance', 'Distance modulus']);
});

test('a word that is known somewhere is not taken for a misspelling', () => {
  expect(ask('survey').hits.every((hit) => hit.detail.includes('Survey grid'))).toBe(true);
  expect(addresses('plank age 0.5')[0]).toBe(row('planck-2018.times.survey', '0.50'));
});

test('words of a description find it together, even if one of them is a topic', () => {
  expect(ask('horizon today').hits[0]?.title).toBe('Particle horizon today');
});

test('words that name nothing are named', () => {
  expect(ask('flurbl')).toEqual({ reading: '', notes: ['Nothing here is called “flurbl”.'], hits: [] });
});

test('an empty query has an empty answer', () => {
  expect(ask('  ')).toEqual({ reading: '', notes: [], hits: [] });
});
