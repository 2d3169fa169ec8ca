import type { EditionTables } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { type Chapter, contents } from '../contents.ts';
import { currentEdition, type ShownState, shownState } from '../currentEdition.ts';
import { type GlanceRow, glance } from '../glance.ts';
import type { KindGroup } from '../kindText.ts';
import { press } from '../press.ts';
import { type Rulers, rulers } from './rulers.ts';

/** Everything the first page prints. */
export interface HomeView {
  readonly title: string;
  readonly group: string;
  readonly edition: {
    readonly number: string;
    readonly title: string;
    readonly state: ShownState;
    readonly released: string | undefined;
    readonly address: string;
    readonly size: string;
  };
  readonly rulers: Rulers | undefined;
  readonly glance: readonly KindGroup<GlanceRow>[];
  readonly chapters: readonly Chapter[];
}

export async function homeView(): Promise<HomeView> {
  const pressed = await press();
  const current = currentEdition(pressed);
  const { edition } = current;
  return {
    title: pressed.content.site.title,
    group: pressed.content.site.group,
    edition: {
      number: edition.number,
      title: edition.title,
      state: shownState(pressed, edition),
      released: edition.released,
      address: address.edition(edition.number),
      size: size(current),
    },
    rulers: rulers(pressed.content, current),
    glance: glance(current),
    chapters: contents(current),
  };
}

function size({ edition, tables }: EditionTables): string {
  return `${edition.parameterSets.length} parameter sets, ${tables.length} tables`;
}
