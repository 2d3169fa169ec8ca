import type { Answer } from './answer.ts';
import { cellOf } from './cellOf.ts';
import type { Hit } from './hit.ts';
import { showValue } from './showValue.ts';

/** Longer lists are cut: whoever gets this many results adds a word. */
const MOST_SHOWN = 20;

/** The parts of a search box that an answer is written into. */
export interface Places {
  readonly status: HTMLElement;
  readonly notes: HTMLElement;
  readonly list: HTMLElement;
}

/** Writes an answer; `asked` is false for an empty query, which is not a search without results. */
export function showAnswer(
  { status, notes, list }: Places,
  { reading, notes: said, hits }: Answer,
  asked: boolean,
): void {
  status.textContent = asked ? sentence(hits.length, reading) : '';
  notes.replaceChildren(...said.map((note) => element('p', 'note', note)));
  list.replaceChildren(...hits.slice(0, MOST_SHOWN).map(line));
}

function sentence(count: number, reading: string): string {
  const of = reading === '' ? '' : ` for ${reading}`;
  if (count === 0) return `Nothing found${of}.`;
  if (count > MOST_SHOWN) return `First ${MOST_SHOWN} of ${count} results${of}.`;
  return `${count} ${count === 1 ? 'result' : 'results'}${of}.`;
}

function line(hit: Hit): HTMLElement {
  const item = document.createElement('li');
  const link = element('a', 'title', hit.title);
  link.setAttribute('href', hit.href);
  const value = element('span', 'value', '');
  if (hit.value) showValue(value, hit.value);
  item.append(link, ' ', value, ' ', element('span', 'detail', hit.detail));
  return item;
}

function element(name: string, className: string, text: string): HTMLElement {
  const made = document.createElement(name);
  made.className = className;
  made.textContent = text;
  return made;
}

/**
 * Adds to the first result, and to those of the same table, the value as the published CSV writes it. The results stand
 * without it: if the file cannot be had, nothing is added.
 */
export async function addValues(
  list: HTMLElement,
  hits: readonly Hit[],
  getText: (address: string) => Promise<string>,
): Promise<void> {
  const csv = hits[0]?.cell?.csv;
  if (csv === undefined) return;
  const lines = [...list.children];
  const text = await getText(csv).catch(() => undefined);
  if (text === undefined) return;
  for (const [n, { cell }] of hits.slice(0, MOST_SHOWN).entries()) {
    const place = lines[n]?.querySelector('.value');
    if (!place || !cell || cell.csv !== csv) continue;
    const value = cellOf(text, cell);
    if (value === '') place.textContent = 'blank: does not exist here';
    else if (value !== undefined) showValue(place, { written: value, unit: cell.unit });
  }
}
