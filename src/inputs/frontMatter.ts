import type { Checked } from './types.ts';

const FENCE = /^---[ \t]*$/;

/**
 * Splits a page into its front matter, which keeps its lines' numbers, and the text below it, without blank lines at
 * its ends.
 */
export function frontMatter(file: string, text: string): Checked<{ yaml: string; body: string }> {
  const refused = (line: number, wrong: string, expected: string) => ({
    value: null,
    problems: [{ file, line, column: 1, wrong, expected }],
  });
  const lines = text.split(/\r?\n/);
  if (!FENCE.test(lines[0] ?? '')) {
    return refused(1, 'the page has no front matter', 'a first line ---');
  }
  const end = lines.findIndex((line, index) => index > 0 && FENCE.test(line));
  if (end === -1) {
    return refused(1, 'the front matter does not end', 'a second line ---');
  }
  const body = lines
    .slice(end + 1)
    .join('\n')
    .trim();
  if (body === '') {
    return refused(end + 1, 'the page has no text', 'text after this line');
  }
  // An empty line in place of the fence, so that every line keeps its number.
  return { value: { yaml: ['', ...lines.slice(1, end)].join('\n'), body }, problems: [] };
}
