import { describe, expect, test } from 'vitest';
import { readContent } from '../../src/inputs/readContent.ts';
import type { QuantityPage } from '../../src/inputs/types.ts';
import { displayFormula } from '../../src/site/displayFormula.ts';
import { renderFormula } from '../../src/site/formula.ts';
import { renderMarkdown } from '../../src/site/markdown.ts';
import { quantityLink } from '../../src/site/quantityLink.ts';
import { columnsOf, TOPICS } from '../../src/tables/columns.ts';

const columns = ['z', ...TOPICS.flatMap((topic) => columnsOf(topic).map(({ id }) => id))];
const pages = shipped();

function shipped(): readonly QuantityPage[] {
  const result = readContent('content');
  if ('problems' in result) throw new Error(result.problems.map((p) => `${p.file}:${p.line} ${p.wrong}`).join('\n'));
  return result.content.quantities;
}

/** Everything on a page that is set from LaTeX or Markdown. */
function setPage(page: QuantityPage): string {
  const where = `content/quantities/${page.id}.md`;
  return [
    renderFormula(page.symbol, 'inline', where),
    displayFormula(page.formula, where),
    ...page.symbols.map(({ symbol }) => renderFormula(symbol, 'inline', where)),
    renderMarkdown(page.body, { where, link: quantityLink }),
  ].join('\n');
}

const words = (text: string) => text.replace(/\$\$?[^$]+\$\$?/g, 'formula').split(/\s+/).length;

describe('the quantity pages', () => {
  test('are one for each column and one for the redshift', () => {
    expect(pages.map(({ id }) => id).toSorted()).toEqual(columns.toSorted());
  });

  test.each(pages.map((page) => [page.id, page] as const))('%s can be printed', (_, page) => {
    expect(setPage(page)).toContain('<math');
    expect(JSON.stringify(page)).toMatch(/^[\x20-\x7e]*$/);
    expect(page.symbols.length).toBeGreaterThan(0);
    expect(page.alsoCalled.length).toBeGreaterThan(0);
    expect(page.definition).toMatch(/^[A-Z].*[^.]\.$/);
    expect(words(page.body)).toBeGreaterThanOrEqual(60);
    expect(words(page.body)).toBeLessThanOrEqual(180);
  });

  test('have names of their own', () => {
    expect(new Set(pages.map(({ name }) => name)).size).toBe(pages.length);
  });

  test('a broken formula is refused with its file', () => {
    const page = pages.find(({ id }) => id === 'D_L_Mpc') as QuantityPage;
    const file = 'content/quantities/D_L_Mpc.md';
    expect(() => setPage({ ...page, formula: '\\frac{1}' })).toThrow(file);
    expect(() => setPage({ ...page, symbol: 'D_' })).toThrow(file);
    expect(() => setPage({ ...page, body: `${page.body}\n\n$\\nosuch$` })).toThrow(file);
    expect(() => setPage({ ...page, body: '[elsewhere](D_X_Mpc)' })).toThrow(file);
  });
});
