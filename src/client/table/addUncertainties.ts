import { uncertaintyBelow, type ValueSetting } from '../../tables/pageUncertainty.ts';
import type { Parts } from './parts.ts';
import { readUncertainties } from './readUncertainties.ts';

/**
 * Writes below each value its uncertainty out of a `.u.csv`. The whole file is read before the first cell is written, so
 * that one which does not fit leaves the table as it was.
 *
 * Errors: RangeError if the file does not fit the table.
 */
export function addUncertainties({ table, rows, columns }: Parts, csv: string): void {
  const heads = table.tHead?.rows[0]?.cells;
  const settings = columns.map(({ at }) => settingOf(heads?.[at]));
  const texts = readUncertainties(
    csv,
    rows.map(({ written }) => written),
    columns.map(({ id }) => id),
  );
  const written = rows.flatMap(({ element }, row) =>
    columns.flatMap(({ at }, n) => {
      const [cell, setting] = [element.cells[at], settings[n]];
      return cell && setting ? [{ cell, u: uncertaintyBelow(texts[row]?.[n] ?? '', cell.textContent, setting) }] : [];
    }),
  );
  for (const { cell, u } of written) if (u !== '') cell.append(small(u));
}

/** How the page says that the values of a column are set; see NumbersTable.astro. */
function settingOf(head: HTMLElement | undefined): ValueSetting {
  return { exponent: Number(head?.dataset.power), decimals: Number(head?.dataset.decimals) };
}

function small(text: string): HTMLElement {
  const element = document.createElement('small');
  element.textContent = text;
  return element;
}
