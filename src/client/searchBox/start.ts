import { getText } from '../getText.ts';
import type { Answer } from '../search/answer.ts';
import type { Places } from '../search/showAnswer.ts';
import { closeWhenLeft } from './closeWhenLeft.ts';
import { moveByArrows } from './keys.ts';
import { type Engine, loadEngine } from './loadEngine.ts';

/** Typing rests this long, in milliseconds, before a table is fetched for its value. */
const REST = 200;
const NOT_LOADED = 'The search index could not be loaded; the list of all tables is complete without it.';

/** Brings a search box to life. On the search page the query stays in the address, and the results stay open. */
export function startSearchBox(box: HTMLElement): void {
  const part = <T extends HTMLElement>(selector: string): T => box.querySelector(selector) as T;
  const form = part<HTMLFormElement>('form');
  const input = part<HTMLInputElement>('input');
  const places: Places = { status: part('[role="status"]'), notes: part('.notes'), list: part('ol') };
  const ownPage = box.dataset.page !== undefined;
  const load = (): Promise<Engine> => loadEngine(box.dataset.index ?? '');
  let rest: ReturnType<typeof setTimeout> | undefined;

  /** Undefined if the index cannot be had, or if the query has changed while it came. */
  async function search(): Promise<Answer | undefined> {
    const query = input.value.trim();
    clearTimeout(rest);
    const engine = await load().catch(() => undefined);
    if (query !== input.value.trim()) return undefined;
    if (!engine) {
      places.status.textContent = NOT_LOADED;
      return undefined;
    }
    const answer = engine.ask(query);
    engine.showAnswer(places, answer, query !== '');
    if (ownPage) history.replaceState(null, '', query === '' ? location.pathname : `?q=${encodeURIComponent(query)}`);
    rest = setTimeout(() => engine.addValues(places.list, answer.hits, getText), REST);
    return answer;
  }

  form.hidden = false;
  input.addEventListener('focus', ({ relatedTarget }) => {
    const fromResults = relatedTarget instanceof Node && box.contains(relatedTarget);
    if (!fromResults) search();
  });
  input.addEventListener('input', search);
  form.addEventListener('submit', async (event) => {
    event.preventDefault();
    const first = (await search())?.hits[0];
    if (first) location.assign(first.href);
  });
  moveByArrows(box, input);
  if (!ownPage) closeWhenLeft(box, input, () => clear(places));
  const asked = ownPage ? new URLSearchParams(location.search).get('q') : null;
  if (asked) {
    input.value = asked;
    search();
  }
}

function clear({ status, notes, list }: Places): void {
  for (const place of [status, notes, list]) place.replaceChildren();
}
