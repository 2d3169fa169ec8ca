import { renderFormula } from './formula.ts';

/**
 * A formula in a line of its own. A wide one scrolls in its box, which can therefore be reached by keyboard and has
 * a name; src/styles/formula.css goes with it.
 *
 * @throws FormulaError as `renderFormula` does
 */
export function displayFormula(latex: string, where: string): string {
  const mathml = renderFormula(latex, 'display', where);
  return `<div class="formula" role="group" aria-label="Formula" tabindex="0">${mathml}</div>\n`;
}
