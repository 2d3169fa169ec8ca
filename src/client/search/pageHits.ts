import { address } from '../../site/addresses.ts';
import type { IndexedColumn } from '../../site/searchIndexTypes.ts';
import { type Hit, upperFirst } from './hit.ts';
import { editionOf, exists, standing, tableId } from './rowHits.ts';
import type { Scope } from './scope.ts';

/** The page of each quantity. */
export function quantityHits(columns: readonly IndexedColumn[]): Hit[] {
  return columns.map(({ id, title, topic }) => ({
    href: address.quantity(id),
    title: upperFirst(title),
    detail: ['Definition and formula', ...(topic ? [topic] : [])].join(' · '),
  }));
}

/** The pages of the sets in the scope. */
export function setHits(scope: Scope): Hit[] {
  return scope.sets.map((set) => ({
    href: address.set(scope.edition.number, set.id),
    title: set.title,
    detail: ['Parameter set', ...editionOf(scope)].join(' · '),
  }));
}

/** The tables in the scope with these topics; of the first set only, unless sets are named. */
export function tableHits(scope: Scope, topics: readonly string[]): Hit[] {
  const sets = scope.named.sets ? scope.sets : scope.sets.slice(0, 1);
  return sets.flatMap((set) =>
    topics.flatMap((topic) =>
      scope.grids
        .map((grid) => ({ grid, id: tableId(set, topic, grid.id) }))
        .filter(({ id }) => exists(scope, id))
        .map(({ grid, id }) => ({
          href: address.table(scope.edition.number, id),
          title: `Table of ${topic}`,
          detail: standing(scope, set, grid),
        })),
    ),
  );
}
