import { getText } from '../getText.ts';
import { addUncertainties } from './addUncertainties.ts';
import type { Parts } from './parts.ts';

/** Uncertainties below the values, on or off. */
export interface UncertaintySwitch {
  readonly show: (on: boolean) => void;
}

const SHOWN = 'Below each value stands its standard uncertainty.';
const FETCHING = 'Fetching the uncertainties.';
const FAILED = 'The uncertainties could not be loaded. Tick the box to try again.';

/**
 * The box to tick; null on the page of a set that gives no uncertainties. Their file is fetched when they are first
 * asked for. `changed` is told what the reader wants, and that nothing is shown after all if the file cannot be had.
 */
export function uncertaintySwitch(
  parts: Parts,
  tools: HTMLElement,
  changed: (on: boolean) => void,
): UncertaintySwitch | null {
  const found = tools.querySelector<HTMLInputElement>('[name="u"]');
  if (!found) return null;
  const box = found;
  const said = tools.querySelector('.shown') as HTMLElement;
  const { table } = parts;
  let wanted = false;
  let added = false;

  async function fill(): Promise<void> {
    said.textContent = FETCHING;
    const csv = await getText(box.dataset.file ?? '');
    if (!added) addUncertainties(parts, csv);
    added = true;
  }

  async function turnOn(): Promise<void> {
    try {
      if (!added) await fill();
    } catch {
      if (wanted) changed(false);
      said.textContent = FAILED;
      return;
    }
    if (!wanted) return;
    table.dataset.u = '';
    said.textContent = SHOWN;
    // On arrival the row that was asked for has moved down with the rows above it.
    if (location.hash !== '') table.querySelector('.asked')?.scrollIntoView({ block: 'center' });
  }

  function show(on: boolean): void {
    box.checked = on;
    if (on === wanted) return;
    wanted = on;
    if (on) {
      void turnOn();
      return;
    }
    delete table.dataset.u;
    said.textContent = '';
  }

  box.addEventListener('change', () => changed(box.checked));
  return { show };
}
