import { parse } from 'csv-parse/sync';
import type { BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { newContext, site } from './harness.ts';
import { csvOf, distText, samplePages, TEMPLATES } from './pages.ts';

let context: BrowserContext;
let page: Page;

beforeAll(async () => {
  context = await newContext({ javaScriptEnabled: false });
  page = await context.newPage();
});
afterAll(() => context.close());

test.each(samplePages())('%j shows its heading and text without JavaScript', async (path) => {
  await page.goto(site.address + path);
  expect(await page.locator('h1:visible').count()).toBe(1);
  // biome-ignore lint/performance/useDomNodeTextContent: only text that is shown counts.
  expect((await page.locator('main').innerText()).length).toBeGreaterThan(40);
});

test.each(samplePages().filter((path) => TEMPLATES.table.test(path)))(
  '%s shows all rows without JavaScript',
  async (path) => {
    await page.goto(site.address + path);
    const rows = parse(distText(csvOf(path))).length - 1;
    expect(await page.locator('table tbody tr:visible').count()).toBe(rows);
  },
);
