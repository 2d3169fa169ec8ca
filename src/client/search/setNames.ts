import type { SearchIndex } from '../../site/searchIndexTypes.ts';
import { type Token, tokens } from './tokens.ts';
import { keyOf, type Vocabulary } from './vocabulary.ts';

/** Numbers that belong to the names of parameter sets ("planck 2018", "0.3/0.7/70") and so are no redshifts. */
export interface SetNames {
  readonly years: ReadonlySet<string>;
  /** A word and the number behind it, parted by a space. */
  readonly pairs: ReadonlySet<string>;
  /** The numbers of each name. */
  readonly numbers: readonly ReadonlySet<string>[];
}

export function setNames(index: SearchIndex, { names }: Vocabulary): SetNames {
  const lists = index.sets.flatMap(({ title, id }) => [tokens(title), tokens(id)]);
  const pairs = lists.flatMap((list) =>
    list.flatMap((word, n) => {
      const next = list[n + 1];
      // "H0 70" asks for a value of H0, even where a set is called so.
      const isPair = word.value === undefined && next?.value !== undefined && !names.has(keyOf([word.term]));
      return isPair ? [`${word.term} ${next.term}`] : [];
    }),
  );
  const numbers = lists.map((list) => list.filter(({ value }) => value !== undefined));
  return {
    years: new Set(
      numbers
        .flat()
        .filter(isYear)
        .map(({ term }) => term),
    ),
    pairs: new Set(pairs),
    numbers: numbers.map((list) => new Set(list.map(({ term }) => term))),
  };
}

/** Whether the number at this position is part of a set's name: a year, or beside a word or number as in the name. */
export function belongsToName({ years, pairs, numbers }: SetNames, list: readonly Token[], n: number): boolean {
  const { term } = list[n] as Token;
  const beside = [list[n - 1], list[n + 1]].flatMap((other) => (other?.value === undefined ? [] : [other.term]));
  return (
    years.has(term) ||
    pairs.has(`${list[n - 1]?.term} ${term}`) ||
    numbers.some((set) => set.has(term) && beside.some((other) => set.has(other)))
  );
}

function isYear({ value }: Token): boolean {
  return value !== undefined && Number.isInteger(value) && value >= 1900 && value < 2100;
}
