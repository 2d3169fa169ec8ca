const THIN = '\u2009';

/**
 * A decimal as somebody wrote it, for HTML: real minus sign, digits of long numbers in threes, powers of ten raised.
 * Other text is returned as it is.
 */
export function writtenNumber(text: string): string {
  const match = /^([-+]?)(\d+)(?:\.(\d+))?(?:[eE]([-+]?\d+))?$/.exec(text);
  if (!match) return text.replace(/^(\d+)\/pi$/, (_, over: string) => `${writtenNumber(over)}/π`);
  const [, sign = '', whole = '', fraction, exponent] = match;
  const digits =
    inThrees(whole, /\B(?=(?:\d{3})+$)/g) + (fraction ? `.${inThrees(fraction, /(?<=^(?:\d{3})+)\B/g)}` : '');
  const power = exponent ? `${THIN}×${THIN}10<sup>${realMinus(String(Number(exponent)))}</sup>` : '';
  return realMinus(sign.replace('+', '')) + digits + power;
}

/** Up to four digits stay together, as printers have it. */
function inThrees(digits: string, gaps: RegExp): string {
  return digits.length > 4 ? digits.replace(gaps, THIN) : digits;
}

/** The minus sign that is as wide as a plus. */
export function realMinus(text: string): string {
  return text.replace('-', '\u2212');
}
