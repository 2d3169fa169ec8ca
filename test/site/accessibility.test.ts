import { AxeBuilder } from '@axe-core/playwright';
import type { BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { newContext, site } from './harness.ts';
import { samplePages } from './pages.ts';

const VIEWS = [
  { colorScheme: 'light', width: 1280 },
  { colorScheme: 'light', width: 390 },
  { colorScheme: 'dark', width: 390 },
  { colorScheme: 'dark', width: 1280 },
] as const;

let context: BrowserContext;
let page: Page;

beforeAll(async () => {
  context = await newContext({ reducedMotion: 'reduce' });
  page = await context.newPage();
});
afterAll(() => context.close());

describe.each(VIEWS)('in $colorScheme colours, $width pixels wide', ({ colorScheme, width }) => {
  test.each(samplePages())('%j has no accessibility violation', async (path) => {
    await page.emulateMedia({ colorScheme });
    await page.setViewportSize({ width, height: 800 });
    await page.goto(site.address + path);
    // Legacy mode only gives up frames of other origins, and this site has no frames.
    const { violations } = await new AxeBuilder({ page }).setLegacyMode().analyze();
    expect(violations.flatMap(({ id, nodes }) => nodes.map(({ html }) => `${id}: ${html}`))).toEqual([]);
  });
});
