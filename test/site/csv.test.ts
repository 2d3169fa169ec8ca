import { parse } from 'csv-parse/sync';
import { describe, expect, test } from 'vitest';
import { columnsOf, TOPICS } from '../../src/tables/columns.ts';
import { csvOf, distFiles, distText, tablePages } from './pages.ts';

const NUMBER = /^-?(?:\d+(?:\.\d+)?|\d\.\d+E[+-]?\d+)$/;

/** The records of a file, by a reader that is not ours and refuses rows of unequal length. */
function records(file: string): string[][] {
  return parse(distText(file), { relax_column_count: false, bom: false }) as string[][];
}

describe('the CSV file of every table', () => {
  const pages = tablePages();

  test('has the columns of its topic', () => {
    const wrong = pages.filter(({ path }) => {
      const topic = TOPICS.find((name) => path.includes(`.${name}.`)) ?? 'distances';
      const wanted = ['z', ...columnsOf(topic).map(({ id }) => id)];
      return records(csvOf(path))[0]?.join() !== wanted.join();
    });
    expect(wrong.map(({ path }) => path)).toEqual([]);
  });

  test('has the rows that its page shows', () => {
    const wrong = pages.filter(({ path, html }) => {
      const shown = [...html.matchAll(/<tr id="?z=([^"\s>]+)"?/g)].map((match) => match[1]);
      const written = records(csvOf(path))
        .slice(1)
        .map(([z]) => z);
      return shown.length === 0 || shown.join() !== written.join();
    });
    expect(wrong.map(({ path }) => path)).toEqual([]);
  });

  test('holds plain numbers and blanks only', () => {
    const odd = pages.flatMap(({ path }) =>
      records(csvOf(path))
        .slice(1)
        .flat()
        .filter((cell) => cell !== '' && !NUMBER.test(cell))
        .map((cell) => `${path}: ${cell}`),
    );
    expect(odd).toEqual([]);
  });
});

test('every CSV file is ASCII with LF, ends its last line, and has no empty line', () => {
  const files = distFiles('.csv');
  const odd = files.filter((file) => !/^(?:[\x20-\x7e]+\n)+$/.test(distText(file)));
  expect(files.length).toBeGreaterThan(0);
  expect(odd).toEqual([]);
});
