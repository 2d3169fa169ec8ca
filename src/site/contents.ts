import type { Topic } from '../inputs/types.ts';
import type { EditionTables } from '../tables/types.ts';
import { address } from './addresses.ts';
import { setsOf, tablesOf } from './lookUp.ts';
import { setTitle } from './setTitle.ts';
import { TOPIC_TEXT } from './topicText.ts';

/** The tables of one set and topic. */
export interface ContentsLine {
  readonly topic: Topic;
  readonly name: string;
  readonly holds: string;
  readonly tables: readonly {
    readonly grid: string;
    readonly gridTitle: string;
    readonly rows: number;
    readonly address: string;
  }[];
}

/** One parameter set as a chapter in the table of contents. */
export interface Chapter {
  readonly id: string;
  readonly title: string;
  readonly address: string;
  readonly lines: readonly ContentsLine[];
}

/** The tables of an edition as a book lists them: sets as chapters, topics as lines. */
export function contents(pressed: EditionTables): Chapter[] {
  return setsOf(pressed).map((set) => ({
    id: set.id,
    title: setTitle(set),
    address: address.set(pressed.edition.number, set.id),
    lines: contentsLines(pressed, set.id),
  }));
}

export function contentsLines(pressed: EditionTables, set: string): ContentsLine[] {
  const { number, topics } = pressed.edition;
  return topics.map((topic) => ({
    topic,
    ...TOPIC_TEXT[topic],
    tables: tablesOf(pressed, set, topic).map(({ id, grid }) => ({
      grid: grid.id,
      gridTitle: grid.title,
      rows: grid.redshifts.length,
      address: address.table(number, id),
    })),
  }));
}
