import { type Browser, type BrowserContext, type BrowserContextOptions, chromium } from 'playwright-core';
import { afterAll, inject } from 'vitest';

/** The built and served site: its address, base path, folder and content. */
export const site = inject('site');

let browser: Browser | undefined;

/** A fresh browser window group; options as Playwright has them, e.g. `{ colorScheme: 'dark' }`. Close it when done. */
export async function newContext(options: BrowserContextOptions = {}): Promise<BrowserContext> {
  browser ??= await chromium.connect(site.browser);
  return browser.newContext({ baseURL: site.address, ...options });
}

afterAll(() => browser?.close());
