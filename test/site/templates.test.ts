import { expect, test } from 'vitest';
import { allPages, TEMPLATES } from './pages.ts';

const paths = allPages().map(({ path }) => path);

test.each(Object.entries(TEMPLATES))('the site has a page of the kind %s', (_, pattern) => {
  expect(paths.some((path) => pattern.test(path))).toBe(true);
});

test('every page is of one known kind, so that no kind escapes the checks of this folder', () => {
  const kindsOf = (path: string) => Object.values(TEMPLATES).filter((pattern) => pattern.test(path)).length;
  expect(paths.filter((path) => kindsOf(path) !== 1)).toEqual([]);
});
