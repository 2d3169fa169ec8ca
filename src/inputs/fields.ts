import { z } from 'zod';
import { type NumberRule, whatNumber } from './numberRules.ts';
import { expectedOneOf } from './suggest.ts';
import { WrittenNumber } from './writtenNumber.ts';

// Every message here says what was expected; `checkYaml` puts the place and the value received before it.

/** Words on one or more lines. `example` shows what may stand here. */
export function text(example: string) {
  return z
    .string({
      error: ({ input }) => (input instanceof WrittenNumber ? `text, so in quotes: "${input.source}"` : example),
    })
    .trim()
    .min(1, { error: example });
}

/** A decimal within the rule's bounds; yields its text as written. */
export function decimal(rule: NumberRule) {
  return z
    .custom<WrittenNumber>((value) => whatNumber(value, rule) === null, {
      error: ({ input }) => whatNumber(input, rule) ?? '',
    })
    .transform((written) => written.source);
}

/** A whole number within bounds, both included. */
export function wholeNumber(least: number, most: number) {
  const expected = `a whole number from ${least} to ${most}`;
  return z
    .custom<WrittenNumber>((value) => value instanceof WrittenNumber && isWholeWithin(value.source, least, most), {
      error: expected,
    })
    .transform((written) => Number(written.source));
}

/** One of a few words; yields the word. */
export function word<const Words extends readonly [string, ...string[]]>(words: Words) {
  return z.enum(words, { error: ({ input }) => expectedOneOf(spelling(input), words) });
}

/** An id or edition number, with or without quotes, that matches a pattern; yields its text as written. */
export function reference(pattern: RegExp, expected: string) {
  return z
    .custom<WrittenNumber | string>((value) => pattern.test(spelling(value)), { error: expected })
    .transform(spelling);
}

/** A list of values. `expected` says so in words. */
export function list<Item extends z.ZodType>(item: Item, expected: string) {
  return z.array(item, { error: expected });
}

/** A mapping with these keys and no others; unknown keys get one line of message each, in their order. */
export function mapping<Shape extends z.ZodRawShape>(shape: Shape) {
  const keys = Object.keys(shape);
  return z.strictObject(shape, {
    error: (issue) =>
      issue.code === 'unrecognized_keys'
        ? issue.keys.map((key) => expectedOneOf(key, keys)).join('\n')
        : `keys with values: ${keys.join(', ')}`,
  });
}

/** A calendar date. */
export const date = z.custom<string>((value) => typeof value === 'string' && isDate(value), {
  error: 'a date that exists, as year-month-day: 2026-12-15',
});

/** The characters of a word or number; empty for anything else. */
function spelling(value: unknown): string {
  if (value instanceof WrittenNumber) return value.source;
  return typeof value === 'string' ? value : '';
}

function isWholeWithin(source: string, least: number, most: number): boolean {
  return /^\d{1,9}$/.test(source) && Number(source) >= least && Number(source) <= most;
}

function isDate(value: string): boolean {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(value)) return false;
  const day = new Date(`${value}T00:00:00Z`);
  // 2026-02-30 would become 2 March.
  return !Number.isNaN(day.getTime()) && day.toISOString().startsWith(value);
}
