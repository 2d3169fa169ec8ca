/** Arrow down leads from the field into the results, and both arrows along them. */
export function moveByArrows(box: HTMLElement, input: HTMLInputElement): void {
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
