import type { IndexedEdition, IndexedSet } from '../../site/searchIndexTypes.ts';
import type { Grid } from './bestGrid.ts';
import { namedByWords } from './findByWords.ts';
import type { Library } from './library.ts';
import type { Query } from './query.ts';

/** Where the answers are to be looked for. */
export interface Scope {
  readonly edition: IndexedEdition;
  /** Whether there are other editions, so that a result must say which one it is from. */
  readonly several: boolean;
  /** The named sets, else all of the edition, published ones first. */
  readonly sets: readonly IndexedSet[];
  readonly grids: readonly Grid[];
  readonly topics: readonly string[];
  readonly named: { readonly sets: boolean; readonly grids: boolean; readonly topics: boolean };
  /** The words that name a set, a grid or a topic, and those that name none. */
  readonly known: readonly string[];
  readonly unknown: readonly string[];
  /** Those of the known words that name topics. */
  readonly topicWords: readonly string[];
}

/** Narrows the index to what the words of a query name. Undefined while there is no edition. */
export function scopeOf(library: Library, query: Query): Scope | undefined {
  const { index } = library;
  const edition = index.editions.find(({ number }) => number === query.edition) ?? index.editions[0];
  if (!edition) return undefined;
  const sets = narrowed(library, 'set', query.words, edition.sets);
  const grids = narrowed(library, 'grid', query.words, edition.grids);
  const allTopics = edition.topics.map((topic) => library.topics.indexOf(topic));
  const topics = narrowed(library, 'topic', query.words, allTopics);
  const known = query.words.filter((word) => [sets, grids, topics].some(({ by }) => by.includes(word)));
  return {
    edition,
    several: index.editions.length > 1,
    sets: pick(index.sets, sets.at),
    grids: pick(library.grids, grids.at),
    topics: pick(library.topics, topics.at),
    named: { sets: sets.by.length > 0, grids: grids.by.length > 0, topics: topics.by.length > 0 },
    known,
    unknown: query.words.filter((word) => !known.includes(word)),
    topicWords: topics.by,
  };
}

/** Those of the edition's things that are named, in the edition's order; all of them if none is. */
function narrowed(
  library: Library,
  kind: 'set' | 'grid' | 'topic',
  words: readonly string[],
  all: readonly number[],
): { at: readonly number[]; by: readonly string[] } {
  const named = namedByWords(library, kind, words);
  const at = all.filter((position) => named.at.includes(position));
  return at.length > 0 ? { at, by: named.by } : { at: all, by: [] };
}

function pick<T>(list: readonly T[], positions: readonly number[]): T[] {
  return positions.map((position) => list[position] as T);
}
