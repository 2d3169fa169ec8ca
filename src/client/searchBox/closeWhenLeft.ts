/**
 * The results of a box at the head of a page lie over it: they close on Escape, when the focus goes elsewhere, and
 * behind a result that was followed.
 */
export function closeWhenLeft(box: HTMLElement, input: HTMLInputElement, close: () => void): void {
  box.addEventListener('keydown', ({ key }) => {
    if (key !== 'Escape') return;
    input.focus();
    close();
  });
  box.addEventListener('focusout', ({ relatedTarget }) => {
    // Without a new place for the focus the window was left or bare paper touched; a click on a result must still land.
    if (relatedTarget instanceof Node && !box.contains(relatedTarget)) close();
  });
  document.addEventListener('pointerdown', ({ target }) => {
    if (target instanceof Node && !box.contains(target)) close();
  });
  box.addEventListener('click', ({ target }) => {
    if (target instanceof Element && target.closest('ol a')) close();
  });
}
