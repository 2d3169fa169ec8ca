import { readNumber } from '../readNumber.ts';
import { findRows, markRows, sayFound } from './goTo.ts';
import type { Parts } from './parts.ts';
import type { Ruler } from './ruler.ts';
import type { ViewTools } from './viewTools.ts';

/** Going to a redshift, by the field or by the address: `#z=0.5` is the row 0.50, and between two rows both are marked. */
export function startGoTo(parts: Parts, tools: HTMLElement, ruler: Ruler, view: ViewTools): void {
  const form = tools.querySelector('.go-to') as HTMLFormElement;
  const field = form.querySelector('input') as HTMLInputElement;
  const said = tools.querySelector('.said') as HTMLElement;

  function arrive(): void {
    const asked = location.hash.slice(1);
    const z = /^z=/.test(asked) ? readNumber(asked) : undefined;
    if (z === undefined) return;
    const found = findRows(parts, z);
    if (found.rows.some(({ element }) => element.hidden)) view.showAllRows();
    const [first] = found.rows;
    if (first) ruler.moveTo(first);
    markRows(parts, found.rows);
    said.replaceChildren(...sayFound(asked.slice(2), found));
  }

  form.addEventListener('submit', (event) => {
    event.preventDefault();
    const z = readNumber(field.value);
    if (z === undefined) {
      const typed = field.value.trim();
      said.textContent = typed === '' ? 'Write a redshift, such as 0.5.' : `“${typed}” is not a redshift.`;
      return;
    }
    const { rows, exact } = findRows(parts, z);
    const hash = `#${exact ? rows[0]?.element.id : `z=${z}`}`;
    if (location.hash === hash) arrive();
    else location.hash = hash;
    // The arrows go on from the row; one that is not on the grid leaves the field in hand, to be mended.
    if (exact && rows[0]) ruler.focus(rows[0]);
  });
  addEventListener('hashchange', arrive);
  // What is said of a redshift between two rows lies over the page, see tools.css; it goes when it has been read.
  addEventListener('keydown', ({ key }) => {
    if (key === 'Escape') said.replaceChildren();
  });
  addEventListener('pointerdown', ({ target }) => {
    if (target instanceof Node && !said.contains(target)) said.replaceChildren();
  });
  arrive();
}
