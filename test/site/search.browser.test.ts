import { gzipSync } from 'node:zlib';
import type { BrowserContext, Page } from 'playwright-core';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { newContext, site } from './harness.ts';
import { distText, plainText, tablePages } from './pages.ts';

let context: BrowserContext;
let page: Page;
/** Refusals by the content security policy, and scripts that failed. */
let complaints: string[];

beforeEach(async () => {
  context = await newContext();
  page = await context.newPage();
  complaints = [];
  page.on('console', (message) => {
    if (message.type() === 'error' && !message.text().includes('favicon')) complaints.push(message.text());
  });
  page.on('pageerror', (error) => complaints.push(error.message));
});
afterEach(async () => {
  await context.close();
  expect(complaints).toEqual([]);
});

const field = () => page.getByRole('searchbox');
const results = () => page.locator('.search ol li');
const status = () => page.locator('.search [role="status"]');

/** Types a query on the home page and waits until it is answered. */
async function ask(query: string): Promise<void> {
  await page.goto(site.address);
  await field().fill(query);
  await status().filter({ hasText: /\w/ }).waitFor();
}

async function firstAddress(): Promise<string> {
  return (await results().first().locator('a').getAttribute('href')) ?? '';
}

test.each([
  ['luminosity distance 0.5 planck', /\/tables\/planck-[^/]*\.distances\.[^/]+\/#z=0\.50?$/],
  ['D_L z=0.5', /\.distances\.[^/]+\/#z=0\.50?$/],
  ['0.73', /\/tables\/[^/]+\/#z=0\.73$/],
  ['age at 2.33', /\.times\.[^/]+\/#z=2\.33$/],
  ['H0 planck', /\/sets\/planck-[^/]+\/$/],
  ['z_eq', /\/sets\/[^/]+\/#z_equality$/],
  ['when does acceleration begin', /\/sets\/[^/]+\/#[zt]_acceleration$/],
  ['critical density', /\/sets\/[^/]+\/#critical_density_SI$/],
  ['lookback time', /\/quantities\/t_L_Gyr\/$/],
])('%j leads to %s, and the place exists', async (query, expected) => {
  await ask(query);
  const address = await firstAddress();
  expect(address).toMatch(expected);
  expect(address.startsWith(site.base)).toBe(true);
  await results().first().locator('a').click();
  const anchor = address.split('#')[1];
  if (anchor) await page.locator(`[id="${anchor}"]`).waitFor();
  expect(await page.locator('h1').count()).toBe(1);
});

test('a redshift between two rows is said to be so, and both rows are offered', async () => {
  await ask('age at 2.333 planck 2018 lensing survey');
  expect(await page.locator('.search .notes').textContent()).toBe(
    '2.333 is not on “Survey grid”; nearest 2.33 and 2.34.',
  );
  const addresses = await results()
    .locator('a')
    .evaluateAll((links) => links.map((link) => link.getAttribute('href')));
  expect(addresses.slice(0, 2).map((address) => address?.split('#')[1])).toEqual(['z=2.33', 'z=2.34']);
});

test('the first result shows the value that stands in the CSV', async () => {
  await ask('luminosity distance 0.5 planck');
  const value = results().first().locator('.value').filter({ hasText: /\d/ });
  await value.waitFor();
  const [table = '', anchor = ''] = (await firstAddress()).slice(site.base.length).split('/#z=');
  const [head = '', ...lines] = distText(`${table}.csv`).split('\n');
  const cell = lines.find((line) => line.startsWith(`${anchor},`))?.split(',')[head.split(',').indexOf('D_L_Mpc')];
  expect(plainText((await value.textContent()) ?? '')).toBe(`${cell} Mpc`);
});

test('a slash leads to the field, the arrows through the results, Enter opens the first', async () => {
  await page.goto(site.address);
  await page.keyboard.press('/');
  expect(await field().evaluate((input) => input === document.activeElement)).toBe(true);
  await page.keyboard.type('D_L z=0.5 wmap');
  await results().first().waitFor();
  await page.keyboard.press('ArrowDown');
  expect(
    await results()
      .first()
      .locator('a')
      .evaluate((link) => link === document.activeElement),
  ).toBe(true);
  await page.keyboard.press('ArrowUp');
  await page.keyboard.press('Enter');
  await page.waitForURL(/wmap[^/]*\.distances\.[^/]+\/#z=0\.50$/);
});

test('a slash that is typed in a field stays there', async () => {
  await page.goto(site.address);
  await field().fill('');
  await page.keyboard.type('0.3/0.7/70');
  expect(await field().inputValue()).toBe('0.3/0.7/70');
});

test('Enter that comes before the index is loaded still opens the first result', async () => {
  await page.goto(site.address);
  await page.route('**/search-index.json', async (route) => {
    await new Promise((done) => setTimeout(done, 300));
    await route.continue();
  });
  await field().focus();
  await page.keyboard.type('0.73');
  await page.keyboard.press('Enter');
  await page.waitForURL(/#z=0\.73$/);
});

test('a value is printed with real signs, powers of ten and units', async () => {
  await ask('critical density');
  await expect
    .poll(() => results().first().locator('.value').innerHTML())
    .toMatch(/×\s10<sup>−27<\/sup> kg\/m<sup>3<\/sup>$/u);
});

test('the index is small', () => {
  expect(gzipSync(distText('search-index.json')).length).toBeLessThan(60_000);
});

test('what cannot be loaded is said, and the next key tries again', async () => {
  await page.route('**/search-index.json', (route) => route.abort());
  await ask('age');
  expect(await status().textContent()).toMatch(/could not be loaded/);
  await page.unroute('**/search-index.json');
  await field().fill('age 1');
  await results().first().waitFor();
  complaints = complaints.filter((text) => !text.includes('ERR_FAILED'));
});

test('the index is loaded when somebody turns to the search, and once', async () => {
  const loaded: string[] = [];
  page.on('request', (request) => loaded.push(request.url()));
  await page.goto(site.address);
  const indexRequests = () => loaded.filter((url) => url.endsWith('search-index.json')).length;
  expect(indexRequests()).toBe(0);
  await field().fill('age');
  await results().first().waitFor();
  await field().fill('age 1');
  await status().filter({ hasText: 'z = 1' }).waitFor();
  expect(indexRequests()).toBe(1);
});

test('a search can be sent as an address', async () => {
  await page.goto(`${site.address}search/?q=${encodeURIComponent('D_L 0.5 wmap')}`);
  await results().first().waitFor();
  expect(await field().inputValue()).toBe('D_L 0.5 wmap');
  await field().fill('age 1');
  await page.waitForURL(/\?q=age%201$/);
});

test('over a page, the results close on Escape and stay away', async () => {
  await page.goto(`${site.address}quantities/`);
  await field().fill('age');
  await results().first().waitFor();
  await page.keyboard.press('Escape');
  expect(await results().first().isVisible()).toBe(false);
});

test('without JavaScript every table can be reached from the search page', async () => {
  const plain = await newContext({ javaScriptEnabled: false });
  const sheet = await plain.newPage();
  await sheet.goto(`${site.address}search/`);
  const links = await sheet.locator('main a').evaluateAll((all) => all.map((link) => link.getAttribute('href') ?? ''));
  const [{ number }] = JSON.parse(distText('search-index.json')).editions;
  const tables = tablePages().filter(({ path }) => path.startsWith(`editions/${number}/`));
  expect(tables.length).toBeGreaterThan(0);
  expect(tables.map(({ path }) => site.base + path).filter((address) => !links.includes(address))).toEqual([]);
  expect(await sheet.locator('.search form').isVisible()).toBe(false);
  await plain.close();
});
