/**
 * Cuts the site's fonts down to the characters it prints and writes them to src/styles/fonts/. Run it after adding a
 * character here:  npm exec -c 'node scripts/subsetFonts.ts'
 */
import './requireNode.mjs';
import { copyFileSync, readFileSync, writeFileSync } from 'node:fs';
import subsetFont from 'subset-font';

const SOURCE = 'node_modules/@fontsource';
const TARGET = 'src/styles/fonts';

const ASCII = range(0x20, 0x7e);
/** Signs, dashes, quotation marks, thin space, minus, superscripts of units; then the accents of author names. */
const SIGNS = '\u00a0§©°±²³·¹×\u2009–—‘’“”†…′″−';
const WESTERN = `${SIGNS}ÅÄÖÜßàáâãäåæçèéêëíïñóôöøúüšžłć`;
const GREEK = `${range(0x391, 0x3a9)}${range(0x3b1, 0x3c9)}ϕϵϑ`;
/** Italic Latin and Greek letters, as a browser asks for them when a formula has a one-letter name. */
const MATH_ITALIC = `${range(0x1d434, 0x1d467)}ℎ${range(0x1d6fc, 0x1d71b)}`;
const MATH_SIGNS = '()[]{}|/=+<>,.;:!−×±·≤≥≈≃≡≪≫≠√∫∑∂∞→∝⊙′⋅…¯ℏ⁰⁴⁵⁶⁷⁸⁹⁻\u2061\u2062';
const DIGITS_AND_LETTERS = `${range(0x30, 0x39)}${range(0x41, 0x5a)}${range(0x61, 0x7a)}`;

const cuts = [
  { file: 'text-roman', source: 'stix-two-text/files/stix-two-text-latin-400-normal', characters: ASCII + WESTERN },
  { file: 'text-italic', source: 'stix-two-text/files/stix-two-text-latin-400-italic', characters: ASCII + WESTERN },
  { file: 'text-semibold', source: 'stix-two-text/files/stix-two-text-latin-600-normal', characters: ASCII + SIGNS },
  {
    file: 'math',
    source: 'stix-two-math/files/stix-two-math-latin-400-normal',
    characters: GREEK + MATH_ITALIC + MATH_SIGNS + DIGITS_AND_LETTERS,
    dropTables: ['GPOS', 'GSUB'],
  },
  // Figure and punctuation space. In this font they are wider than a figure and a point; the style sheet scales them.
  // The zero is there because browsers refuse a font without an outline.
  {
    file: 'spaces',
    source: 'stix-two-math/files/stix-two-math-latin-400-normal',
    characters: '0\u2007\u2008',
    dropTables: ['GPOS', 'GSUB', 'MATH'],
  },
];

let total = 0;
for (const { file, source, characters, dropTables } of cuts) {
  const font = await subsetFont(readFileSync(`${SOURCE}/${source}.woff2`), characters, {
    targetFormat: 'woff2',
    noHinting: true,
    // The figures are tabular and lining as they stand; proportional ones and fractions are left out.
    keepFeatures: ['ccmp', 'kern', 'liga', 'locl', 'mark', 'mkmk'],
    // The licence and its address stay in the file.
    preserveNameIds: [13, 14],
    ...(dropTables ? { dropTables } : {}),
  });
  writeFileSync(`${TARGET}/${file}.woff2`, font);
  total += font.length;
  console.log(`${file}.woff2  ${font.length} bytes`);
}
copyFileSync(`${SOURCE}/stix-two-text/LICENSE`, `${TARGET}/OFL.txt`);
console.log(`${total} bytes in all`);

/** All characters from one code point to another, both included. */
function range(first: number, last: number): string {
  return Array.from({ length: last - first + 1 }, (_, i) => String.fromCodePoint(first + i)).join('');
}
