import { getText } from './getText.ts';
import type { Answer } from './search/answer.ts';
import type { Places } from './search/showAnswer.ts';

/** Typing rests this long, in milliseconds, before a table is fetched for its value. */
const REST = 200;

type Engine = typeof import('./search/engine.ts') & { ask: (query: string) => Answer };

let engine: Promise<Engine> | undefined;

/** Loads the index and the code that reads it, once for all boxes; a failure is not kept, so the next key tries again. */
function loadEngine(indexAddress: string): Promise<Engine> {
  engine ??= Promise.all([import('./search/engine.ts'), getText(indexAddress)])
    .then(([module, text]) => ({ ...module, ask: module.openSearch(JSON.parse(text)) }))
    .catch((error: unknown) => {
      engine = undefined;
      throw error;
    });
  return engine;
}

/** Brings a search box to life. On the search page the query stays in the address, and the results stay open. */
export function startSearchBox(box: HTMLElement): void {
  const form = box.querySelector('form') as HTMLFormElement;
  const input = box.querySelector('input') as HTMLInputElement;
  const found = box.querySelector('.found') as HTMLElement;
  const places: Places = {
    status: box.querySelector('[role="status"]') as HTMLElement,
    notes: box.querySelector('.notes') as HTMLElement,
    list: box.querySelector('ol') as HTMLElement,
  };
  const ownPage = box.dataset.page !== undefined;
  const load = (): Promise<Engine> => loadEngine(box.dataset.index as string);
  let rest: ReturnType<typeof setTimeout> | undefined;

  async function search(): Promise<Answer | undefined> {
    const query = input.value.trim();
    clearTimeout(rest);
    try {
      const { ask, showAnswer, addValues } = await load();
      if (query !== input.value.trim()) return undefined;
      const answer = ask(query);
      showAnswer(places, answer, query !== '');
      found.hidden = query === '';
      if (ownPage) history.replaceState(null, '', query === '' ? location.pathname : `?q=${encodeURIComponent(query)}`);
      rest = setTimeout(() => addValues(places.list, answer.hits, getText), REST);
      return answer;
    } catch {
      places.status.textContent =
        'The search index could not be loaded; the list of all tables is complete without it.';
      return undefined;
    }
  }

  form.hidden = false;
  input.addEventListener('focus', () => load().catch(() => undefined));
  input.addEventListener('input', search);
  form.addEventListener('submit', async (event) => {
    event.preventDefault();
    const first = (await search())?.hits[0];
    if (first) location.assign(first.href);
  });
  if (!ownPage) closeWhenLeft(box, input, found);
  moveByArrows(box, input);
  const asked = ownPage ? new URLSearchParams(location.search).get('q') : null;
  if (asked) {
    input.value = asked;
    search();
  }
}

/** The results of a box at the head of a page lie over it: they close on Escape, when focus goes, and behind a result. */
function closeWhenLeft(box: HTMLElement, input: HTMLInputElement, found: HTMLElement): void {
  box.addEventListener('keydown', (event) => {
    if (event.key !== 'Escape' || found.hidden) return;
    found.hidden = true;
    input.focus();
  });
  box.addEventListener('focusout', ({ relatedTarget }) => {
    // Without a new place for the focus the window was left or bare paper touched; a click on a result must still land.
    if (relatedTarget instanceof Node && !box.contains(relatedTarget)) found.hidden = true;
  });
  document.addEventListener('pointerdown', ({ target }) => {
    if (target instanceof Node && !box.contains(target)) found.hidden = true;
  });
  found.addEventListener('click', ({ target }) => {
    if (target instanceof HTMLAnchorElement) found.hidden = true;
  });
  input.addEventListener('focus', () => {
    found.hidden = found.querySelector('li, .note') === null;
  });
}

/** Arrow down leads from the field into the results, and both arrows along them. */
function moveByArrows(box: HTMLElement, input: HTMLInputElement): void {
  box.addEventListener('keydown', (event) => {
    if (event.key !== 'ArrowDown' && event.key !== 'ArrowUp') return;
    const stops: HTMLElement[] = [input, ...box.querySelectorAll<HTMLElement>('ol a')];
    const next = stops[stops.indexOf(document.activeElement as HTMLElement) + (event.key === 'ArrowDown' ? 1 : -1)];
    if (!next) return;
    event.preventDefault();
    next.focus();
  });
}

/** "/" leads to the first search box that is on show, unless one is writing. */
export function focusOnSlash(boxes: readonly HTMLElement[]): void {
  document.addEventListener('keydown', (event) => {
    if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey) return;
    if (event.target instanceof Element && event.target.closest('input, textarea, select, [contenteditable]')) return;
    const input = boxes.map((box) => box.querySelector('input')).find((field) => field?.checkVisibility());
    if (!input) return;
    event.preventDefault();
    input.focus();
    input.select();
  });
}
