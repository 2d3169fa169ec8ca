import { readNumber } from '../readNumber.ts';
import { columnChoice } from './columnChoice.ts';
import { findRows, markRows, sayFound } from './goTo.ts';
import { partsOf } from './parts.ts';
import { rangeOf } from './rangeOf.ts';
import { startRuler } from './ruler.ts';
import { showColumns } from './showColumns.ts';
import { countRows, showRange } from './showRange.ts';
import { startThumbs } from './thumbs.ts';
import { readView, type View, writeView } from './viewState.ts';

/** Brings the tools of a table page to life; until then they are hidden, because without this script they do nothing. */
export function startTableTools(tools: HTMLElement, table: HTMLTableElement): void {
  const parts = partsOf(table);
  const all = parts.columns.map(({ id }) => id);
  const part = <T extends HTMLElement>(selector: string): T => tools.querySelector(selector) as T;
  const goTo = part<HTMLInputElement>('.go-to input');
  const from = part<HTMLInputElement>('[name="from"]');
  const to = part<HTMLInputElement>('[name="to"]');
  const said = part('.said');
  const count = part('.count');
  const whole = part<HTMLButtonElement>('.whole');
  const choice = columnChoice(parts, part('.columns fieldset'), chosen);
  const ruler = startRuler(parts);
  let view: View = readView(location.search, all);

  /** Shows the table as the view says, and says the view in the address, so that it can be sent to somebody. */
  function show(): void {
    const range = rangeOf(parts.redshifts, view.from ?? '', view.to ?? '');
    from.value = view.from ?? '';
    to.value = view.to ?? '';
    choice.tick(view.columns ?? all);
    showColumns(parts, view.columns ?? all);
    whole.hidden = !view.from && !view.to && !view.columns;
    if (typeof range !== 'string') showRange(parts, range);
    count.textContent = typeof range === 'string' ? range : countRows(parts, range);
    history.replaceState(null, '', location.pathname + writeView(location.search, view) + location.hash);
  }

  function chosen(): void {
    const ticked = choice.ticked();
    view = { ...view, columns: ticked.length === all.length ? undefined : ticked };
    show();
  }

  function ranged(): void {
    view = { ...view, from: from.value.trim() || undefined, to: to.value.trim() || undefined };
    show();
  }

  /** Goes to the redshift that the address asks for, as a number: `#z=0.5` is the row 0.50 too. */
  function arrive(): void {
    const asked = location.hash.slice(1);
    const z = /^z=/.test(asked) ? readNumber(asked) : undefined;
    if (z === undefined) return;
    const found = findRows(parts, z);
    if (found.rows.some(({ element }) => element.hidden)) {
      view = { ...view, from: undefined, to: undefined };
      show();
    }
    const [first] = found.rows;
    if (first) ruler.moveTo(first);
    markRows(parts, found.rows);
    said.replaceChildren(...sayFound(asked.slice(2), found));
  }

  part('.go-to').addEventListener('submit', (event) => {
    event.preventDefault();
    const z = readNumber(goTo.value);
    if (z === undefined) {
      said.textContent =
        goTo.value.trim() === '' ? 'Write a redshift, such as 0.5.' : `“${goTo.value}” is not a redshift.`;
      return;
    }
    const { rows, exact } = findRows(parts, z);
    const hash = `#${exact ? rows[0]?.element.id : `z=${z}`}`;
    if (location.hash === hash) arrive();
    else location.hash = hash;
    // The arrows go on from the row; one that is not on the grid leaves the field in hand, to be mended.
    if (exact && rows[0]) ruler.focus(rows[0]);
  });
  part('.range').addEventListener('submit', (event) => {
    event.preventDefault();
    ranged();
  });
  part('.range').addEventListener('change', ranged);
  whole.addEventListener('click', () => {
    view = {};
    show();
    part('.columns summary').focus();
  });
  addEventListener('hashchange', arrive);
  // What is said of a redshift between two rows lies over the page, see tools.css; it goes when it has been read.
  addEventListener('keydown', ({ key }) => {
    if (key === 'Escape') said.replaceChildren();
  });
  addEventListener('pointerdown', ({ target }) => {
    if (target instanceof Node && !said.contains(target)) said.replaceChildren();
  });

  const index = document.querySelector<HTMLElement>('.thumbs');
  if (index) startThumbs(parts, index);
  tools.hidden = false;
  show();
  arrive();
}
