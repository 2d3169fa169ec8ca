const GREEK = /^(Omega|omega|gamma|nu|rho|eta|mu|chi|Lambda)$/;

/** LaTeX for a name in ASCII such as `Omega_gamma` or `H0`: the first part is the letter, the rest its index. */
export function symbolOfName(name: string): string {
  const [letter = '', ...index] = name.split('_');
  const [, base = letter, digits] = /^([A-Za-z]+)(\d+)$/.exec(letter) ?? [];
  const parts = [...(digits ? [digits] : []), ...index].map(indexPart);
  return parts.length > 0 ? `${greek(base)}_{${parts.join(',')}}` : greek(base);
}

function greek(word: string): string {
  return GREEK.test(word) ? `\\${word}` : word;
}

/** Words and abbreviations stand upright; single letters that are variables, like the k of curvature, are italic. */
function indexPart(part: string): string {
  if (GREEK.test(part)) return greek(part);
  return /^[akz]$|^\d+$/.test(part) ? part : `\\mathrm{${part}}`;
}
