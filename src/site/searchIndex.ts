import type { MilestoneName } from '../cosmology/milestones.ts';
import { MILESTONE_NAMES } from '../cosmology/milestones.ts';
import type { Parameters } from '../cosmology/parameters.ts';
import type { Content, ParameterSet, RedshiftGrid } from '../inputs/types.ts';
import { columnsOf, TOPICS } from '../tables/columns.ts';
import { csvCell } from '../tables/csvCell.ts';
import type { EditionTables, MilestoneTable } from '../tables/types.ts';
import { currentEdition, newestFirst } from './currentEdition.ts';
import { MILESTONE_TEXT } from './milestoneText.ts';
import { PARAMETER_TEXT } from './parameterText.ts';
import { plainSymbol } from './plainSymbol.ts';
import type { Press } from './press.ts';
import type { IndexedColumn, IndexedEdition, IndexedGrid, IndexedSet, SearchIndex } from './searchIndexTypes.ts';
import { MILESTONE_SEARCH_NAMES, PARAMETER_SEARCH_NAMES, PARAMETER_SEARCH_TITLES } from './searchNames.ts';
import { setTitle } from './setTitle.ts';
import { typographic } from './typographic.ts';

/** What a reader can search, without the tables' values: a redshift leads to its row, and the row is read there. */
export function searchIndex(press: Press): SearchIndex {
  const sets = new Collected<IndexedSet>();
  const grids = new Collected<IndexedGrid>();
  const current = currentEdition(press);
  const others = newestFirst(press.editions).filter((edition) => edition !== current);
  const editions = [current, ...others].map((pressed) => indexedEdition(pressed, sets, grids));
  return {
    editions,
    sets: sets.things,
    grids: grids.things,
    columns: indexedColumns(press.content),
    milestones: MILESTONE_NAMES.map((id) => ({
      id,
      title: MILESTONE_TEXT[id].name,
      also: [plainSymbol(MILESTONE_TEXT[id].symbol ?? ''), ...MILESTONE_SEARCH_NAMES[id]],
      unit: unitOf(current.milestones[0], id),
    })),
    parameters: parameterIds().map((id) => ({
      id,
      title: PARAMETER_SEARCH_TITLES[id] ?? PARAMETER_TEXT[id].name,
      also: [id, ...PARAMETER_SEARCH_NAMES[id]],
      unit: PARAMETER_TEXT[id].unit,
    })),
  };
}

/** Things that differ, each once: most editions have the sets and grids of the one before. */
class Collected<T> {
  readonly things: T[] = [];
  readonly #positions = new Map<string, number>();

  /** The position of a thing, which is added if it is new. */
  position(thing: T): number {
    const key = JSON.stringify(thing);
    const known = this.#positions.get(key);
    if (known !== undefined) return known;
    this.#positions.set(key, this.things.length);
    return this.things.push(thing) - 1;
  }
}

function indexedEdition(
  { edition, tables, milestones }: EditionTables,
  sets: Collected<IndexedSet>,
  grids: Collected<IndexedGrid>,
): IndexedEdition {
  const publishedFirst = milestones.toSorted((a, b) => Number(isPublished(b.set)) - Number(isPublished(a.set)));
  const ownGrids = [...new Map(tables.map(({ grid }) => [grid.id, grid])).values()];
  const ids = new Set(tables.map(({ id }) => id));
  const possible = milestones.flatMap(({ set }) =>
    edition.topics.flatMap((topic) => ownGrids.map((grid) => `${set.id}.${topic}.${grid.id}`)),
  );
  return {
    number: edition.number,
    title: edition.title,
    state: edition.state,
    sets: publishedFirst.map((table) => sets.position(indexedSet(table, edition.digits))),
    grids: ownGrids.map((grid) => grids.position(indexedGrid(grid))),
    topics: edition.topics,
    missing: possible.filter((id) => !ids.has(id)),
  };
}

function isPublished({ kind }: ParameterSet): boolean {
  return kind === 'published';
}

function indexedSet({ set, milestones }: MilestoneTable, digits: number): IndexedSet {
  const parameters = parameterIds().flatMap((id) => {
    const value = set.parameters[id];
    if (value === undefined || value.length === 0) return [];
    const written = typeof value === 'string' ? value : value.join(', ');
    const u = id === 'm_nu' ? undefined : set.uncertainties[id];
    return [[id, u === undefined ? [written] : [written, u]] as const];
  });
  const values = milestones.flatMap(({ name, value }) => {
    if (value === null) return [];
    return [[name, typeof value === 'string' ? value : csvCell(value, digits)] as const];
  });
  return {
    id: set.id,
    title: setTitle(set),
    kind: set.kind,
    parameters: Object.fromEntries(parameters),
    milestones: Object.fromEntries(values),
  };
}

function indexedGrid({ id, title, redshifts }: RedshiftGrid): IndexedGrid {
  return { id, title, redshifts: redshifts.join(' ') };
}

/** The quantities that have a page, in order of printing, and behind them the redshift. */
function indexedColumns({ quantities }: Content): IndexedColumn[] {
  const columns = TOPICS.flatMap((topic) => columnsOf(topic));
  const ids = [...columns.map(({ id }) => id), 'z'];
  return quantities
    .toSorted((a, b) => ids.indexOf(a.id) - ids.indexOf(b.id))
    .map(({ id, name, symbol, alsoCalled }) => {
      const column = columns.find((one) => one.id === id);
      const also = [...shorter(name), plainSymbol(symbol), id, ...alsoCalled];
      return { id, title: typographic(name), also, unit: column?.unit ?? '', topic: column?.topic };
    });
}

/** "Critical density (SI)" and "Comoving volume, all sky" are asked for without what follows too. */
function shorter(name: string): string[] {
  const short = name.split(/ \(|, /)[0] as string;
  return short === name ? [] : [short];
}

function unitOf(table: MilestoneTable | undefined, name: MilestoneName): string {
  return table?.milestones.find((milestone) => milestone.name === name)?.unit ?? '';
}

function parameterIds(): (keyof Parameters)[] {
  return Object.keys(PARAMETER_TEXT) as (keyof Parameters)[];
}
