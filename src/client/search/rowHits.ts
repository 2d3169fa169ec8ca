import { address } from '../../site/addresses.ts';
import type { IndexedColumn, IndexedSet } from '../../site/searchIndexTypes.ts';
import { realMinus } from '../../site/writtenNumber.ts';
import { bestGrid, type Place } from './bestGrid.ts';
import { type Hit, upperFirst } from './hit.ts';
import type { Scope } from './scope.ts';
import type { TypedNumber } from './typedNumber.ts';

/** Rows of tables, and what must be said about them. */
export interface Rows {
  readonly hits: readonly Hit[];
  /** "2.33 is not on “Reading grid”; nearest 2.3 and 2.4." */
  readonly notes: readonly string[];
}

/**
 * The rows for a redshift: of each set, the named columns, each on the best of its grids; without named columns, the
 * topics of the sets that were named, or of the first set.
 */
export function rowHits(scope: Scope, columns: readonly IndexedColumn[], redshift: TypedNumber): Rows {
  const hits: Hit[] = [];
  const notes = new Set<string>();
  const sets = columns.length > 0 || scope.named.sets ? scope.sets : scope.sets.slice(0, 1);
  for (const set of sets) {
    for (const { topic, column } of wanted(scope, columns)) {
      const grids = scope.grids.filter((grid) => exists(scope, tableId(set, topic, grid.id)));
      const place = bestGrid(grids, redshift.value);
      if (!place) continue;
      const note = describe(place, redshift);
      if (note) notes.add(note);
      for (const row of rowsOf(place)) hits.push(rowHit(scope, set, topic, column, place, row));
    }
  }
  return { hits, notes: [...notes] };
}

export function tableId(set: IndexedSet, topic: string, grid: string): string {
  return `${set.id}.${topic}.${grid}`;
}

export function exists(scope: Scope, table: string): boolean {
  return !scope.edition.missing.includes(table);
}

/** Set and grid, and the edition where there are several. */
export function standing(scope: Scope, set: IndexedSet, grid: { title: string } | undefined): string {
  return [set.title, ...(grid ? [grid.title] : []), ...editionOf(scope)].join(' · ');
}

export function editionOf({ several, edition }: Scope): string[] {
  return several ? [`edition ${edition.number}`] : [];
}

function wanted(scope: Scope, columns: readonly IndexedColumn[]) {
  if (columns.length === 0) return scope.topics.map((topic) => ({ topic, column: undefined }));
  return scope.edition.topics.flatMap((topic) =>
    columns.filter((column) => column.topic === topic).map((column) => ({ topic, column })),
  );
}

function rowsOf({ standing }: Place): number[] {
  if ('at' in standing) return [standing.at];
  return [standing.below, standing.above].filter((row) => row !== undefined);
}

function rowHit(
  scope: Scope,
  set: IndexedSet,
  topic: string,
  column: IndexedColumn | undefined,
  { grid }: Place,
  row: number,
): Hit {
  const table = tableId(set, topic, grid.id);
  const redshift = grid.redshifts[row] as string;
  const hit = {
    href: address.row(scope.edition.number, table, redshift),
    title: `${upperFirst(column?.title ?? topic)} at z = ${realMinus(redshift)}`,
    detail: standing(scope, set, grid),
  };
  if (!column) return hit;
  const csv = address.csv(scope.edition.number, table);
  return { ...hit, cell: { csv, redshift, column: column.id, unit: column.unit } };
}

function describe({ grid, standing }: Place, { text }: TypedNumber): string | undefined {
  if ('at' in standing) return undefined;
  const written = (row: number | undefined): string => realMinus(grid.redshifts[row ?? -1] ?? '');
  const below = written(standing.below);
  const above = written(standing.above);
  const asked = realMinus(text);
  if (below === '') return `${asked} lies below every row of “${grid.title}”, which begins at ${above}.`;
  if (above === '') return `${asked} lies beyond every row of “${grid.title}”, which ends at ${below}.`;
  return `${asked} is not on “${grid.title}”; nearest ${below} and ${above}.`;
}
