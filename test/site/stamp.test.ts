import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { readContent } from '../../src/inputs/readContent.ts';
import type { ParameterSet } from '../../src/inputs/types.ts';
import { site } from './harness.ts';
import { csvOf, plainText, tablePages } from './pages.ts';

const read = readContent(site.content);
if ('problems' in read) throw new Error('the content under test has problems');
const { parameterSets, editions } = read.content;

/** `editions/<number>/tables/<set>.<topic>.<grid>/` */
function partsOf(path: string): { number: string; set: ParameterSet } {
  const [, number = '', , table = ''] = path.split('/');
  const set = parameterSets.find(({ id }) => id === table.split('.').slice(0, -2).join('.'));
  if (!set) throw new Error(`${path}: no such parameter set`);
  return { number, set };
}

function stampOf(html: string): string {
  return plainText(/<section class="colophon"[\s\S]*?<\/section>/.exec(html)?.[0] ?? '');
}

test('there is a page for every parameter set, topic and grid of every edition', () => {
  const wanted = editions.flatMap(({ number, parameterSets: sets, topics, redshiftGrids }) =>
    sets.flatMap((set) =>
      topics.flatMap((topic) => redshiftGrids.map((grid) => `editions/${number}/tables/${set}.${topic}.${grid}/`)),
    ),
  );
  expect(tablePages().map(({ path }) => path)).toEqual(wanted.sort());
});

describe('the stamp of every table page', () => {
  const pages = tablePages();

  test('shows the SHA-256 of the file beside it', () => {
    const wrong = pages.filter(({ path, html }) => {
      const bytes = readFileSync(join(site.dist, csvOf(path)));
      return !stampOf(html).includes(createHash('sha256').update(bytes).digest('hex'));
    });
    expect(wrong.map(({ path }) => path)).toEqual([]);
  });

  test('shows the edition, the citation of the set and the method', () => {
    const wrong = pages.filter(({ path, html }) => {
      const { number, set } = partsOf(path);
      const stamp = stampOf(html);
      return !(stamp.includes(`Edition ${number}`) && stamp.includes(set.source.citation) && stamp.includes('Method'));
    });
    expect(wrong.map(({ path }) => path)).toEqual([]);
  });

  test('shows every parameter of the set as its file writes it', () => {
    const missing = pages.flatMap(({ path, html }) => {
      const stamp = stampOf(html);
      const values = Object.values(partsOf(path).set.parameters).flat();
      return values
        .filter((value) => !stamp.includes(`= ${value}`) && !stamp.includes(`, ${value}`))
        .map((v) => `${path}: ${v}`);
    });
    expect(missing).toEqual([]);
  });
});
