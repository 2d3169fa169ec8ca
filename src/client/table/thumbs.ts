import type { Parts, Row } from './parts.ts';

/** Marks in the thumb index the stretch of the table that is on top of the screen. */
export function startThumbs({ table, rows }: Parts, index: HTMLElement): void {
  const links = Array.from(index.querySelectorAll('a'));
  const redshifts = links.map((link) => Number(link.hash.slice(3)));
  let waiting = false;

  const mark = (): void => {
    waiting = false;
    const head = table.tHead?.getBoundingClientRect().bottom ?? 0;
    const top = topRow(
      rows.filter(({ element }) => !element.hidden),
      Math.max(head, 0),
    );
    const at = redshifts.findLastIndex((z) => top !== undefined && z <= top.z);
    links.forEach((link, n) => {
      link.toggleAttribute('data-here', n === at);
    });
  };
  const later = (): void => {
    if (waiting) return;
    waiting = true;
    requestAnimationFrame(mark);
  };
  // Captured, because a narrow screen scrolls the sheet and not the page, and that event does not bubble.
  document.addEventListener('scroll', later, { capture: true, passive: true });
  mark();
}

/** The first row whose foot lies below a height on the screen. */
function topRow(rows: readonly Row[], height: number): Row | undefined {
  let low = 0;
  let high = rows.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((rows[middle] as Row).element.getBoundingClientRect().bottom <= height) low = middle + 1;
    else high = middle;
  }
  return rows[low] ?? rows.at(-1);
}
