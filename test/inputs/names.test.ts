import { describe, expect, test } from 'vitest';
import { GOOD, report, reportWith } from './goodContent.ts';

const set = GOOD['parameter-sets/plain.yaml'] ?? '';
const grid = GOOD['redshift-grids/short.yaml'] ?? '';

describe('names of files', () => {
  test('that are no ids', () =>
    expect(report({ 'parameter-sets/My Set.yaml': set, 'redshift-grids/a--b.yaml': grid })).toMatchInlineSnapshot(`
      "parameter-sets/My Set.yaml:1:1  "My Set" is no id  expected lower-case letters, digits and single hyphens, such as planck-2018
      redshift-grids/a--b.yaml:1:1  "a--b" is no id  expected lower-case letters, digits and single hyphens, such as planck-2018
      2 problems in 2 files"
    `));
  test('that differ only in case', () =>
    expect(report({ 'parameter-sets/Plain.yaml': set })).toMatchInlineSnapshot(`
    "parameter-sets/Plain.yaml:1:1  "Plain" is no id  expected lower-case letters, digits and single hyphens, such as planck-2018
    parameter-sets/plain.yaml:1:1  plain and Plain differ only in case  expected ids that differ
    2 problems in 2 files"
  `));
  test('with another ending', () =>
    expect(report({ 'parameter-sets/other.yml': set })).toMatchInlineSnapshot(`
    "parameter-sets/other.yml:1:1  other.yml is not read  expected names that end in .yaml
    1 problem in 1 file"
  `));
  test('a README is welcome', () => expect(report({ 'parameter-sets/README.md': '# Sets' })).toBe('no problems'));
  test('a folder that is no edition number', () =>
    expect(
      report({ 'editions/2026.01/edition.yaml': GOOD['editions/2025.2/edition.yaml'] ?? '' }),
    ).toMatchInlineSnapshot(`
      "editions/2026.01/edition.yaml:1:1  the folder 2026.01 is no edition number  expected year.number, such as 2026.1
      1 problem in 1 file"
    `));
  test('no edition', () =>
    expect(
      report({ 'editions/2025.2/edition.yaml': null, 'editions/2025.10/edition.yaml': null }),
    ).toMatchInlineSnapshot(`
      "editions:1:1  there is no edition  expected editions/<number>/edition.yaml
      1 problem in 1 file"
    `));
});

describe('pages of quantities', () => {
  const page = (from: string, to: string) => reportWith('quantities/a.md', from, to);

  test('a column without page', () =>
    expect(report({ 'quantities/a.md': null })).toMatchInlineSnapshot(`
    "quantities/a.md:1:1  column a has no page  expected a page for each column
    1 problem in 1 file"
  `));
  test('a page without column', () =>
    expect(report({ 'quantities/e.md': GOOD['quantities/a.md'] ?? '' })).toMatchInlineSnapshot(`
      "quantities/e.md:1:1  there is no column e  did you mean E?
      1 problem in 1 file"
    `));
  test('a related column that does not exist', () =>
    expect(page('[E]', '[E_z]')).toMatchInlineSnapshot(`
    "quantities/a.md:8:11  there is no column E_z  expected one of a, E
    1 problem in 1 file"
  `));
  test('a column related to itself', () =>
    expect(page('[E]', '[a]')).toMatchInlineSnapshot(`
    "quantities/a.md:8:11  a is related to itself  expected other columns
    1 problem in 1 file"
  `));
  test('a column related twice', () =>
    expect(page('[E]', '[E, E]')).toMatchInlineSnapshot(`
    "quantities/a.md:8:14  E is listed twice  expected each column once
    1 problem in 1 file"
  `));
  test('no front matter', () =>
    expect(report({ 'quantities/a.md': 'Text\n' })).toMatchInlineSnapshot(`
    "quantities/a.md:1:1  the page has no front matter  expected a first line ---
    1 problem in 1 file"
  `));
  test('a front matter without end', () =>
    expect(page('---\nText', 'Text')).toMatchInlineSnapshot(`
    "quantities/a.md:1:1  the front matter does not end  expected a second line ---
    1 problem in 1 file"
  `));
  test('no text', () =>
    expect(page('Text with $z$.\n\nMore text.\n', ' \n')).toMatchInlineSnapshot(`
    "quantities/a.md:10:1  the page has no text  expected text after this line
    1 problem in 1 file"
  `));
  test('an unknown key keeps its line', () =>
    expect(page('alsoCalled', 'also_called')).toMatchInlineSnapshot(`
      "quantities/a.md:2:1  alsoCalled is missing  expected a list of names, [] if none
      quantities/a.md:9:1  unknown key also_called  did you mean alsoCalled?
      2 problems in 1 file"
    `));
  test('a broken front matter keeps its line', () =>
    expect(page("'a = 1/(1+z)'", "'a")).toMatchInlineSnapshot(`
      "quantities/a.md:9:15  a quote is still open  expected a closing ' before this place
      1 problem in 1 file"
    `));
  test('an empty file', () =>
    expect(report({ 'quantities/a.md': '' })).toMatchInlineSnapshot(`
    "quantities/a.md:1:1  the page has no front matter  expected a first line ---
    1 problem in 1 file"
  `));
  test('Windows line ends are fine', () =>
    expect(report({ 'quantities/a.md': (GOOD['quantities/a.md'] ?? '').replaceAll('\n', '\r\n') })).toBe(
      'no problems',
    ));
});
