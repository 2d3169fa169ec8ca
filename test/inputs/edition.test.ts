import { describe, expect, test } from 'vitest';
import { GOOD, report, reportWith } from './goodContent.ts';

const [EARLIER, FIRST] = ['editions/2025.2/edition.yaml', 'editions/2025.10/edition.yaml'];
const first = (from: string, to: string) => reportWith(FIRST, from, to);
const earlier = (from: string, to: string) => reportWith(EARLIER, from, to);

describe('an edition', () => {
  test('needs its keys', () =>
    expect(report({ [FIRST]: 'title: x\n' })).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:1:1  state is missing  expected one of draft, released, withdrawn
    editions/2025.10/edition.yaml:1:1  digits is missing  expected a whole number from 6 to 12
    editions/2025.10/edition.yaml:1:1  parameter_sets is missing  expected a list of ids: [planck-2018-lensing, ...]
    editions/2025.10/edition.yaml:1:1  redshift_grids is missing  expected a list of ids: [survey, ...]
    editions/2025.10/edition.yaml:1:1  topics is missing  expected a list: [distances, times, densities, horizons]
    editions/2025.10/edition.yaml:1:1  errata is missing  expected a list of {date, text}, [] if none
    6 problems in 1 file"
  `));
  test('has a state', () =>
    expect(first('draft', 'superseded')).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:2:8  state is the text "superseded"  expected one of draft, released, withdrawn
    1 problem in 1 file"
  `));
  test('has from 6 to 12 digits', () =>
    expect(first('10', '5')).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:3:9  digits is 5  expected a whole number from 6 to 12
    1 problem in 1 file"
  `));
  test('has whole digits', () =>
    expect(first('digits: 10', 'digits: 10.0')).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:3:9  digits is 10.0  expected a whole number from 6 to 12
    1 problem in 1 file"
  `));
  test('has a date when it is released', () =>
    expect(earlier('released: 2025-12-15\n', '')).toMatchInlineSnapshot(`
    "editions/2025.2/edition.yaml:1:1  released is missing  expected the date of release, as state is released
    1 problem in 1 file"
  `));
  test('has a date when it was withdrawn', () =>
    expect(
      report({ [EARLIER]: (GOOD[EARLIER] ?? '').replace(/state[\s\S]*15\n/, 'state: withdrawn\n') }),
    ).toMatchInlineSnapshot(`
      "editions/2025.2/edition.yaml:1:1  released is missing  expected the date of release, as state is withdrawn
      1 problem in 1 file"
    `));
  test('has no date as a draft', () =>
    expect(first('draft', 'draft\nreleased: 2026-01-01')).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:3:11  a draft has a date of release  expected state: released, or no date
    1 problem in 1 file"
  `));
  test('has a date that exists', () =>
    expect(earlier('2025-12-15', '2026-02-30')).toMatchInlineSnapshot(`
    "editions/2025.2/edition.yaml:3:11  released is the text "2026-02-30"  expected a date that exists, as year-month-day: 2026-12-15
    1 problem in 1 file"
  `));
  test('has errata with a date and a text', () =>
    expect(earlier('text:', 'txt:')).toMatchInlineSnapshot(`
    "editions/2025.2/edition.yaml:8:10  errata entry 1.text is missing  expected what was wrong and what holds instead
    editions/2025.2/edition.yaml:8:29  unknown key errata entry 1.txt  did you mean text?
    2 problems in 1 file"
  `));
  test('names topics that exist, once', () =>
    expect(first('[times, distances]', '[time, distances, distances]')).toMatchInlineSnapshot(`
      "editions/2025.10/edition.yaml:6:10  topics entry 1 is the text "time"  did you mean times?
      1 problem in 1 file"
    `));
  test('names each topic once', () =>
    expect(first('[times, distances]', '[times, times]')).toMatchInlineSnapshot(`
      "editions/2025.10/edition.yaml:6:17  times is listed twice  expected each once
      1 problem in 1 file"
    `));
  test('has at least one set and grid', () =>
    expect(
      report({ [FIRST]: (GOOD[FIRST] ?? '').replace('[flat, plain]', '[]').replace('[short]', '[]') }),
    ).toMatchInlineSnapshot(`
      "editions/2025.10/edition.yaml:4:17  parameter_sets is an empty list  expected at least one id: [planck-2018-lensing]
      editions/2025.10/edition.yaml:5:17  redshift_grids is an empty list  expected at least one id: [survey]
      2 problems in 1 file"
    `));
});

describe('what an edition refers to', () => {
  test('a set that does not exist', () =>
    expect(first('[flat, plain]', '[flat, plane]')).toMatchInlineSnapshot(`
      "editions/2025.10/edition.yaml:4:24  there is no parameter set plane  did you mean plain?
      1 problem in 1 file"
    `));
  test('a set listed twice', () =>
    expect(first('[flat, plain]', '[flat, plain, flat]')).toMatchInlineSnapshot(`
      "editions/2025.10/edition.yaml:4:31  flat is listed twice  expected each once
      1 problem in 1 file"
    `));
  test('a grid that does not exist', () =>
    expect(first('[short]', '[survey]')).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:5:18  there is no redshift grid survey  expected one of short
    1 problem in 1 file"
  `));
  test('an edition that does not exist', () =>
    expect(first('2025.2', '2025.3')).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:7:13  there is no edition 2025.3  did you mean 2025.2?
    1 problem in 1 file"
  `));
  test('2025.20 is not 2025.2', () =>
    expect(first('2025.2', '2025.20')).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:7:13  there is no edition 2025.20  did you mean 2025.2?
    1 problem in 1 file"
  `));
  test('what is no edition number', () =>
    expect(first('2025.2', 'first')).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:7:13  supersedes is the text "first"  expected year.number, such as 2026.1
    1 problem in 1 file"
  `));
  test('itself', () =>
    expect(first('2025.2', '2025.10')).toMatchInlineSnapshot(`
    "editions/2025.10/edition.yaml:7:13  editions supersede each other: 2025.10, 2025.10  expected an edition that came before this one
    1 problem in 1 file"
  `));
  test('each other in a circle', () =>
    expect(earlier('errata:', 'supersedes: 2025.10\nerrata:')).toMatchInlineSnapshot(`
      "editions/2025.10/edition.yaml:7:13  editions supersede each other: 2025.10, 2025.2, 2025.10  expected an edition that came before this one
      editions/2025.2/edition.yaml:8:13  editions supersede each other: 2025.2, 2025.10, 2025.2  expected an edition that came before this one
      2 problems in 2 files"
    `));
  test('a circle further on is reported where it stands', () => {
    const third = (GOOD[FIRST] ?? '').replace('2025.2', '2025.10');
    const circle = (GOOD[EARLIER] ?? '').replace('errata:', 'supersedes: 2025.10\nerrata:');
    expect(report({ 'editions/2026.1/edition.yaml': third, [EARLIER]: circle })).toMatchInlineSnapshot(`
      "editions/2025.10/edition.yaml:7:13  editions supersede each other: 2025.10, 2025.2, 2025.10  expected an edition that came before this one
      editions/2025.2/edition.yaml:8:13  editions supersede each other: 2025.2, 2025.10, 2025.2  expected an edition that came before this one
      2 problems in 2 files"
    `);
  });
});

describe('site.yaml', () => {
  const site = (from: string, to: string) => reportWith('site.yaml', from, to);
  test('an address with a path', () =>
    expect(site('.example', '.example/tables')).toMatchInlineSnapshot(`
    "site.yaml:3:7  site is the text "https://tables.lanternfell.example/tables"  expected the address of the server without a path: https://tables.lanternfell.example
    1 problem in 1 file"
  `));
  test('an address without https', () =>
    expect(site('https://tables', 'tables')).toMatchInlineSnapshot(`
    "site.yaml:3:7  site is the text "tables.lanternfell.example"  expected the address of the server without a path: https://tables.lanternfell.example
    1 problem in 1 file"
  `));
  test('a base without slashes', () =>
    expect(site('base: /', 'base: tables')).toMatchInlineSnapshot(`
    "site.yaml:4:7  base is the text "tables"  expected the path below it with a slash at both ends: / or /tables/
    1 problem in 1 file"
  `));
  test('a base with a path is fine', () => expect(site('base: /', 'base: /lanternfell/tables/')).toBe('no problems'));
  test('a licence without address', () =>
    expect(site('https://creativecommons.org/licenses/by/4.0/', 'CC')).toMatchInlineSnapshot(`
      "site.yaml:5:33  licence.url is the text "CC"  expected an address that starts with https:// or http://
      1 problem in 1 file"
    `));
  test('another spelling of licence', () =>
    expect(site('licence', 'license')).toMatchInlineSnapshot(`
    "site.yaml:1:1  licence is missing  expected keys with values: name, url
    site.yaml:5:1  unknown key license  did you mean licence?
    2 problems in 1 file"
  `));
});
