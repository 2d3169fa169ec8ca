import type { Edition } from '../../inputs/types.ts';
import type { EditionTables } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { type Chapter, contents } from '../contents.ts';
import { type ShownState, shownState } from '../currentEdition.ts';
import { gridExtent } from '../gridText.ts';
import { byKind, type KindGroup } from '../kindText.ts';
import { setsOf } from '../lookUp.ts';
import { noteHtml } from '../noteHtml.ts';
import type { Press } from '../press.ts';
import { type RunningHead, runningHead } from '../runningHead.ts';

/** Everything an edition page prints. */
export interface EditionView {
  readonly head: RunningHead;
  readonly number: string;
  readonly title: string;
  readonly state: ShownState;
  readonly released: string | undefined;
  /** An earlier edition that this one replaces. */
  readonly supersedes: { readonly number: string; readonly address: string | undefined } | undefined;
  readonly errata: Edition['errata'];
  readonly digits: number;
  readonly grids: readonly {
    readonly id: string;
    readonly title: string;
    readonly extent: string;
    /** HTML. */
    readonly note: string;
  }[];
  readonly chapters: readonly KindGroup<Chapter>[];
}

export function editionView(press: Press, pressed: EditionTables): EditionView {
  const { edition, tables } = pressed;
  const state = shownState(press, edition);
  const sets = new Map(setsOf(pressed).map((set) => [set.id, set]));
  const grids = [...new Map(tables.map(({ grid }) => [grid.id, grid])).values()];
  return {
    head: runningHead(edition, state),
    number: edition.number,
    title: edition.title,
    state,
    released: edition.released,
    supersedes: supersedes(press, edition),
    errata: edition.errata,
    digits: edition.digits,
    grids: grids.map((grid) => ({
      id: grid.id,
      title: grid.title,
      extent: gridExtent(grid),
      note: noteHtml(grid.note ?? ''),
    })),
    chapters: byKind(contents(pressed), ({ id }) => {
      const set = sets.get(id);
      if (!set) throw new Error(`Edition ${edition.number} has no parameter set ${id}.`);
      return set;
    }),
  };
}

function supersedes({ content }: Press, { supersedes: number }: Edition): EditionView['supersedes'] {
  if (number === undefined) return undefined;
  const known = content.editions.some((other) => other.number === number);
  return { number, address: known ? address.edition(number) : undefined };
}
