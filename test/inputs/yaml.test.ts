import { describe, expect, test } from 'vitest';
import { encode, GOOD, report } from './goodContent.ts';

const site = (text: string | Uint8Array) => report({ 'site.yaml': text });
const good = GOOD['site.yaml'] ?? '';

describe('files that cannot be read', () => {
  test('a missing file', () =>
    expect(report({ 'site.yaml': null })).toMatchInlineSnapshot(`
    "site.yaml:1:1  the file is missing  expected this file
    1 problem in 1 file"
  `));
  test('an empty file', () =>
    expect(site('')).toMatchInlineSnapshot(`
    "site.yaml:1:1  the file is empty  expected lines such as "title: ..."
    1 problem in 1 file"
  `));
  test('a file of comments', () =>
    expect(site('# nothing\n\n')).toMatchInlineSnapshot(`
    "site.yaml:1:1  the file is empty  expected lines such as "title: ..."
    1 problem in 1 file"
  `));
  test('a file of null', () =>
    expect(site('~\n')).toMatchInlineSnapshot(`
    "site.yaml:1:1  the file is empty  expected lines such as "title: ..."
    1 problem in 1 file"
  `));
  test('a list at the top', () =>
    expect(site('- title\n')).toMatchInlineSnapshot(`
    "site.yaml:1:1  the file holds a list  expected keys with values, such as "title: ..."
    1 problem in 1 file"
  `));
  test('a word at the top', () =>
    expect(site('title\n')).toMatchInlineSnapshot(`
    "site.yaml:1:1  the file holds a single value  expected keys with values, such as "title: ..."
    1 problem in 1 file"
  `));
  test('a byte order mark, and what else is wrong', () =>
    expect(site(`\uFEFFtitel: x\n${good.slice(good.indexOf('\n') + 1)}`)).toMatchInlineSnapshot(`
      "site.yaml:1:1  the file starts with a byte order mark  expected plain UTF-8: save it "without BOM"
      site.yaml:1:1  title is missing  expected the name of the collection
      site.yaml:1:1  unknown key titel  did you mean title?
      3 problems in 1 file"
    `));
  test('a byte that is not UTF-8', () =>
    expect(site(Uint8Array.of(...encode('title: Tab\ngroup: M'), 0xfc, ...encode('ller\n')))).toMatchInlineSnapshot(`
      "site.yaml:2:9  byte 0xfc is not UTF-8  expected a text file in UTF-8
      1 problem in 1 file"
    `));
  test('a character cut off at the end', () =>
    expect(site(Uint8Array.of(...encode('title: M'), 0xc3))).toMatchInlineSnapshot(`
      "site.yaml:1:9  byte 0xc3 is not UTF-8  expected a text file in UTF-8
      1 problem in 1 file"
    `));
});

describe('broken YAML', () => {
  test('a tab as indentation', () =>
    expect(site('title: x\nlicence:\n\tname: CC\n')).toMatchInlineSnapshot(`
    "site.yaml:3:1  a tab indents this line  expected spaces
    1 problem in 1 file"
  `));
  test('a tab after a colon is only a blank', () =>
    expect(site(good.replace('title: ', 'title:\t'))).toBe('no problems'));
  test('a key given twice', () =>
    expect(site(`${good}base: /x/\n`)).toMatchInlineSnapshot(`
    "site.yaml:6:1  key base is given twice  expected each key once
    1 problem in 1 file"
  `));
  test('a bracket left open', () =>
    expect(site('title: [a, b\ngroup: x\n')).toMatchInlineSnapshot(`
      "site.yaml:2:1  a bracket is still open  expected a "]" before this place
      1 problem in 1 file"
    `));
  test('a quote left open', () =>
    expect(site('title: "a\n')).toMatchInlineSnapshot(`
      "site.yaml:2:1  a quote is still open  expected a closing " before this place
      1 problem in 1 file"
    `));
  test('a colon in text', () =>
    expect(site('title: Tables: the first\n')).toMatchInlineSnapshot(`
      "site.yaml:1:8  a key inside the value of another key  expected each key on a line of its own, or quotes around text that has ": " in it
      1 problem in 1 file"
    `));
  test('a line without key', () =>
    expect(site('title: x\nnonsense\n')).toMatchInlineSnapshot(`
      "site.yaml:2:1  a line without "key: value"  expected a colon and a blank after each key
      1 problem in 1 file"
    `));
  test('a bracket too many', () =>
    expect(site('title: [a]]\n')).toMatchInlineSnapshot(`
      "site.yaml:1:11  broken YAML: unexpected flow-seq-end token in YAML stream: "]"  expected valid YAML, with quotes around text that has special characters
      1 problem in 1 file"
    `));
  test('a reserved character', () =>
    expect(site('title: @x\n')).toMatchInlineSnapshot(`
      "site.yaml:1:8  a value starts with @  expected quotes around it
      1 problem in 1 file"
    `));
  test('an unknown escape', () =>
    expect(site('title: "\\q"\n')).toMatchInlineSnapshot(`
      "site.yaml:1:9  "\\q" means nothing in double quotes  expected single quotes, which keep a backslash
      1 problem in 1 file"
    `));
  test('a second document', () =>
    expect(site(`${good}---\ntitle: x\n`)).toMatchInlineSnapshot(`
      "site.yaml:6:1  a second document starts here  expected no line "---" inside the file
      1 problem in 1 file"
    `));
  test('an unknown tag', () =>
    expect(site('title: !number 5\n')).toMatchInlineSnapshot(`
    "site.yaml:1:8  tag !number is not used here  expected the value without a tag
    1 problem in 1 file"
  `));
  test('a reference', () =>
    expect(site('title: &x a\ngroup: *x\n')).toMatchInlineSnapshot(`
    "site.yaml:2:8  "*x" refers to another place  expected the value itself
    1 problem in 1 file"
  `));
  test('a key that is a list', () =>
    expect(site('? [a]\n: 1\n')).toMatchInlineSnapshot(`
    "site.yaml:1:3  a key is no word  expected a key such as "title"
    1 problem in 1 file"
  `));
  test('Windows line ends are fine', () => expect(site(good.replaceAll('\n', '\r\n'))).toBe('no problems'));
  test('keys that JavaScript objects have of their own are unknown keys', () =>
    expect(site(`${good}__proto__: 1\nconstructor: 2\n`)).toMatchInlineSnapshot(`
      "site.yaml:6:1  unknown key __proto__  expected one of title, group, site, base, licence, contact
      site.yaml:7:1  unknown key constructor  expected one of title, group, site, base, licence, contact
      2 problems in 1 file"
    `));
});
