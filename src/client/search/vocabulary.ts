import type { SearchIndex } from '../../site/searchIndexTypes.ts';
import { STOP_WORDS } from './stopWords.ts';
import { tokens } from './tokens.ts';

/** What a name stands for. */
export interface Target {
  readonly kind: 'column' | 'milestone' | 'parameter';
  /** Position in the index. */
  readonly at: number;
}

/** Every name by which something can be asked for. */
export interface Vocabulary {
  /** From the key of a name, see `keyOf`. */
  readonly names: ReadonlyMap<string, readonly Target[]>;
  /** The largest number of words in a name. */
  readonly longest: number;
}

/** Terms run together: "D_L", "d l" and "DL" have one key, and so have "age of the universe" and "age universe". */
export function keyOf(terms: readonly string[]): string {
  return terms.filter((term) => !STOP_WORDS.has(term)).join('');
}

export function vocabulary(index: SearchIndex): Vocabulary {
  const names = new Map<string, Target[]>();
  let longest = 1;
  const add = (name: string, target: Target): void => {
    const terms = tokens(name).map((token) => token.term);
    const key = keyOf(terms);
    const known = names.get(key) ?? [];
    if (key === '' || known.some((other) => other.kind === target.kind && other.at === target.at)) return;
    names.set(key, [...known, target]);
    longest = Math.max(longest, terms.length);
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
