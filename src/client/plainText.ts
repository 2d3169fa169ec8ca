const GREEK: Readonly<Record<string, string>> = {
  Ω: 'Omega',
  ω: 'omega',
  Λ: 'Lambda',
  λ: 'lambda',
  η: 'eta',
  μ: 'mu',
  ρ: 'rho',
  χ: 'chi',
  ν: 'nu',
  γ: 'gamma',
  σ: 'sigma',
  κ: 'kappa',
};

/**
 * What somebody typed or pasted, in plain ASCII as far as it goes: subscript digits become digits, the minus sign a
 * hyphen, Greek letters their names, a decimal comma a point. A comma before exactly three digits groups thousands
 * ("1,100"), unless a zero stands before it.
 */
export function plainText(text: string): string {
  return text
    .normalize('NFKC')
    .replace(/[−–‐]/g, '-')
    .replace(/Λ(?=CDM)/g, 'L')
    .replace(/\p{Script=Greek}/gu, (letter) => GREEK[letter] ?? letter)
    .replace(/(?<![\d.,])[1-9]\d{0,2}(?:,\d{3})+(?![\d,])/g, (number) => number.replaceAll(',', ''))
    .replace(/(?<![\d.,])(\d+),(\d+)(?![\d.,])/g, '$1.$2');
}
