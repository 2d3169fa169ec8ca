import type { MilestoneName } from '../cosmology/milestones.ts';
import type { EditionState, Topic } from '../inputs/types.ts';

/** What `search-index.json` holds: names and redshifts, no table values and no addresses. */
export interface SearchIndex {
  /** The current one first. */
  readonly editions: readonly IndexedEdition[];
  /** Parameter sets as some edition has them; an edition names its own by position. */
  readonly sets: readonly IndexedSet[];
  /** Likewise redshift grids. */
  readonly grids: readonly IndexedGrid[];
  readonly columns: readonly IndexedColumn[];
  readonly milestones: readonly IndexedMilestone[];
  readonly parameters: readonly IndexedParameter[];
}

export interface IndexedEdition {
  readonly number: string;
  readonly title: string;
  readonly state: EditionState;
  /** Positions in `sets`, published ones first. */
  readonly sets: readonly number[];
  /** Positions in `grids`. */
  readonly grids: readonly number[];
  readonly topics: readonly Topic[];
  /** Ids of tables that this edition does not have although it has their set, topic and grid. */
  readonly missing: readonly string[];
}

export interface IndexedSet {
  readonly id: string;
  readonly title: string;
  readonly kind: string;
  /** Parameters as written: the value, and behind it the standard uncertainty where there is one. */
  readonly parameters: Readonly<Record<string, readonly string[]>>;
  /** Milestones that exist here, as the set's page prints them, without unit. */
  readonly milestones: Readonly<Record<string, string>>;
}

export interface IndexedGrid {
  readonly id: string;
  readonly title: string;
  /** Redshifts as written, ascending, parted by one space. */
  readonly redshifts: string;
}

interface Named {
  readonly title: string;
  /** Further names and symbols. */
  readonly also: readonly string[];
  readonly unit: string;
}

export interface IndexedColumn extends Named {
  readonly id: string;
  /** Missing for the redshift itself, which heads the rows of every table. */
  readonly topic?: Topic | undefined;
}

export interface IndexedMilestone extends Named {
  readonly id: MilestoneName;
}

export interface IndexedParameter extends Named {
  readonly id: string;
}
