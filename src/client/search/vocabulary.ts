import type { SearchIndex } from '../../site/searchIndexTypes.ts';
import { STOP_WORDS } from './stopWords.ts';
import { type Token, tokens } from './tokens.ts';

/** What a name stands for. */
export interface Target {
  readonly kind: 'column' | 'milestone' | 'parameter';
  /** Position in the index. */
  readonly at: number;
}

/** Every name by which something can be asked for. */
export interface Vocabulary {
  /** From the key of a name, see `keyOf`. */
  readonly names: ReadonlyMap<string, readonly Called[]>;
  /** The largest number of words in a name. */
  readonly longest: number;
}

/** A thing, and the symbols with one key by which it goes: "D_M" and "DM" are different things. */
export interface Called {
  readonly target: Target;
  readonly symbols: Set<string>;
}

/** Terms run together: "D_L", "d l" and "DL" have one key, and so have "age of the universe" and "age universe". */
export function keyOf(terms: readonly string[]): string {
  return terms.filter((term) => !STOP_WORDS.has(term)).join('');
}

export function vocabulary(index: SearchIndex): Vocabulary {
  const names = new Map<string, Called[]>();
  let longest = 1;
  const add = (name: string, { kind, at }: Target): void => {
    const words = tokens(name);
    const key = keyOf(words.map(({ term }) => term));
    if (key === '') return;
    const called = names.get(key) ?? [];
    const known = called.find(({ target }) => target.kind === kind && target.at === at);
    if (known) known.symbols.add(symbolOf(words));
    else names.set(key, [...called, { target: { kind, at }, symbols: new Set([symbolOf(words)]) }]);
    longest = Math.max(longest, words.length);
  };
  const addAll = (kind: Target['kind'], things: readonly { title: string; also: readonly string[] }[]): void => {
    things.forEach((thing, at) => {
      for (const name of [thing.title, ...thing.also]) add(name, { kind, at });
    });
  };
  addAll('column', index.columns);
  addAll('milestone', index.milestones);
  addAll('parameter', index.parameters);
  return { names, longest };
}

/**
 * The things called so. Where a symbol was typed to the letter, others of the same kind that share only its key are left
 * out.
 */
export function targetsOf(called: readonly Called[], typed: readonly Token[]): Target[] {
  const symbol = symbolOf(typed);
  const isMeant = ({ symbols }: Called): boolean => symbol !== '' && symbols.has(symbol);
  return called
    .filter((one) => isMeant(one) || !called.some((other) => isMeant(other) && other.target.kind === one.target.kind))
    .map(({ target }) => target);
}

/** A single word that is written as symbols are, "D_M", "DM", "t"; "" for ordinary words. */
function symbolOf(words: readonly Token[]): string {
  const [first, ...more] = words;
  const isSymbol = first !== undefined && more.length === 0 && /^.$|_|^.+[A-Z]/.test(first.written);
  return isSymbol ? first.written : '';
}
