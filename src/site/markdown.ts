import { Marked, type TokenizerAndRendererExtension, type Tokens } from 'marked';
import { displayFormula } from './displayFormula.ts';
import { renderFormula } from './formula.ts';
import { typographic } from './typographic.ts';

export interface MarkdownOptions {
  /** The file of the text, named if something in it cannot be printed. */
  readonly where: string;
  /** The address behind a link target such as a column id; undefined if there is no such page. */
  readonly link: (target: string) => string | undefined;
}

/**
 * The prose of a quantity or a method as HTML: paragraphs, lists, tables, emphasis, code and links, with $inline$ and
 * $$display$$ formulas. Raw HTML, pictures and headings are refused: the page sets the headings.
 *
 * @throws Error naming the file and what in it cannot be printed
 */
export function renderMarkdown(text: string, { where, link }: MarkdownOptions): string {
  const refuse = (what: string): never => {
    throw new Error(`${where}: ${what}`);
  };
  const marked = new Marked({
    extensions: [displayExtension(where), inlineExtension(where)],
    renderer: {
      html: ({ text: html }) => refuse(`HTML is not allowed here: ${html.trim()}`),
      image: ({ href }) => refuse(`pictures are not allowed here: ${href}`),
      heading: ({ text: title }) => refuse(`headings are not allowed here: ${title}`),
      text(token) {
        if ('tokens' in token && token.tokens) return this.parser.parseInline(token.tokens);
        if (token.text.includes('$')) refuse(`a $ without its partner near "${token.text}"`);
        return escaped(typographic(token.text));
      },
      link({ href, tokens }) {
        const target = /^(https:\/\/|#)/.test(href) ? href : link(href);
        const text = this.parser.parseInline(tokens);
        // A formula alone is no name for a link: programs that read pages aloud may skip it.
        const name = /^<math\b(?!.*<\/math>.)/s.test(text) ? '<span class="unseen">Quantity </span>' : '';
        return `<a href="${escaped(target ?? refuse(`a link leads nowhere: ${href}`))}">${name}${text}</a>`;
      },
    },
  });
  return framed(marked.parse(text, { async: false }));
}

/** Tables in a frame that scrolls where they are too wide, and can therefore be reached by keyboard. */
function framed(html: string): string {
  return html
    .replaceAll('<table>', '<div class="sheet" role="group" aria-label="Table" tabindex="0"><table>')
    .replaceAll('</table>', '</table></div>');
}

/** Text for HTML; the tokens of the parser hold it as written. */
function escaped(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');
}

function displayExtension(where: string): TokenizerAndRendererExtension {
  return {
    name: 'displayFormula',
    level: 'block',
    start: (text) => text.match(/\$\$/)?.index,
    tokenizer: (text) => formulaToken('displayFormula', /^\$\$(?<latex>[^$]+)\$\$[ \t]*(?:\n|$)/, text),
    renderer: (token) => displayFormula((token as FormulaToken).latex, where),
  };
}

/** Browsers break a line between a formula and the punctuation after it unless the two are tied. */
function inlineExtension(where: string): TokenizerAndRendererExtension {
  return {
    name: 'inlineFormula',
    level: 'inline',
    start: (text) => text.match(/\(?\$/)?.index,
    tokenizer: (text) => formulaToken('inlineFormula', /^(?<before>\(?)\$(?<latex>[^$]+)\$(?<after>[,.;:!?)]*)/, text),
    renderer(token) {
      const { latex, before = '', after = '' } = token as FormulaToken;
      const mathml = renderFormula(latex, 'inline', where);
      return before || after ? `<span class="tied">${before}${mathml}${after}</span>` : mathml;
    },
  };
}

interface FormulaToken extends Tokens.Generic {
  latex: string;
  before?: string | undefined;
  after?: string | undefined;
}

function formulaToken(type: string, pattern: RegExp, text: string): FormulaToken | undefined {
  const match = pattern.exec(text);
  if (!match?.groups) return undefined;
  const { latex = '', before, after } = match.groups;
  return { type, raw: match[0], latex: latex.trim(), before, after };
}
