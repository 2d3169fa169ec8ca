import { parse } from 'csv-parse/sync';
import { describe, expect, test } from 'vitest';
import { distText, plainText, tablePages } from './pages.ts';

interface Line {
  readonly column: string;
  readonly linear_relative: string;
  readonly lagrange_relative: string;
}

/** The file of interpolation errors beside a table. */
function errorsOf(tablePage: string): readonly Line[] {
  return parse(distText(`${tablePage.replace(/\/$/, '')}.interpolation.csv`), { columns: true }) as Line[];
}

/** As pages print it, without thin spaces: 1.2×10-5. */
function printed(cell: string): string {
  return cell.replace(/E(-?\d+)$/, '×10$1');
}

describe('the interpolation errors of every table', () => {
  const pages = tablePages();

  test('stand in its colophon as in the file beside it', () => {
    const wrong = pages.flatMap(({ path, html }) => {
      const stamp = plainText(/<section class="?colophon[\s\S]*?<\/section>/.exec(html)?.[0] ?? '');
      return errorsOf(path)
        .filter((line) => line.linear_relative !== '')
        .map((line) => `${printed(line.linear_relative)}, ${printed(line.lagrange_relative)}`)
        .filter((text) => !stamp.includes(text))
        .map((text) => `${path}: ${text}`);
    });
    expect(wrong.slice(0, 10)).toEqual([]);
  });

  test('with four rows are smaller than with two where steps are small', () => {
    const survey = pages.filter(({ path }) => path.endsWith('.times.survey/'));
    expect(survey.length).toBeGreaterThan(0);
    for (const { path } of survey) {
      const age = errorsOf(path).find(({ column }) => column === 't_Gyr');
      expect(Number(age?.lagrange_relative)).toBeLessThan(0.01 * Number(age?.linear_relative));
    }
  });
});

test('the page between the rows shows the largest error over all sets for every grid', () => {
  const text = distText('interpolation/index.html');
  const table = /<table class="ledger errors"[\s\S]*?<\/table>/.exec(text)?.[0] ?? '';
  const row = (address: string) =>
    [
      ...(
        table.match(new RegExp(`<tr>(?:(?!<tr>)[\\s\\S])*?quantities/${address}/[\\s\\S]*?</tr>`))?.[0] ?? ''
      ).matchAll(/<td[^>]*>([\s\S]*?)<\/td>/g),
    ].map(([, cell = '']) => plainText(cell));
  const grids = ['reading', 'survey', 'logarithmic', 'future'];
  for (const column of ['D_L_Mpc', 't_Gyr', 'rho_c_kg_m3']) {
    const wanted = grids.flatMap((grid) => {
      const lines = tablePages()
        .filter(({ path }) => path.endsWith(`.${grid}/`))
        .flatMap(({ path }) => errorsOf(path).filter((line) => line.column === column));
      const largest = (key: 'linear_relative' | 'lagrange_relative') =>
        lines.map((line) => line[key]).reduce((a, b) => (Number(b) > Number(a) ? b : a), '');
      return [largest('linear_relative'), largest('lagrange_relative')].map(printed);
    });
    expect(row(column)).toEqual(wanted);
  }
});
