import { expect, test } from 'vitest';
import { newContext, site } from './harness.ts';
import { allPages, distFiles, distText, samplePages } from './pages.ts';

/** Links of the head that name an address without asking for it. */
const NAMING = /\brel="?(?:canonical|license|author)\b/;
const TAG = /<(?!a\b)[a-z][^>]*>/gi;
const OTHER_HOST = /\s(?:src|srcset|href|action|poster|data|ping|formaction)\s*=\s*["']?\s*(?:[a-z]+:)?\/\//i;

test('no page names a file of another host to be loaded', () => {
  const asking = allPages().flatMap(({ path, html }) =>
    (html.match(TAG) ?? []).filter((tag) => OTHER_HOST.test(tag) && !NAMING.test(tag)).map((tag) => `${path}: ${tag}`),
  );
  expect(asking).toEqual([]);
});

test('no style sheet or script names a file of another host', () => {
  const files = [...distFiles('.css'), ...distFiles('.js')];
  const asking = files.filter((file) =>
    /url\(\s*["']?(?:[a-z]+:)?\/\/|@import|import\(["']https?:|from\s*["']https?:/.test(distText(file)),
  );
  expect(files.length).toBeGreaterThan(0);
  expect(asking).toEqual([]);
});

test('a browser that visits every kind of page asks only this site', async () => {
  const { host } = new URL(site.address);
  const others: string[] = [];
  const failed: string[] = [];
  const context = await newContext();
  const page = await context.newPage();
  page.on('request', (request) => {
    const url = new URL(request.url());
    if (url.protocol !== 'data:' && url.host !== host) others.push(`${page.url()} asks ${url}`);
  });
  page.on('requestfailed', (request) => failed.push(request.url()));
  page.on('console', (message) => {
    if (message.type() === 'error' && !page.url().endsWith('/404.html'))
      failed.push(`${page.url()}: ${message.text()}`);
  });
  page.on('pageerror', (error) => failed.push(`${page.url()}: ${error.message}`));
  for (const path of samplePages()) await page.goto(site.address + path, { waitUntil: 'networkidle' });
  await context.close();
  expect(others).toEqual([]);
  expect(failed).toEqual([]);
});
