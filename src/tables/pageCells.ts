import { roundHalfEven } from '../numerics/roundHalfEven.ts';
import { plain } from './csvCell.ts';

const MINUS = '\u2212';
const THIN_SPACE = '\u2009';
const FIGURE_SPACE = '\u2007';
/** As wide as a point, so that cells without decimals keep their units place. */
const PUNCTUATION_SPACE = '\u2008';

/** A column as a page prints it. */
export interface PageColumn {
  /** The column is printed in units of 10^exponent; null where cells stand as they are. */
  readonly exponent: number | null;
  /** One text for each value: '' for blanks, padded so that points align when set flush right in tabular figures. */
  readonly cells: readonly string[];
}

/** A column is printed with a common power of ten when its largest value lies outside these powers. */
const CALM = { smallest: -3, largest: 6 } as const;
/** Cells below this power of ten get a power of their own, so that no row of zeros hides them. */
const SMALLEST_PLAIN = -5;

/**
 * The values of one column to `digits` significant digits, set for a page: real minus signs, thin spaces between
 * groups of three in long whole numbers, points aligned, one power of ten for the column where that is calmer.
 * Rounded from the values, not from the cells of the CSV.
 */
export function pageColumn(values: readonly (number | null)[], digits: number): PageColumn {
  const sizes = values.filter((v): v is number => v !== null && v !== 0).map((v) => roundHalfEven(v, digits).exponent);
  const largest = sizes.length === 0 ? 0 : Math.max(...sizes);
  const calm = largest <= CALM.largest && largest >= CALM.smallest;
  const exponent = calm ? null : largest;
  const texts = values.map((value) => (value === null ? '' : cellText(value, digits, exponent ?? 0)));
  const decimals = Math.max(0, ...texts.map(decimalPlaces));
  return { exponent, cells: texts.map((text) => pad(text, decimals)) };
}

/** One value to `digits` significant digits, set for a page; a power of ten where a plain number would be unwieldy. */
export function pageNumber(value: number, digits: number): string {
  const rounded = roundHalfEven(value, digits);
  const plainRange = rounded.exponent >= CALM.smallest - 1 && rounded.exponent <= CALM.largest + 1;
  return plainRange ? cellText(value, digits, 0) : withPower(value, digits, 0);
}

function cellText(value: number, digits: number, shift: number): string {
  const rounded = roundHalfEven(value, digits);
  const exponent = rounded.exponent - shift;
  if (value !== 0 && exponent < SMALLEST_PLAIN) return withPower(value, digits, shift);
  return (rounded.negative ? MINUS : '') + grouped(plain(rounded.digits, value === 0 ? 0 : exponent));
}

function withPower(value: number, digits: number, shift: number): string {
  const { negative, digits: text, exponent } = roundHalfEven(value, digits);
  const power = exponent - shift;
  return `${negative ? MINUS : ''}${plain(text, 0)}${THIN_SPACE}×${THIN_SPACE}10${superscript(power)}`;
}

/** Whole parts of five digits and more in groups of three. */
function grouped(text: string): string {
  const [whole = '', decimals] = text.split('.');
  const spaced = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE) : whole;
  return decimals === undefined ? spaced : `${spaced}.${decimals}`;
}

function decimalPlaces(text: string): number {
  const point = text.includes('×') ? -1 : text.indexOf('.');
  return point < 0 ? 0 : text.length - point - 1;
}

function pad(text: string, decimals: number): string {
  if (text === '' || text.includes('×') || decimals === 0) return text;
  const missing = decimals - decimalPlaces(text);
  return text + (text.includes('.') ? '' : PUNCTUATION_SPACE) + FIGURE_SPACE.repeat(missing);
}

const SUPERSCRIPTS: Readonly<Record<string, string>> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
};

/** A whole number as superscript characters. */
export function superscript(power: number): string {
  return [...String(power)].map((c) => SUPERSCRIPTS[c] ?? '').join('');
}
