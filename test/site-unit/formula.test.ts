import { describe, expect, test } from 'vitest';
import { renderFormula } from '../../src/site/formula.ts';

const inline = (latex: string) => renderFormula(latex, 'inline', 'a.md');

describe('renderFormula', () => {
  test('writes a bare math element with its LaTeX as annotation', () => {
    expect(inline('D_L')).toBe(
      '<math xmlns="http://www.w3.org/1998/Math/MathML"><semantics><mrow><msub><mi>D</mi><mi>L</mi></msub></mrow>' +
        '<annotation encoding="application/x-tex">D_L</annotation></semantics></math>',
    );
  });

  test('marks a display formula as a block', () => {
    expect(renderFormula('\\int_0^z x', 'display', 'a.md')).toContain('display="block"');
    expect(inline('\\int_0^z x')).not.toContain('display="block"');
  });

  test('writes the bars of an absolute value as fences, not as relations', () => {
    const html = inline('\\left| x \\right| + |y|');
    expect(html).not.toContain('\u2223');
    expect(html.match(/>\|</g)).toHaveLength(4);
  });

  test.each(['w = -1', 'w \\ge -1', 'z \\to -1', '(-1)', '\\left( -x \\right)', '[a, -b]', 'x < +1'])(
    'writes the sign of %s as a sign',
    (latex) => expect(inline(latex)).toContain('<mo form="prefix">'),
  );

  test.each(['a - b', '(a) - b', 'x^2 + y', '-x', '10^{-4}'])('leaves the sign of %s to the browser', (latex) => {
    expect(inline(latex)).not.toContain('form=');
  });

  test.each([
    ['\\kappa \\sinh(x)', 1],
    ['\\mathrm{d} \\ln a', 2],
    ['5 \\log_{10} x', 2],
    ['\\log_{10}(x)', 0],
    ['2x - \\sin(x)', 0],
    ['\\exp \\left( x \\right)', 0],
    ['\\left| \\sin(x) \\right|', 0],
    ['a \\, b', 1],
  ])('sets %s with %i thin spaces', (latex, count) => {
    expect(inline(latex).match(/<mspace width="0.1667em"/g) ?? []).toHaveLength(count);
  });

  test('needs no style attribute and no error colour', () => {
    const html = inline('\\frac{c}{H_0} \\sqrt{\\frac{a}{b}} \\quad \\mathrm{d}z \\left( 1 \\right)');
    expect(html).not.toMatch(/style=|#cc0000|class=/);
  });

  test.each([
    [
      '\\nosuch x',
      'a.md: the formula \\nosuch x cannot be printed: Undefined control sequence: \\nosuch at position 1',
    ],
    ['\\frac{1}{', 'a.md: the formula \\frac{1}{ cannot be printed: Unexpected end of input in a macro argument'],
    [
      '\\Omega_\u03b3',
      'a.md: the formula \\Omega_\u03b3 cannot be printed: "\u03b3" is not ASCII; write it as a command',
    ],
    ['10^\u2212', 'a.md: the formula 10^\u2212 cannot be printed: "\u2212" is not ASCII; write it as a command'],
    ['\\href{https://lanternfell.example}{x}', 'it holds a command that is not allowed'],
    ['\\mathbf{x}', 'browsers do not draw the bold alphabet; use \\mathrm'],
  ])('refuses %s, naming the file', (latex, message) => {
    expect(() => inline(latex)).toThrow(message);
    expect(() => inline(latex)).toThrow('a.md');
  });

  test('a second place with the same broken formula is named in its own right', () => {
    expect(() => renderFormula('\\nosuch', 'inline', 'a.md')).toThrow('a.md');
    expect(() => renderFormula('\\nosuch', 'inline', 'b.md')).toThrow('b.md');
  });
});
