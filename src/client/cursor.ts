/** A hairline over the graduated scales that follows the pointer, as the cursor of a slide rule does. */
export function startCursor(rulers: HTMLElement): void {
  const hairline = rulers.querySelector<HTMLElement>('.cursor');
  const scale = rulers.querySelector('.scale');
  if (!hairline || !scale) return;
  rulers.addEventListener('pointermove', ({ clientX }) => {
    const { left, right } = scale.getBoundingClientRect();
    hairline.hidden = clientX < left || clientX > right;
    hairline.style.left = `${clientX - rulers.getBoundingClientRect().left}px`;
  });
  rulers.addEventListener('pointerleave', () => {
    hairline.hidden = true;
  });
}
