import type { Parts } from './parts.ts';

/** The list of columns to choose from. */
export interface ColumnChoice {
  /** Ids of the columns ticked, in the order of the table. */
  readonly ticked: () => string[];
  readonly tick: (columns: readonly string[]) => void;
}

/** Fills a place with one box to tick for each column; the last one ticked cannot be taken away. */
export function columnChoice({ table, columns }: Parts, place: HTMLElement, changed: () => void): ColumnChoice {
  const boxes = columns.map(({ id, name, at }) => {
    const box = document.createElement('input');
    box.type = 'checkbox';
    box.value = id;
    const label = document.createElement('label');
    const symbol = table.tHead?.rows[0]?.cells[at]?.querySelector('.symbol')?.cloneNode(true);
    const sign = document.createElement('span');
    sign.append(...(symbol?.childNodes ?? []));
    label.append(box, ' ', sign, ` ${name}`);
    place.append(label);
    return box;
  });
  const ticked = (): string[] => boxes.filter((box) => box.checked).map((box) => box.value);
  const keepOne = (): void => {
    const only = ticked().length === 1;
    for (const box of boxes) box.disabled = only && box.checked;
  };
  const tick = (shown: readonly string[]): void => {
    for (const box of boxes) box.checked = shown.includes(box.value);
    keepOne();
  };
  place.addEventListener('change', () => {
    keepOne();
    changed();
  });
  return { ticked, tick };
}
