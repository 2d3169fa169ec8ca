/** A symbol in LaTeX as one would type it: `\Omega_{\mathrm{bc}}(z)` is Omega_bc. */
export function plainSymbol(latex: string): string {
  return latex.replace(/\\mathrm|[\\{}\s]/g, '').replace(/\(z\)$/, '');
}
