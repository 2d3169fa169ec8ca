import type { Parts, Row } from './parts.ts';

/** The one row whose redshift the Tab key reaches. */
export interface Ruler {
  readonly moveTo: (row: Row) => void;
  /** Moves there, and the focus too. */
  readonly focus: (row: Row) => void;
}

/**
 * The reading ruler: a fine rule under one row, which follows the pointer, or the focus. One row's redshift can be
 * reached with the Tab key; from there the up and down arrows lead from row to row.
 */
export function startRuler({ table, rows }: Parts): Ruler {
  const heads = rows.map(({ element }) => element.cells[0] as HTMLElement);
  let ruled: Element | null = null;
  let stop: HTMLElement | undefined;

  const rule = (row: Element | null): void => {
    ruled?.classList.remove('ruled');
    row?.classList.add('ruled');
    ruled = row;
  };
  const makeStop = (head: HTMLElement | undefined): void => {
    if (stop) stop.tabIndex = -1;
    stop = head;
    if (stop) stop.tabIndex = 0;
  };
  const rowOf = (target: EventTarget | null): Element | null =>
    target instanceof Element ? target.closest('tbody tr') : null;

  table.dataset.ruler = '';
  makeStop(heads[0]);
  table.addEventListener('pointerover', ({ target }) => rule(rowOf(target)));
  table.addEventListener('pointerleave', () => rule(rowOf(document.activeElement)));
  table.addEventListener('focusin', ({ target }) => rule(rowOf(target)));
  table.addEventListener('focusout', () => rule(null));
  table.addEventListener('keydown', (event) => {
    const step = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    const at = heads.indexOf(event.target as HTMLElement);
    if (step === undefined || at < 0) return;
    const next = nextShown(heads, at, step);
    if (!next) return;
    event.preventDefault();
    makeStop(next);
    next.focus();
  });
  const moveTo = ({ element }: Row): void => makeStop(element.cells[0]);
  const focus = (row: Row): void => {
    moveTo(row);
    stop?.focus({ preventScroll: true });
  };
  return { moveTo, focus };
}

function nextShown(heads: readonly HTMLElement[], at: number, step: number): HTMLElement | undefined {
  for (let n = at + step; n >= 0 && n < heads.length; n += step) {
    if (!heads[n]?.parentElement?.hidden) return heads[n];
  }
  return undefined;
}
