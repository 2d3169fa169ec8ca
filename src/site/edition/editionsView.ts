import { address } from '../addresses.ts';
import { newestFirst, type ShownState, shownState } from '../currentEdition.ts';
import { press } from '../press.ts';

/** One line in the list of editions. */
export interface EditionLine {
  readonly number: string;
  readonly title: string;
  readonly address: string;
  readonly state: ShownState;
  readonly released: string | undefined;
  readonly sets: number;
  readonly tables: number;
}

/** All editions, newest first. */
export async function editionsView(): Promise<EditionLine[]> {
  const pressed = await press();
  return newestFirst(pressed.editions).map(({ edition, tables }) => ({
    number: edition.number,
    title: edition.title,
    address: address.edition(edition.number),
    state: shownState(pressed, edition),
    released: edition.released,
    sets: edition.parameterSets.length,
    tables: tables.length,
  }));
}
