import type { EditionTables, MilestoneTable, Table } from '../tables/types.ts';
import { address } from './addresses.ts';
import { setTitle } from './setTitle.ts';
import { TOPIC_TEXT } from './topicText.ts';

/** All tables of one parameter set. */
export interface SetTables {
  readonly title: string;
  readonly address: string;
  readonly topics: readonly { readonly name: string; readonly tables: readonly Link[] }[];
}

interface Link {
  /** The grid. */
  readonly text: string;
  readonly address: string;
}

/** Every table of an edition, by set and topic, so that each can be reached without a search. */
export function allTables({ edition, tables, milestones }: EditionTables): SetTables[] {
  const linkTo = ({ id, grid }: Table): Link => ({ text: grid.title, address: address.table(edition.number, id) });
  const ofSet = ({ set }: MilestoneTable): SetTables => ({
    title: setTitle(set),
    address: address.set(edition.number, set.id),
    topics: edition.topics.map((topic) => ({
      name: TOPIC_TEXT[topic].name,
      tables: tables.filter((table) => table.set.id === set.id && table.topic === topic).map(linkTo),
    })),
  });
  return milestones.map(ofSet);
}
