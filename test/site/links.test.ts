import { LinkChecker } from 'linkinator';
import { beforeAll, expect, test } from 'vitest';
import { site } from './harness.ts';
import { allPages } from './pages.ts';

let links: Awaited<ReturnType<LinkChecker['check']>>['links'];

beforeAll(async () => {
  const ours = new RegExp(`^(?!${site.address})`).source;
  ({ links } = await new LinkChecker().check({
    path: site.address,
    recurse: true,
    checkFragments: true,
    concurrency: 20,
    linksToSkip: [ours],
  }));
}, 300_000);

test('no link and no anchor of the site is broken', () => {
  const broken = links.filter(({ state }) => state === 'BROKEN');
  expect(links.length).toBeGreaterThan(0);
  expect(broken.map(({ url, parent }) => `${parent} -> ${url}`)).toEqual([]);
});

test('no link leads to this machine outside the base path', () => {
  const { origin } = new URL(site.address);
  const outside = links.filter(({ url }) => url.startsWith(origin) && !url.startsWith(site.address));
  expect(outside.map(({ url, parent }) => `${parent} -> ${url}`)).toEqual([]);
});

test('every page can be reached from the home page by links alone', () => {
  const reached = new Set(links.map(({ url }) => url.replace(/#.*$/, '')));
  const paths = allPages().map(({ path }) => path);
  expect(paths.filter((path) => path !== '404.html' && !reached.has(site.address + path))).toEqual([]);
});
