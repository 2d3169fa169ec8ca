/** Prose with the signs a book prints: curled quotes and apostrophes, and an en dash for "--". */
export function typographic(text: string): string {
  return text
    .replace(/(^|[\s([])"/g, '$1\u201c')
    .replaceAll('"', '\u201d')
    .replaceAll("'", '\u2019')
    .replace(/(^| )--(?= |$)/g, '$1\u2013');
}
