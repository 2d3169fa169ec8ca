import { expect, test } from 'vitest';
import { allPages } from './pages.ts';

const INLINE = 'a|em|strong|b|i|cite|code|math|abbr|time|q|span';
/** A word that runs into the next element, or an element that runs into the next word. */
const JOINED = new RegExp(`[a-z,;:.)](?=<(?:${INLINE})\\b[^>]*>[A-Za-z])|</(?:${INLINE})>(?=[A-Za-z])`, 'g');

/** Headings, paragraphs, list items and captions: where prose stands. */
const PROSE = /<(p|li|dd|dt|figcaption|caption|h[1-6])\b[^>]*>([\s\S]*?)<\/\1>/g;

test('no words are joined where an element begins or ends', () => {
  const joined = allPages().flatMap(({ path, html }) =>
    [...html.matchAll(PROSE)].flatMap(([, , prose = '']) =>
      [...prose.matchAll(JOINED)].map(({ index }) => `${path}: ${prose.slice(Math.max(0, index - 30), index + 40)}`),
    ),
  );
  expect(joined.slice(0, 20)).toEqual([]);
});
