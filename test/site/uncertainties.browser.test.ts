import { AxeBuilder } from '@axe-core/playwright';
import { parse } from 'csv-parse/sync';
import type { BrowserContext, Page } from 'playwright-core';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { newContext, site } from './harness.ts';
import { csvOf, distFiles, distText, plainText, tablePages } from './pages.ts';

let context: BrowserContext;
let page: Page;
let complaints: string[];

/** Table pages with a file of uncertainties, and without. */
const fileOf = (path: string) => csvOf(path).replace(/\.csv$/, '.u.csv');
const files = new Set(distFiles('.u.csv'));
const uncertain = tablePages().filter(({ path }) => files.has(fileOf(path)));
const exact = tablePages().filter(({ path }) => !files.has(fileOf(path)));
const path =
  uncertain.find(({ path, html }) => path.includes('.distances.') && html.includes('id="z=0.51"'))?.path ?? '';

beforeEach(async () => {
  context = await newContext();
  page = await context.newPage();
  complaints = [];
  page.on('console', (message) => {
    if (message.type() === 'error' && !/favicon|404/.test(message.text())) complaints.push(message.text());
  });
  page.on('pageerror', (error) => complaints.push(error.message));
});
afterEach(async () => {
  await context.close();
  expect(complaints).toEqual([]);
});

const eventually = <T>(get: () => Promise<T>) => expect.poll(get, { timeout: 20_000 });
const open = (rest = '') => page.goto(site.address + path + rest);
const box = () => page.getByRole('checkbox', { name: 'With uncertainties' });
const said = () => page.locator('.tools .shown');
const shown = () => page.locator('#numbers td small:visible');
const below = (row: string) => page.locator(`[id="z=${row}"] td small:visible`);

test('the box writes below each value its uncertainty as the file has it, and takes it away again', async () => {
  await open();
  expect(await shown().count()).toBe(0);
  await box().check();
  await eventually(() => said().textContent()).toBe('Below each value stands its standard uncertainty.');
  const [, ...records] = parse(distText(fileOf(path))) as string[][];
  const wanted = records.find(([z]) => z === '0.50')?.slice(1) ?? [];
  const texts = (await below('0.50').allTextContents()).map((text) => text.replace(/[\u2007-\u2009]/g, ''));
  expect(texts).toHaveLength(wanted.length);
  // Only a column that is printed in a power of ten writes its uncertainties otherwise than the file.
  const powers = await page
    .locator('#numbers thead th[data-power]')
    .evaluateAll((heads) => heads.map((head) => Number(head.getAttribute('data-power'))));
  const inPlain = texts.filter((_, n) => powers[n] === 0);
  expect(inPlain.length).toBeGreaterThan(5);
  expect(inPlain).toEqual(wanted.filter((_, n) => powers[n] === 0).map((u) => `±${u}`));
  expect(new URL(page.url()).search).toBe('?u=1');
  await box().uncheck();
  await eventually(() => shown().count()).toBe(0);
  expect(await said().textContent()).toBe('');
  expect(new URL(page.url()).search).toBe('');
});

test('a digit of the uncertainty stands right below the last digit in ink', async () => {
  await open('?u=1&columns=D_L_Mpc#z=0.50');
  await eventually(() => below('0.50').count()).toBe(1);
  const [ink, first] = await page.locator('[id="z=0.50"] td:visible').evaluate((cell) => {
    const edges = (node: Node | null, at: number): DOMRect => {
      const range = document.createRange();
      range.setStart(node as Node, at);
      range.setEnd(node as Node, at + 1);
      return range.getBoundingClientRect();
    };
    const text = cell.firstChild as Text;
    const last = text.data.replace(/\.$/, '').length - 1;
    const u = cell.querySelector('small')?.firstChild as Text;
    return [edges(text, last), edges(u, u.data.search(/[1-9]/))].map(({ left, top }) => ({ left, top }));
  });
  expect(Math.abs((ink?.left ?? 0) - (first?.left ?? 99))).toBeLessThan(1);
  expect(first?.top).toBeGreaterThan(ink?.top ?? 0);
});

test('an address brings uncertainties, columns, range and row together', async () => {
  await open('?from=0.4&to=0.6&columns=D_L_Mpc,mu_mag&u=1#z=0.55');
  await eventually(() => shown().count()).toBe(42);
  expect(await box().isChecked()).toBe(true);
  expect(await below('0.55').count()).toBe(2);
  await eventually(() =>
    page.locator('#numbers tr.asked').evaluate((row) => {
      const { top, bottom } = row.getBoundingClientRect();
      return top >= 0 && bottom <= innerHeight;
    }),
  ).toBe(true);
  await page.getByRole('button', { name: 'Whole table' }).click();
  await eventually(() => shown().count()).toBeGreaterThan(42);
  expect(new URL(page.url()).search).toBe('?u=1');
});

test('a file that cannot be had is said to, and the next try works', async () => {
  await page.route('**/*.u.csv', (route) => route.fulfill({ status: 404 }));
  await open('?u=1');
  await eventually(() => said().textContent()).toBe(
    'The uncertainties could not be loaded. Tick the box to try again.',
  );
  expect(await box().isChecked()).toBe(false);
  expect(new URL(page.url()).search).toBe('');
  await page.unroute('**/*.u.csv');
  await box().focus();
  await page.keyboard.press('Space');
  await eventually(() => shown().count()).toBeGreaterThan(100);
});

test('with uncertainties a page has no accessibility violation, in light and dark colours', async () => {
  const short = uncertain.find(({ path }) => path.includes('.densities.reading/'))?.path ?? '';
  await page.goto(`${site.address}${short}?u=1`);
  await eventually(() => shown().count()).toBeGreaterThan(100);
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme });
    const { violations } = await new AxeBuilder({ page }).setLegacyMode().analyze();
    expect(violations.flatMap(({ id, nodes }) => nodes.map(({ html }) => `${id}: ${html}`))).toEqual([]);
  }
});

/** Which kinds of page there are, by what they say of uncertainties. */
function kinds(pages: typeof uncertain): string[] {
  const kindOf = ({ path, html }: (typeof uncertain)[number]) =>
    Object.entries({
      numbers: /<td>[^<]*[1-9]/.test(html),
      paler: /<td>[^<]*<i>/.test(html),
      box: html.includes('name="u"'),
      budget: html.includes('id="budget"'),
      links: html.split(`${fileOf(path)}" download`).length === 3,
      exact: plainText(html).includes('The set gives no uncertainties'),
    })
      .filter(([, is]) => is)
      .map(([name]) => name)
      .join(' ');
  return [...new Set(pages.map(kindOf))].sort();
}

test('a set with uncertainties has their file linked on every page, and all else where there are numbers but 0', () => {
  expect(kinds(uncertain)).toEqual(['links', 'numbers paler box budget links']);
});

test('a set without uncertainties says so on every page, and has nothing of them', () => {
  expect(kinds(exact)).toEqual(['exact', 'numbers exact']);
});
