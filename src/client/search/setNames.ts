import type { SearchIndex } from '../../site/searchIndexTypes.ts';
import { type Token, tokens } from './tokens.ts';

/** Numbers that belong to the names of parameter sets ("planck 2018", "0.3/0.7/70") and so are no redshifts. */
export interface SetNames {
  readonly years: ReadonlySet<string>;
  /** Two neighbouring terms, parted by a space, at least one of them a number. */
  readonly pairs: ReadonlySet<string>;
}

export function setNames(index: SearchIndex): SetNames {
  const years = new Set<string>();
  const pairs = new Set<string>();
  for (const set of index.sets) {
    for (const name of [set.title, set.id]) {
      const words = tokens(name);
      words.forEach((word, n) => {
        if (isYear(word)) years.add(word.term);
        const next = words[n + 1];
        if (next && (word.value ?? next.value) !== undefined) pairs.add(`${word.term} ${next.term}`);
      });
    }
  }
  return { years, pairs };
}

/** Whether the number at this position is part of a set's name. */
export function belongsToName(names: SetNames, words: readonly Token[], n: number): boolean {
  const term = (words[n] as Token).term;
  if (names.years.has(term)) return true;
  return names.pairs.has(`${words[n - 1]?.term} ${term}`) || names.pairs.has(`${term} ${words[n + 1]?.term}`);
}

function isYear(word: Token): boolean {
  return word.value !== undefined && Number.isInteger(word.value) && word.value >= 1900 && word.value < 2100;
}
