import { columnChoice } from './columnChoice.ts';
import type { Parts } from './parts.ts';
import { rangeOf } from './rangeOf.ts';
import { showColumns } from './showColumns.ts';
import { countRows, showRange } from './showRange.ts';
import { uncertaintySwitch } from './uncertaintySwitch.ts';
import { readView, type View, writeView } from './viewState.ts';

/** What other tools may ask of the view. */
export interface ViewTools {
  readonly showAllRows: () => void;
}

/**
 * Range of rows, choice of columns, and uncertainties. The view stands in the address, so that it can be sent to somebody, and is read
 * from there at the start.
 */
export function startViewTools(parts: Parts, tools: HTMLElement): ViewTools {
  const all = parts.columns.map(({ id }) => id);
  const part = <T extends HTMLElement>(selector: string): T => tools.querySelector(selector) as T;
  const from = part<HTMLInputElement>('[name="from"]');
  const to = part<HTMLInputElement>('[name="to"]');
  const whole = part('.whole');
  const choice = columnChoice(parts, part('.columns fieldset'), () => {
    const ticked = choice.ticked();
    show({ ...view, columns: ticked.length === all.length ? undefined : ticked });
  });
  const uncertainties = uncertaintySwitch(parts, tools, (on) => show({ ...view, u: on || undefined }));
  const ranged = (): void => show({ ...view, from: from.value.trim() || undefined, to: to.value.trim() || undefined });
  let view: View = {};

  function show(next: View): void {
    view = next;
    from.value = view.from ?? '';
    to.value = view.to ?? '';
    choice.tick(view.columns ?? all);
    showColumns(parts, view.columns ?? all);
    uncertainties?.show(view.u ?? false);
    whole.hidden = !view.from && !view.to && !view.columns;
    const range = rangeOf(parts.redshifts, from.value, to.value);
    if (typeof range !== 'string') showRange(parts, range);
    part('.count').textContent = typeof range === 'string' ? range : countRows(parts, range);
    history.replaceState(null, '', location.pathname + writeView(location.search, view) + location.hash);
  }

  part('.range').addEventListener('submit', (event) => {
    event.preventDefault();
    ranged();
  });
  part('.range').addEventListener('change', ranged);
  whole.addEventListener('click', () => {
    show({ u: view.u });
    part('.columns summary').focus(); // the button is gone, and the focus must not go with it
  });
  show(readView(location.search, all));
  return { showAllRows: () => show({ ...view, from: undefined, to: undefined }) };
}
