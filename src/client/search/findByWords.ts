import type { SearchOptions } from 'minisearch';
import type { Kind, Library } from './library.ts';
import { tokens } from './tokens.ts';
import type { Target } from './vocabulary.ts';

/** Words may be begun ("planc"); a number is itself or nothing. */
const BEGUN: SearchOptions = { prefix: (term) => /^[a-z]/.test(term) };
/** Letters that may be wrong, as a part of the word. */
const MISSPELT = 0.25;

/** A description that comes close enough to the best one is offered beside it. */
const CLOSE = 0.6;

export interface Named {
  /** Positions of the things that carry the most of the words, in the order of the index. */
  readonly at: readonly number[];
  /** The words that the things are named by, as typed. */
  readonly by: readonly string[];
}

/** The things of one kind that the words name: those that carry the most of them. Empty if none carries any. */
export function namedByWords({ text }: Library, kind: Kind, words: readonly string[]): Named {
  if (words.length === 0) return { at: [], by: [] };
  const results = text.search(words.join(' '), { ...lenient(text), filter: (result) => result.kind === kind });
  const most = Math.max(0, ...results.map((result) => result.queryTerms.length));
  const best = results.filter((result) => result.queryTerms.length === most);
  const terms = new Set(best.flatMap((result) => result.queryTerms));
  return {
    at: best.map((result) => result.at as number).sort((a, b) => a - b),
    by: words.filter((word) => tokens(word).some((token) => terms.has(token.term))),
  };
}

/** Quantities, milestones and parameters whose names hold all the words, the best first. */
export function targetsByWords({ text }: Library, words: readonly string[]): Target[] {
  if (words.length === 0) return [];
  const kinds: readonly Kind[] = ['column', 'milestone', 'parameter'];
  const results = text.search(words.join(' '), {
    ...lenient(text),
    combineWith: 'AND',
    filter: (result) => kinds.includes(result.kind),
  });
  const enough = (results[0]?.score ?? 0) * CLOSE;
  return results
    .filter((result) => result.score >= enough)
    .map((result) => ({ kind: result.kind as Target['kind'], at: result.at as number }));
}

/** A word that is known nowhere, not even as a beginning, may be misspelt; "survey" is not taken for "curved". */
function lenient(text: Library['text']): SearchOptions {
  const mayBeMisspelt = (term: string): boolean =>
    /^[a-z][a-z0-9]{3,}$/.test(term) && text.search(term, BEGUN).length === 0;
  return { ...BEGUN, fuzzy: (term) => (mayBeMisspelt(term) ? MISSPELT : false) };
}
