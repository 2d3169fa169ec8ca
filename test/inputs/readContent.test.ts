import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { formatProblems } from '../../src/inputs/formatProblems.ts';
import { readContent } from '../../src/inputs/readContent.ts';
import { contentOf, GOOD } from './goodContent.ts';

let folder = '';
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'content-'));
  for (const [path, text] of Object.entries(GOOD)) write(path, text);
});
afterEach(() => rmSync(folder, { recursive: true }));

function write(path: string, text: string): void {
  mkdirSync(dirname(join(folder, path)), { recursive: true });
  writeFileSync(join(folder, path), text);
}

function snapshotOfFolder(): Record<string, string> {
  const paths = readdirSync(folder, { recursive: true, encoding: 'utf8' }).sort();
  return Object.fromEntries(
    paths.map((path) => [
      path,
      path.includes('.') && !/\d$/.test(path) ? readFileSync(join(folder, path), 'utf8') : '',
    ]),
  );
}

function reportOf(path: string): string {
  const result = readContent(path, { columnIds: ['a', 'E'] });
  return 'problems' in result ? formatProblems(result.problems) : 'no problems';
}

describe('a folder on disk', () => {
  test('is read as its files say, and nothing in it is changed', () => {
    const before = snapshotOfFolder();
    expect(readContent(folder, { columnIds: ['a', 'E'] })).toEqual({ content: contentOf() });
    expect(snapshotOfFolder()).toEqual(before);
  });

  test('may hold what is none of its business', () => {
    write('parameter-sets/.flat.yaml.swp', 'x');
    write('parameter-sets/_draft.yaml', 'x');
    write('editions/2025.2/tables/flat.distances.short.csv', 'z\n');
    write('editions/README.md', 'x');
    write('pictures/x.png', 'x');
    expect(reportOf(folder)).toBe('no problems');
  });

  test('names a file as the caller would', () => {
    write('site.yaml', 'title: [');
    expect(reportOf(folder)).toBe(
      `${folder}/site.yaml:1:9  a bracket is still open  expected a "]" before this place\n1 problem in 1 file`,
    );
    expect(reportOf(`${folder}/`)).toContain(`${folder}/site.yaml:1:9`);
  });

  test('needs site.yaml, and edition.yaml in each edition', () => {
    rmSync(join(folder, 'site.yaml'));
    rmSync(join(folder, 'editions/2025.10/edition.yaml'));
    expect(reportOf(folder).replaceAll(folder, 'content')).toMatchInlineSnapshot(`
      "content/editions/2025.10/edition.yaml:1:1  the file is missing  expected this file
      content/site.yaml:1:1  the file is missing  expected this file
      2 problems in 2 files"
    `);
  });

  test('must be there', () => {
    expect(reportOf(join(folder, 'none')).replaceAll(folder, 'content')).toMatchInlineSnapshot(`
      "content/none:1:1  there is no such folder  expected the folder that holds site.yaml
      1 problem in 1 file"
    `);
    expect(reportOf(join(folder, 'site.yaml')).replaceAll(folder, 'content')).toMatchInlineSnapshot(`
      "content/site.yaml:1:1  this is no folder  expected the folder that holds site.yaml
      1 problem in 1 file"
    `);
  });

  test('may be empty, and then lacks everything', () => {
    const empty = join(folder, 'empty');
    mkdirSync(empty);
    expect(reportOf(empty).replaceAll(empty, 'content')).toMatchInlineSnapshot(`
      "content/editions:1:1  there is no edition  expected editions/<number>/edition.yaml
      content/quantities/E.md:1:1  column E has no page  expected a page for each column
      content/quantities/a.md:1:1  column a has no page  expected a page for each column
      content/site.yaml:1:1  the file is missing  expected this file
      4 problems in 4 files"
    `);
  });
});
