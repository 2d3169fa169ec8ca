import type { BrowserContext, Page } from 'playwright-core';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { newContext, site } from './harness.ts';
import { tablePages } from './pages.ts';

let context: BrowserContext;
let page: Page;
let complaints: string[];

/** A table of distances whose redshifts rise by 0.01, so 0.50 is a row and 0.505 is none. */
const path =
  tablePages().find(({ path, html }) => path.includes('.distances.') && html.includes('id="z=0.51"'))?.path ?? '';

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

/** Waits longer than vitest does by itself, because a busy machine draws a long table slowly. */
const eventually = <T>(get: () => Promise<T>) => expect.poll(get, { timeout: 20_000 });
const open = (rest = '') => page.goto(site.address + path + rest);
const rows = () => page.locator('#numbers tbody tr:visible');
const asked = () => page.locator('#numbers tr.asked');
const said = () => page.locator('.tools .said');
const count = () => page.locator('.tools .count');
const inSight = (id: string) =>
  page.locator(`[id="${id}"]`).evaluate((row) => {
    const { top, bottom } = row.getBoundingClientRect();
    return top >= 0 && bottom <= innerHeight;
  });

async function goTo(redshift: string): Promise<void> {
  await page.getByLabel('Go to z =').fill(redshift);
  await page.keyboard.press('Enter');
}

/** A function, because the site's content security policy forbids what Playwright's own waiting would evaluate. */
const focusedRow = () => page.evaluate(() => document.activeElement?.closest('tr')?.id);

async function askedRows(): Promise<string[]> {
  await asked().first().waitFor();
  return asked().evaluateAll((all) => all.map((row) => row.id));
}

test.each(['0.5', '0,50', 'z=0.5'])(
  'going to %j marks the row 0.50, brings it into sight and focuses it',
  async (typed) => {
    await open();
    await goTo(typed);
    expect(await askedRows()).toEqual(['z=0.50']);
    await eventually(focusedRow).toBe('z=0.50');
    await eventually(() => inSight('z=0.50')).toBe(true);
    expect(new URL(page.url()).hash).toBe('#z=0.50');
  },
);

test('going to a redshift between two rows marks both and names them', async () => {
  await open();
  await goTo('0.505');
  expect(await askedRows()).toEqual(['z=0.50', 'z=0.51']);
  expect(await said().textContent()).toBe('0.505 is not on this grid; nearest 0.50 and 0.51.');
  await said().getByRole('link', { name: '0.51' }).click();
  await eventually(() => askedRows()).toEqual(['z=0.51']);
});

test.each([
  ['12345678', /^12345678 lies outside this grid; the nearest row is \d+(\.\d+)?\.$/],
  ['half', /^“half” is not a redshift\.$/],
  ['', /^Write a redshift, such as 0\.5\.$/],
])('going to %j says why not', async (typed, message) => {
  await open();
  await goTo(typed);
  await eventually(() => said().textContent()).toMatch(message);
});

test('an address is met as a number: #z=0.5 is the row 0.50', async () => {
  await open('#z=0.5');
  expect(await askedRows()).toEqual(['z=0.50']);
  await eventually(() => inSight('z=0.50')).toBe(true);
});

test('a range hides the other rows, says how many are left, and stands in the address', async () => {
  await open();
  const all = await rows().count();
  await page.getByLabel('Rows from z =').fill('0.495');
  await page.getByLabel('to', { exact: true }).fill('0.6');
  await page.keyboard.press('Enter');
  await eventually(() => rows().count()).toBe(11);
  expect(await count().textContent()).toBe(`11 of ${all} rows, z from 0.50 to 0.60`);
  expect(new URL(page.url()).search).toBe('?from=0.495&to=0.6');
  expect(await page.locator('#numbers tbody:visible').count()).toBeLessThan(5);
});

test('a range that runs backwards is said to, and the rows stay', async () => {
  await open('?from=1');
  await count().filter({ hasText: ' of ' }).waitFor();
  const before = await rows().count();
  await page.getByLabel('to', { exact: true }).fill('0.5');
  await page.keyboard.press('Enter');
  await eventually(() => count().textContent()).toBe('From 1 to 0.5 runs backwards.');
  expect(await rows().count()).toBe(before);
});

test('columns can be taken away, all but one, and stand in the address', async () => {
  await open();
  await page.getByText('Columns', { exact: true }).click();
  const boxes = page.locator('.tools .columns').getByRole('checkbox');
  const columns = await boxes.count();
  for (let n = 0; n < columns - 1; n++) await boxes.nth(n).uncheck();
  expect(await page.locator('#numbers thead th:visible').count()).toBe(2);
  expect(await page.locator('#numbers tbody tr').first().locator('td:visible').count()).toBe(1);
  expect(await boxes.nth(columns - 1).isDisabled()).toBe(true);
  const last = await page.locator('#numbers thead th').last().getAttribute('data-column');
  expect(new URL(page.url()).search).toBe(`?columns=${last}`);
});

test('a view that was sent is shown, and the whole table is one button away', async () => {
  await open('?from=1&to=1.1&columns=D_L_Mpc,mu_mag#z=1.05');
  await eventually(() => rows().count()).toBe(11);
  const heads = page.locator('#numbers thead th:visible');
  expect(await heads.evaluateAll((all) => all.map((head) => head.getAttribute('data-column')))).toEqual([
    'z',
    'D_L_Mpc',
    'mu_mag',
  ]);
  expect(await askedRows()).toEqual(['z=1.05']);
  await page.getByRole('button', { name: 'Whole table' }).click();
  await eventually(() => rows().count()).toBeGreaterThan(11);
  expect(await heads.count()).toBeGreaterThan(3);
  expect(new URL(page.url()).search).toBe('');
});

test('going to a row outside the range shows the whole range again', async () => {
  await open('?from=1&to=1.1');
  await goTo('0.5');
  expect(await askedRows()).toEqual(['z=0.50']);
  expect(await asked().isVisible()).toBe(true);
  expect(new URL(page.url()).search).toBe('');
});

test('the ruler follows the pointer, and by the arrows the focus, over hidden rows too', async () => {
  await open('?from=0.5');
  await page.locator('[id="z=0.52"]').hover();
  expect(await page.locator('tr.ruled').evaluateAll((all) => all.map((row) => row.id))).toEqual(['z=0.52']);
  await goTo('0.51');
  await eventually(focusedRow).toBe('z=0.51');
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('ArrowUp');
  expect(await page.locator('tr.ruled').evaluateAll((all) => all.map((row) => row.id))).toEqual(['z=0.52']);
  await page.keyboard.press('ArrowUp');
  await page.keyboard.press('ArrowUp');
  await page.keyboard.press('ArrowUp');
  await eventually(focusedRow).toBe('z=0.50');
});

test('one row at a time can be reached by the Tab key', async () => {
  await open();
  expect(await page.locator('#numbers tbody [tabindex="0"]').count()).toBe(1);
  await goTo('0.5');
  await asked().waitFor();
  expect(
    await page.locator('#numbers tbody [tabindex="0"]').evaluateAll((all) => all.map((cell) => cell.parentElement?.id)),
  ).toEqual(['z=0.50']);
});

test('the thumb index leads to rows and shows where one is', async () => {
  await open();
  const thumb = page.locator('.thumbs a').nth(5);
  await thumb.click();
  await eventually(() => page.locator('.thumbs a[data-here]').count()).toBe(1);
  const target = (await thumb.getAttribute('href'))?.slice(1) ?? '';
  expect(await askedRows()).toEqual([target]);
  await eventually(() => inSight(target)).toBe(true);
});

test('on a phone everything that is touched is 44 pixels high', async () => {
  const phone = await newContext({ viewport: { width: 390, height: 800 }, hasTouch: true, isMobile: true });
  const sheet = await phone.newPage();
  await sheet.goto(site.address + path);
  await sheet.getByText('Columns', { exact: true }).tap();
  const parts = sheet
    .locator('.tools')
    .locator('input[type="text"], button:visible, summary, label:has([type="checkbox"])');
  const heights = await parts.evaluateAll((all) => all.map((part) => part.getBoundingClientRect().height));
  expect(heights.length).toBeGreaterThan(8);
  expect(Math.min(...heights)).toBeGreaterThanOrEqual(44);
  await phone.close();
});
