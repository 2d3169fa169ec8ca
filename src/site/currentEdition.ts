import type { Edition, EditionState } from '../inputs/types.ts';
import type { EditionTables } from '../tables/types.ts';
import type { Press } from './press.ts';

/** What readers are told of an edition; being superseded follows from a newer edition. */
export type ShownState = EditionState | 'superseded';

export function shownState({ content }: Press, edition: Edition): ShownState {
  const replaced = content.editions.some((other) => other.supersedes === edition.number && other.state === 'released');
  return replaced && edition.state === 'released' ? 'superseded' : edition.state;
}

/** Editions newest first; numbers are compared part by part, so 2026.10 is newer than 2026.9. */
export function newestFirst(editions: readonly EditionTables[]): EditionTables[] {
  const parts = ({ edition }: EditionTables) => edition.number.split('.').map(Number);
  return editions.toSorted((a, b) => {
    const [of, against] = [parts(b), parts(a)];
    const at = of.findIndex((part, i) => part !== against[i]);
    return at < 0 ? of.length - against.length : (of[at] ?? 0) - (against[at] ?? 0);
  });
}

/** The edition a reader is led to: the newest released one, or while there is none the newest that is not withdrawn. */
export function currentEdition(press: Press): EditionTables {
  const newest = newestFirst(press.editions);
  const current =
    newest.find(({ edition }) => shownState(press, edition) === 'released') ??
    newest.find(({ edition }) => edition.state === 'draft') ??
    newest[0];
  if (!current) throw new Error('There is no edition to show: content/editions/ holds none.');
  return current;
}
