import type { EditionTables, Table } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { setTitle } from '../setTitle.ts';
import { TOPIC_TEXT } from '../topicText.ts';

/** A table one can turn to from another. */
export interface Leaf {
  readonly text: string;
  readonly address: string;
  readonly here: boolean;
}

/** Tables that differ from one table in one respect. */
export interface TurnTo {
  readonly topics: readonly Leaf[];
  readonly grids: readonly Leaf[];
  readonly sets: readonly Leaf[];
  /** Neighbours in the order of the edition. */
  readonly before: Leaf | undefined;
  readonly after: Leaf | undefined;
}

export function turnTo({ edition, tables }: EditionTables, table: Table): TurnTo {
  const leaf = (other: Table, text: string): Leaf => ({
    text,
    address: address.table(edition.number, other.id),
    here: other.id === table.id,
  });
  const sameSet = (other: Table) => other.set.id === table.set.id;
  const sameTopic = (other: Table) => other.topic === table.topic;
  const sameGrid = (other: Table) => other.grid.id === table.grid.id;
  const at = tables.findIndex(({ id }) => id === table.id);
  const neighbour = (other: Table | undefined) => other && leaf(other, neighbourText(table, other));
  return {
    topics: tables
      .filter((other) => sameSet(other) && sameGrid(other))
      .map((other) => leaf(other, TOPIC_TEXT[other.topic].name)),
    grids: tables.filter((other) => sameSet(other) && sameTopic(other)).map((other) => leaf(other, other.grid.title)),
    sets: tables
      .filter((other) => sameTopic(other) && sameGrid(other))
      .map((other) => leaf(other, setTitle(other.set))),
    before: neighbour(tables[at - 1]),
    after: neighbour(tables[at + 1]),
  };
}

/** Names a neighbour by what is different about it. */
function neighbourText(table: Table, other: Table): string {
  const parts = [TOPIC_TEXT[other.topic].name, other.grid.title];
  return (other.set.id === table.set.id ? parts : [setTitle(other.set), ...parts]).join(', ');
}
