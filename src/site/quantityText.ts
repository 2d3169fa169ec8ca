import type { Content, QuantityPage } from '../inputs/types.ts';
import { renderFormula } from './formula.ts';

/** The page of a column. Throws if the keeper has not written one: a column without its definition is not printed. */
export function quantityText(content: Content, column: string): QuantityPage {
  const page = content.quantities.find(({ id }) => id === column);
  if (!page) throw new Error(`content/quantities/${column}.md is missing: every column needs its definition`);
  return page;
}

/** The symbol of a column as MathML. */
export function symbolHtml(quantity: QuantityPage): string {
  return renderFormula(quantity.symbol, 'inline', `content/quantities/${quantity.id}.md`);
}
