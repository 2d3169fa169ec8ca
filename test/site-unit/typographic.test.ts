import { expect, test } from 'vitest';
import { typographic } from '../../src/site/typographic.ts';

test.each([
  [`a galaxy's age`, 'a galaxy\u2019s age'],
  ['("so")', '(\u201cso\u201d)'],
  ['one -- two', 'one \u2013 two'],
  ['line-of-sight', 'line-of-sight'],
])('typographic(%j)', (text, printed) => expect(typographic(text)).toBe(printed));
