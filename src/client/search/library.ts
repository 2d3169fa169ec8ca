import MiniSearch from 'minisearch';
import type { SearchIndex } from '../../site/searchIndexTypes.ts';
import type { Grid } from './bestGrid.ts';
import { type Reader, reader } from './query.ts';
import { tokens } from './tokens.ts';

/** Everything that can be found by words. */
export type Kind = 'set' | 'grid' | 'topic' | 'column' | 'milestone' | 'parameter';

interface Entry {
  readonly id: string;
  readonly kind: Kind;
  /** Position in the list of its kind. */
  readonly at: number;
  readonly name: string;
  readonly also: string;
}

/** The index, ready to be searched. */
export interface Library {
  readonly index: SearchIndex;
  readonly reader: Reader;
  /** In the order of `index.grids`. */
  readonly grids: readonly Grid[];
  readonly topics: readonly string[];
  readonly text: MiniSearch<Entry>;
}

export function openLibrary(index: SearchIndex): Library {
  const topics = [...new Set(index.editions.flatMap((edition) => edition.topics))];
  const text = new MiniSearch<Entry>({
    fields: ['name', 'also'],
    storeFields: ['kind', 'at'],
    tokenize: (string) => tokens(string).map((token) => token.term),
    processTerm: (term) => term,
    searchOptions: { boost: { name: 2 } },
  });
  text.addAll(entries(index, topics));
  return { index, reader: reader(index), grids: index.grids.map(asGrid), topics, text };
}

function asGrid({ id, title, redshifts }: SearchIndex['grids'][number]): Grid {
  const written = redshifts.split(' ');
  return { id, title, redshifts: written, numbers: written.map(Number) };
}

function entries(index: SearchIndex, topics: readonly string[]): Entry[] {
  const list: Entry[] = [];
  const add = (kind: Kind, at: number, name: string, also: readonly string[]): void => {
    list.push({ id: `${kind} ${at}`, kind, at, name, also: also.join(' ') });
  };
  index.sets.forEach(({ title, id, kind }, at) => {
    add('set', at, title, [id, kind]);
  });
  index.grids.forEach(({ title, id }, at) => {
    add('grid', at, title, [id]);
  });
  topics.forEach((topic, at) => {
    add('topic', at, topic, []);
  });
  index.columns.forEach(({ title, also }, at) => {
    add('column', at, title, also);
  });
  index.milestones.forEach(({ title, also }, at) => {
    add('milestone', at, title, also);
  });
  index.parameters.forEach(({ title, also }, at) => {
    add('parameter', at, title, also);
  });
  return list;
}
