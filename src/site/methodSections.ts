import { CONSTANTS } from '../cosmology/constants.ts';
import type { ParameterSet } from '../inputs/types.ts';
import { address } from './addresses.ts';
import { renderFormula } from './formula.ts';
import { renderMarkdown } from './markdown.ts';
import { MODEL_TEXT } from './methods/modelText.ts';
import { NUMBERS_TEXT } from './methods/numbersText.ts';
import { READING_TEXT } from './methods/readingText.ts';
import type { MethodText } from './methods/section.ts';
import { uncertaintyText } from './methods/uncertaintyText.ts';
import { quantityLink } from './quantityLink.ts';
import { unitHtml } from './unitText.ts';
import { writtenNumber } from './writtenNumber.ts';

/** One section of the methods page. */
export interface MethodSection {
  /** Anchor on the page. */
  readonly id: string;
  readonly title: string;
  readonly html: string;
  /** Only in the section of the constants. Symbol, value and unit are HTML. */
  readonly constants?: readonly ConstantLine[];
}

export interface ConstantLine {
  readonly symbol: string;
  readonly name: string;
  readonly value: string;
  readonly unit: string;
  readonly source: string;
}

/** The sections of the methods page, in order. The uncertainties of `sets` stand beside published ones. */
export function methodSections(sets: readonly ParameterSet[]): readonly MethodSection[] {
  return [...MODEL_TEXT, ...NUMBERS_TEXT, ...uncertaintyText(sets), ...READING_TEXT].map(section);
}

function section({ id, title, body, lists }: MethodText): MethodSection {
  const html = renderMarkdown(body, { where: `src/site/methods, section ${id}`, link: methodLink });
  return { id, title, html, ...(lists === 'constants' ? { constants: constantLines() } : {}) };
}

/** A column, or one of the pages that go with the methods. */
function methodLink(target: string): string | undefined {
  if (target === 'checked-against') return address.checkedAgainst();
  return target === 'interpolation' ? address.interpolation() : quantityLink(target);
}

function constantLines(): readonly ConstantLine[] {
  return CONSTANTS.map(({ symbol, name, value, unit, source }) => ({
    symbol: renderFormula(symbol, 'inline', 'src/cosmology/constants.ts'),
    name,
    value: writtenNumber(value),
    unit: unitHtml(unit),
    source,
  }));
}
