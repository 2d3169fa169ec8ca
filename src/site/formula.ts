import katex from 'katex';
import { polishMathml } from './polishMathml.ts';

/** A formula stands in a line of text, or in a line of its own. */
export type FormulaStyle = 'inline' | 'display';

/** A formula that cannot be printed: says where it stands, the formula, and what is wrong with it. */
export class FormulaError extends Error {
  constructor(where: string, latex: string, wrong: string) {
    super(`${where}: the formula ${latex} cannot be printed: ${wrong}`);
    this.name = 'FormulaError';
  }
}

const rendered = new Map<string, string>();

/**
 * LaTeX as a MathML `math` element, which needs neither script nor style of its own.
 *
 * @param latex ASCII, without the dollar signs
 * @param style `display` sets large operators and full fractions
 * @param where file and place of the formula, named if it fails
 * @throws FormulaError on LaTeX that is wrong, not ASCII, or that browsers would not draw as written
 */
export function renderFormula(latex: string, style: FormulaStyle, where: string): string {
  const key = `${style} ${latex}`;
  const known = rendered.get(key);
  if (known !== undefined) return known;
  const html = polishMathml(checked(latex, typeset(latex, style, where), where));
  rendered.set(key, html);
  return html;
}

function typeset(latex: string, style: FormulaStyle, where: string): string {
  const strange = latex.match(/[^\x20-\x7e\n]/u)?.[0];
  if (strange !== undefined) throw new FormulaError(where, latex, `"${strange}" is not ASCII; write it as a command`);
  try {
    return katex.renderToString(latex, {
      displayMode: style === 'display',
      output: 'mathml',
      throwOnError: true,
      strict: 'error',
      trust: false,
    });
  } catch (error) {
    if (!(error instanceof katex.ParseError)) throw error;
    throw new FormulaError(where, latex, error.message.replace(/^KaTeX parse error: /, ''));
  }
}

/** Refuses what the typesetter lets pass: commands it prints in red, and alphabets that browsers draw as plain italic. */
function checked(latex: string, html: string, where: string): string {
  if (/#cc0000|katex-error/.test(html)) throw new FormulaError(where, latex, 'it holds a command that is not allowed');
  const alphabet = html.match(/mathvariant="(?!normal")([^"]*)"/)?.[1];
  if (alphabet) throw new FormulaError(where, latex, `browsers do not draw the ${alphabet} alphabet; use \\mathrm`);
  return html;
}
