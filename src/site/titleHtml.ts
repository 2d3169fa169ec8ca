/** A title with the symbols in it set as symbols: "Omega_m" as a letter with an index, "H0" and "w0wa" likewise. */
export function titleHtml(title: string): string {
  return title
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replace(/Omega_(\w)/g, 'Ω<sub>$1</sub>')
    .replace(/\bH0\b/g, '<var>H</var><sub>0</sub>')
    .replace(/\bw0wa(?=CDM|\b)/g, '<var>w</var><sub>0</sub><var>w<sub>a</sub></var>');
}
