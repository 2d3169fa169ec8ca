import { Decimal } from '../numerics/decimal.ts';
import { WrittenNumber } from './writtenNumber.ts';

/** What a number must be. Bounds are decimals. */
export interface NumberRule {
  /** What the number is, with its unit: "a number in km/s/Mpc". */
  readonly what: string;
  readonly least?: string;
  /** The least value itself is excluded. */
  readonly above?: string;
  readonly most?: string;
  /** A slip in the unit that explains a value out of bounds: what it looks like, and the factor that mends it. */
  readonly slip?: { readonly looksLike: string; readonly factor: string };
}

/** What was expected when `value` breaks the rule, with the probable correction; null when the value is right. */
export function whatNumber(value: unknown, rule: NumberRule): string | null {
  if (typeof value === 'string') return `${rule.what}${mendedText(value)}`;
  if (!(value instanceof WrittenNumber)) return rule.what;
  const number = value.decimal();
  if (number === null) return `${rule.what}, finite and in decimal digits`;
  return isWithin(number, rule) ? null : `${rule.what}${bounds(rule)}${mendedNumber(number, rule)}`;
}

/** Is the decimal within the rule's bounds? */
export function isWithin(number: Decimal, { least, above, most }: NumberRule): boolean {
  if (least !== undefined && number.compare(Decimal.parse(least)) < 0) return false;
  if (above !== undefined && number.compare(Decimal.parse(above)) <= 0) return false;
  return most === undefined || number.compare(Decimal.parse(most)) <= 0;
}

function bounds({ least, above, most }: NumberRule): string {
  const lower = least !== undefined ? [`at least ${least}`] : above !== undefined ? [`greater than ${above}`] : [];
  const both = [...lower, ...(most === undefined ? [] : [`at most ${most}`])];
  return both.length === 0 ? '' : `, ${both.join(' and ')}`;
}

function mendedNumber(number: Decimal, rule: NumberRule): string {
  if (rule.slip === undefined) return '';
  const mended = number.times(Decimal.parse(rule.slip.factor));
  return isWithin(mended, rule) ? `; this looks like ${rule.slip.looksLike}: write ${mended}` : '';
}

/** The usual ways to write a number as text, each with the number to write instead. */
function mendedText(text: string): string {
  const [, number = '', rest = ''] = /^\s*([-+]?[\d.,]+(?:[eE][-+]?\d+)?)(.*)$/.exec(text) ?? [];
  const point = number.replace(/,(?=\d+$)/, '.');
  if (!isDecimal(point)) return '';
  if (rest.trim() === '%') return `, no percentage: write ${Decimal.parse(point).times(Decimal.parse('0.01'))}`;
  if (rest !== '') return `, without further characters: write ${point}`;
  return number === point ? `, without quotes: write ${point}` : `, with a decimal point: write ${point}`;
}

function isDecimal(text: string): boolean {
  return new WrittenNumber(text).decimal() !== null;
}
