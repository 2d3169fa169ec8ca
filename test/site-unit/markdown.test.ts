import { describe, expect, test } from 'vitest';
import { renderMarkdown } from '../../src/site/markdown.ts';

const pages: Readonly<Record<string, string>> = { D_L_Mpc: '/quantities/D_L_Mpc/' };
const render = (text: string) => renderMarkdown(text, { where: 'a.md', link: (target) => pages[target] });
/** Without the formulas. */
const prose = (text: string) => render(text).replace(/<math.*?<\/math>/gs, 'M');

describe('renderMarkdown', () => {
  test('sets a display formula between two lines of a paragraph', () => {
    expect(prose('Before,\n$$a = b,$$\nafter.')).toBe(
      '<p>Before,</p>\n' +
        '<div class="formula" role="group" aria-label="Formula" tabindex="0">M</div>\n' +
        '<p>after.</p>\n',
    );
    expect(render('$$a$$')).toContain('display="block"');
  });

  test('takes a display formula of several lines', () => {
    expect(prose('$$\na\n+ b\n$$\n')).toContain('tabindex="0">M</div>');
  });

  test('ties an inline formula to the punctuation around it', () => {
    expect(prose('at $z = 0$; or ($a_1$), or $b_2$ there')).toBe(
      '<p>at <span class="tied">M;</span> or <span class="tied">(M),</span> or M there</p>\n',
    );
  });

  test('leaves underscores and stars in formulas alone', () => {
    expect(prose('$a_1$ and *so* $b_1 * c_1$')).toBe('<p>M and <em>so</em> M</p>\n');
  });

  test('prints the signs of a book', () => {
    expect(prose(`today's "true" value -- if < 1 & so`)).toBe(
      '<p>today\u2019s \u201ctrue\u201d value \u2013 if &lt; 1 &amp; so</p>\n',
    );
  });

  test('leads to the page of a quantity, to a place on the page and to other sites', () => {
    expect(prose('[a $x$](D_L_Mpc)')).toBe('<p><a href="/quantities/D_L_Mpc/">a M</a></p>\n');
    expect(prose('[a](#b) [c](https://doi.org/10.1000/1)')).toContain('href="https://doi.org/10.1000/1"');
  });

  test.each([
    ['a $x', 'a.md: a $ without its partner near "a $x"'],
    ['a $$x$$ b', 'a.md: a $ without its partner'],
    ['a <b>bold</b>', 'a.md: HTML is not allowed here: <b>'],
    ['![a](b.png)', 'a.md: pictures are not allowed here: b.png'],
    ['# A', 'a.md: headings are not allowed here: A'],
    ['[a](D_X_Mpc)', 'a.md: a link leads nowhere: D_X_Mpc'],
    ['[a](http://lanternfell.example)', 'a.md: a link leads nowhere: http://lanternfell.example'],
    ['[a](javascript:alert)', 'a.md: a link leads nowhere: javascript:alert'],
    ['$\\nosuch$', 'a.md: the formula \\nosuch cannot be printed'],
  ])('refuses %j', (text, message) => {
    expect(() => render(text)).toThrow(message);
  });
});
