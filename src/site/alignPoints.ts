/** As wide as a figure. */
const FIGURE_SPACE = '\u2007';
/** As wide as a point. */
const POINT_SPACE = '\u2008';

/** Written decimals padded on the right, so that their points stand below each other when set flush right. */
export function alignPoints(texts: readonly string[]): string[] {
  const most = Math.max(0, ...texts.map((text) => decimals(text)));
  return texts.map((text) => {
    if (text === '') return '';
    const point = most > 0 && !text.includes('.') ? POINT_SPACE : '';
    return text + point + FIGURE_SPACE.repeat(most - decimals(text));
  });
}

function decimals(text: string): number {
  return text.split('.')[1]?.length ?? 0;
}
