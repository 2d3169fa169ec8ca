import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { expect, test } from 'vitest';
import { newContext, site } from './harness.ts';
import { tablePages } from './pages.ts';

/** Bytes of a table page with 371 rows, with styles and scripts, compressed; fonts come once for the whole site. */
const PAGE_BUDGET = 100_000;
/** Bytes of all fonts that a table page asks for. */
const FONT_BUDGET = 60_000;

const heaviest = tablePages()
  .map(({ path, html }) => ({ path, size: gzipSync(html).length }))
  .sort((a, b) => b.size - a.size)[0];

test('the heaviest table page fits its budget, and so do the fonts', async () => {
  const path = heaviest?.path ?? '';
  const context = await newContext();
  const page = await context.newPage();
  const files = new Set<string>();
  page.on('requestfinished', (request) => files.add(new URL(request.url()).pathname));
  await page.goto(site.address + path, { waitUntil: 'networkidle' });
  await context.close();
  const sizes = [...files].map((file) => ({ file, bytes: compressed(file) }));
  const isFont = ({ file }: { file: string }) => file.endsWith('.woff2');
  expect(sizes.length, 'the page, its styles and fonts').toBeGreaterThan(2);
  expect(total(sizes.filter((one) => !isFont(one))), JSON.stringify(sizes)).toBeLessThanOrEqual(PAGE_BUDGET);
  expect(total(sizes.filter(isFont)), JSON.stringify(sizes)).toBeLessThanOrEqual(FONT_BUDGET);
});

/** Fonts are compressed already. */
function compressed(pathname: string): number {
  const file = decodeURIComponent(pathname.slice(site.base.length)).replace(/(^|\/)$/, '$1index.html');
  const bytes = readFileSync(join(site.dist, file));
  return file.endsWith('.woff2') ? bytes.length : gzipSync(bytes).length;
}

function total(sizes: readonly { bytes: number }[]): number {
  return sizes.reduce((sum, { bytes }) => sum + bytes, 0);
}
