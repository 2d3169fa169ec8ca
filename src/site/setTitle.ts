/** The title of a parameter set with the Greek letter that its file spells in ASCII. */
export function setTitle({ title }: { readonly title: string }): string {
  return title.replace(/LCDM\b/g, 'ΛCDM');
}
