const THIN_SPACE = '<mspace width="0.1667em"/>';
/** A function name, perhaps with an index, as the typesetter writes it: the name and an invisible "apply". */
const FUNCTION = String.raw`(?:<ms(?:ub|up)><mrow>)?<mi>[a-z]{2,}</mi><mo>\u2061</mo>`;
const INDEX = '<m[in]>[^<]*</m[in]>';
const BRACKET = '(?:<mrow>)?<mo[^>]*>[([|]</mo>';
const END_OF_TERM = '</m(?:i|n|row|frac|sup|sub|subsup|sqrt|style)>';

/**
 * Makes browsers set KaTeX's MathML as TeX would set the formula. Each rule stands for a habit of TeX's that is lost in
 * MathML, as drawn by Chromium with STIX Two Math.
 */
const RULES: readonly (readonly [RegExp, string])[] = [
  // Bars around an absolute value: U+2223, which is written for them, is a relation ("divides") with its spaces.
  [/(<m[io] [^>]*>)\u2223(?=<\/m[io]>)/g, '$1|'],
  // A sign after a relation, a bracket or a comma is a sign, not a subtraction.
  [
    /(<mo[^>]*>(?:[=([{,;:\u2192\u2264\u2265\u226a\u226b\u2248\u221d]|&lt;|&gt;)<\/mo>)<mo>([\u2212+\u00b1])<\/mo>/g,
    '$1<mo form="prefix">$2</mo>',
  ],
  // A function name stands a little apart from the factor before it and from an argument without brackets.
  [new RegExp(`(${END_OF_TERM})(?=${FUNCTION})`, 'g'), `$1${THIN_SPACE}`],
  [new RegExp(`(<mo>\u2061</mo>)(?!</mrow>|${BRACKET})`, 'g'), `$1${THIN_SPACE}`],
  [new RegExp(`(<mo>\u2061</mo></mrow>${INDEX}</ms(?:ub|up)>)(?!</|${BRACKET})`, 'g'), `$1${THIN_SPACE}`],
  // Spaces as lengths: the font need not hold the space characters.
  [/<mtext>\u2009<\/mtext>/g, THIN_SPACE],
];

/** The bare `math` element of what KaTeX writes, with the rules applied. */
export function polishMathml(html: string): string {
  const bare = html.replace(/^<span class="katex">(.*)<\/span>$/s, '$1');
  const end = bare.indexOf('<annotation');
  const drawn = RULES.reduce((text, [pattern, by]) => text.replace(pattern, by), bare.slice(0, end));
  return drawn + bare.slice(end);
}
