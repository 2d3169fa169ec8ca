import type { RoundedDigits } from '../numerics/roundHalfEven.ts';
import { plain } from './csvCell.ts';
import { roundValue } from './roundValue.ts';

const MINUS = '\u2212';
const THIN_SPACE = '\u2009';
const FIGURE_SPACE = '\u2007';
/** As wide as a point, so that cells without decimals keep their units place. */
const PUNCTUATION_SPACE = '\u2008';

/** A column as a page prints it. */
export interface PageColumn {
  /** The column is printed in units of 10^exponent; null where cells stand as they are. */
  readonly exponent: number | null;
  /** Decimals to which the cells are padded. */
  readonly decimals: number;
  /** One text for each value: '' for blanks, padded so that points align when set flush right in tabular figures. */
  readonly cells: readonly string[];
}

/**
 * A column is printed with a common power of ten when its largest value lies outside these powers, and no cell would then
 * need a second power of its own.
 */
const CALM = { smallest: -3, largest: 6 } as const;
/** Cells below this power of ten get a power of their own, so that no row of zeros hides them. */
const SMALLEST_PLAIN = -5;

/**
 * The values of one column to `digits` significant digits, set for a page: real minus signs, thin spaces between
 * groups of three in long whole numbers, points aligned, one power of ten for the column where that is calmer.
 * Rounded from the values, or from the audit's texts by row where there are any; not from the cells of the CSV.
 */
export function pageColumn(
  values: readonly (number | null)[],
  digits: number,
  audited: ReadonlyMap<number, string> = new Map(),
): PageColumn {
  const rounded = values.map((value, row) => (value === null ? null : roundValue(value, audited.get(row), digits)));
  const sizes = rounded.filter((r) => r !== null && r.digits !== ZERO).map((r) => r?.exponent ?? 0);
  const largest = sizes.length === 0 ? 0 : Math.max(...sizes);
  const calm = largest <= CALM.largest && largest >= CALM.smallest;
  const sharing = Math.min(...sizes) - largest >= SMALLEST_PLAIN;
  const exponent = calm || !sharing ? null : largest;
  const texts = rounded.map((value) => (value === null ? '' : roundedCell(value, exponent ?? 0)));
  const decimals = Math.max(0, ...texts.map(decimalPlaces));
  return { exponent, decimals, cells: texts.map((text) => pad(text, decimals)) };
}

/** One value to `digits` significant digits, set for a page; a power of ten where a plain number would be unwieldy. */
export function pageNumber(value: number, digits: number, audited?: string): string {
  const rounded = roundValue(value, audited, digits);
  const plainRange = rounded.exponent >= CALM.smallest - 1 && rounded.exponent <= LARGEST_PLAIN;
  return plainRange ? roundedCell(rounded, 0) : roundedPower(rounded, 0);
}

/** Digits of a rounded zero. */
export const ZERO = '0';

/** Largest power of ten of a number that stands without a power of its own. */
export const LARGEST_PLAIN = CALM.largest;

/** Rounded digits in units of 10^shift, with a power of their own where a plain number would be unwieldy. */
function roundedCell(rounded: RoundedDigits, shift: number): string {
  const exponent = rounded.exponent - shift;
  const unwieldy = exponent < SMALLEST_PLAIN || exponent > LARGEST_PLAIN;
  return unwieldy && rounded.digits !== ZERO ? roundedPower(rounded, shift) : roundedPlain(rounded, shift);
}

/** Rounded digits in units of 10^shift, as a plain number. */
export function roundedPlain({ negative, digits, exponent }: RoundedDigits, shift: number): string {
  return (negative ? MINUS : '') + grouped(plain(digits, digits === ZERO ? 0 : exponent - shift));
}

/** Rounded digits in units of 10^shift, with a power of their own. */
export function roundedPower({ negative, digits, exponent }: RoundedDigits, shift: number): string {
  const power = superscript(exponent - shift);
  return `${negative ? MINUS : ''}${plain(digits, 0)}${THIN_SPACE}×${THIN_SPACE}10${power}`;
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

/** A cell padded on the right to so many decimals. */
export function pad(text: string, decimals: number): string {
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
