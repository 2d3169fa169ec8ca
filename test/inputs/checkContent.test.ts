import { describe, expect, test } from 'vitest';
import type { PlaceInEdition } from '../../src/inputs/types.ts';
import { check, contentOf, report } from './goodContent.ts';

describe('a folder without problems', () => {
  const content = contentOf();

  test('numbers stay as they are written', () => {
    expect(content.parameterSets).toEqual([
      {
        id: 'flat',
        title: 'Flat example',
        kind: 'published',
        source: { citation: 'Somebody (2025)', doi: '10.1234/abc.5', where: 'Table 1' },
        parameters: {
          H0: '67.360',
          Omega_m: '0.3153',
          Omega_k: '0',
          w0: '-1',
          wa: '0.0',
          T_CMB: '2.7255',
          N_eff: '3.046',
          m_nu: ['0', '0', '6e-2'],
        },
        uncertainties: { H0: '0.54', Omega_m: '0.0073' },
        correlations: [['H0', 'Omega_m', '-0.99']],
        note: 'free text',
      },
      {
        id: 'plain',
        title: 'Plain',
        kind: 'textbook',
        source: { citation: 'Convention' },
        parameters: { H0: '70', omega_b: '0.02', omega_c: '0.12', w0: '-1', wa: '0', T_CMB: '0', N_eff: '0', m_nu: [] },
        uncertainties: {},
        correlations: [],
      },
    ]);
  });

  test('a grid is expanded without doubles, single values in their places', () => {
    expect(content.redshiftGrids).toEqual([
      {
        id: 'short',
        title: 'Short grid',
        redshifts: ['0.0', '0.0500', '0.1', '0.2', '0.3', '0.65', '1.00', '1089.80'],
      },
    ]);
  });

  test('editions come in the order of their numbers, read as written: 2025.10 after 2025.2', () => {
    expect(content.editions).toEqual([
      {
        number: '2025.2',
        title: 'Earlier',
        state: 'released',
        released: '2025-12-15',
        digits: 8,
        parameterSets: ['plain'],
        redshiftGrids: ['short'],
        topics: ['distances'],
        errata: [{ date: '2026-01-10', text: 'A misprint on the home page.' }],
      },
      {
        number: '2025.10',
        title: 'First',
        state: 'draft',
        digits: 10,
        parameterSets: ['flat', 'plain'],
        redshiftGrids: ['short'],
        topics: ['times', 'distances'],
        supersedes: '2025.2',
        errata: [],
      },
    ]);
  });

  test('a quantity page is its front matter and its text', () => {
    expect(content.quantities.map(({ id }) => id)).toEqual(['E', 'a']);
    expect(content.quantities[1]).toEqual({
      id: 'a',
      name: 'Scale factor',
      symbol: 'a',
      formula: 'a = 1/(1+z)',
      definition: 'One sentence.',
      symbols: [{ symbol: 'z', meaning: 'redshift', unit: '' }],
      source: 'Hogg (1999), sect. 2',
      related: ['E'],
      alsoCalled: [],
      body: 'Text with $z$.\n\nMore text.',
    });
  });

  test('site settings', () => {
    expect(content.site).toEqual({
      title: 'Test tables',
      group: 'Lanternfell Survey',
      site: 'https://tables.lanternfell.example',
      base: '/',
      licence: { name: 'CC BY 4.0', url: 'https://creativecommons.org/licenses/by/4.0/' },
    });
  });
});

test('problems of all files are reported together, by file and line', () => {
  expect(
    report({
      'site.yaml': 'title: x\n',
      'parameter-sets/flat.yaml': 'titel: x\nkind: published\n',
      'redshift-grids/short.yaml': '\ttitle: x\n',
      'quantities/E.md': null,
    }),
  ).toMatchInlineSnapshot(`
    "parameter-sets/flat.yaml:1:1  title is missing  expected a title, as the paper labels the set
    parameter-sets/flat.yaml:1:1  source is missing  expected keys with values: citation, doi, where
    parameter-sets/flat.yaml:1:1  parameters is missing  expected keys with values: H0, Omega_m, omega_b, omega_c, Omega_k, Omega_DE, w0, wa, T_CMB, N_eff, m_nu
    parameter-sets/flat.yaml:1:1  unknown key titel  did you mean title?
    quantities/E.md:1:1  column E has no page  expected a page for each column
    redshift-grids/short.yaml:1:1  a tab indents this line  expected spaces
    site.yaml:1:1  group is missing  expected the group that publishes it
    site.yaml:1:1  site is missing  expected the address of the server without a path: https://tables.lanternfell.example
    site.yaml:1:1  base is missing  expected the path below it with a slash at both ends: / or /tables/
    site.yaml:1:1  licence is missing  expected keys with values: name, url
    10 problems in 4 files"
  `);
});

test('a set whose file has problems still counts as known to an edition', () => {
  expect(report({ 'parameter-sets/plain.yaml': 'title: [\n' })).toMatchInlineSnapshot(`
    "parameter-sets/plain.yaml:2:1  a bracket is still open  expected a "]" before this place
    1 problem in 1 file"
  `);
});

describe('checks that need the physics', () => {
  const places: unknown[] = [];
  const extraChecks = (_: unknown, placeOf: PlaceInEdition) => {
    places.push(placeOf('set', 'plain', '2025.10'), placeOf('set', 'plain'), placeOf('grid', 'short', '2025.10'));
    return [{ ...placeOf('set', 'flat', '2025.10'), wrong: 'no Big Bang', expected: 'another grid' }];
  };

  test('are made on content without other problems, and find their places', () => {
    expect(check({}, { extraChecks })).toEqual({
      problems: [
        { file: 'editions/2025.10/edition.yaml', line: 4, column: 18, wrong: 'no Big Bang', expected: 'another grid' },
      ],
    });
    expect(places).toEqual([
      { file: 'editions/2025.10/edition.yaml', line: 4, column: 24 },
      { file: 'editions/2025.2/edition.yaml', line: 5, column: 18 },
      { file: 'editions/2025.10/edition.yaml', line: 5, column: 18 },
    ]);
  });

  test('are not made on content with problems', () => {
    const never = () => {
      throw new Error('called');
    };
    expect('problems' in check({ 'site.yaml': '' }, { extraChecks: never })).toBe(true);
  });

  test('cannot ask for what no edition lists', () => {
    const wrong = (_: unknown, placeOf: PlaceInEdition) => [{ ...placeOf('set', 'other'), wrong: '', expected: '' }];
    expect(() => check({}, { extraChecks: wrong })).toThrow('lists the set other');
  });
});

test('without the list of columns, any pages of quantities will do', () => {
  expect('content' in check({ 'quantities/E.md': null }, {})).toBe(true);
});
