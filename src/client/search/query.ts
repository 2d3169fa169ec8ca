import type { SearchIndex } from '../../site/searchIndexTypes.ts';
import { belongsToName, type SetNames, setNames } from './setNames.ts';
import { STOP_WORDS } from './stopWords.ts';
import { type Token, tokens } from './tokens.ts';
import type { TypedNumber } from './typedNumber.ts';
import { keyOf, type Target, targetsOf, type Vocabulary, vocabulary } from './vocabulary.ts';

/** What a query asks for. */
export interface Query {
  /** Quantities, milestones and parameters called by a name of theirs, the longest names first come. */
  readonly targets: readonly Target[];
  /** Those names as typed. */
  readonly names: readonly string[];
  /** Numbers that can be redshifts: behind "z" or "at", or bare. */
  readonly redshifts: readonly TypedNumber[];
  /** Numbers that can be values: with a unit, or bare. A bare number without a named quantity is in both lists. */
  readonly values: readonly TypedNumber[];
  /** Whether every redshift stood behind "z", "at" or "redshift". */
  readonly marked: boolean;
  readonly edition: string | undefined;
  /** What remains: names of parameter sets, topics, grids, or words nobody knows. */
  readonly words: readonly string[];
}

/** What a query is read with; made once per index. */
export interface Reader {
  readonly vocabulary: Vocabulary;
  readonly names: SetNames;
  readonly editions: ReadonlySet<string>;
  readonly units: ReadonlySet<string>;
}

const MARKERS = new Set(['z', 'at', 'redshift']);
const LONGEST_UNIT = 3;

export function reader(index: SearchIndex): Reader {
  const things = [...index.columns, ...index.milestones, ...index.parameters];
  const words = vocabulary(index);
  return {
    vocabulary: words,
    names: setNames(index, words),
    editions: new Set(index.editions.map((edition) => edition.number)),
    units: new Set(things.map((thing) => unitKey(thing.unit)).filter((unit) => unit !== '')),
  };
}

/** "km/s/Mpc" -> "kmsmpc". */
export function unitKey(unit: string): string {
  return tokens(unit)
    .map((token) => token.term)
    .join('');
}

/** Reads a query from left to right; a name is taken as long as possible, so "luminosity distance" is not "distance". */
export function parseQuery(text: string, reader: Reader): Query {
  const list = tokens(text);
  const targets: Target[] = [];
  const names: string[] = [];
  const words: string[] = [];
  const marked: TypedNumber[] = [];
  const withUnit: TypedNumber[] = [];
  const loose: TypedNumber[] = [];
  let edition: string | undefined;
  for (let n = 0; n < list.length; ) {
    const token = list[n] as Token;
    if (token.value !== undefined) {
      const unit = unitBehind(list, n, reader);
      const number: TypedNumber = { text: token.text, value: token.value };
      if (reader.editions.has(token.text)) edition = token.text;
      else if (MARKERS.has(list[n - 1]?.text ?? '')) marked.push(number);
      else if (unit) withUnit.push({ ...number, unit: unit.key });
      else if (belongsToName(reader.names, list, n)) words.push(token.text);
      else loose.push(number);
      n += 1 + (unit?.length ?? 0);
    } else if (isFiller(list, n)) {
      n += 1;
    } else {
      const name = nameAt(list, n, reader.vocabulary);
      if (name) {
        targets.push(...name.targets);
        names.push(...list.slice(n, n + name.length).map(({ text }) => text));
      } else words.push(token.text);
      n += name?.length ?? 1;
    }
  }
  const readAsRedshift = targets.length === 0 || targets.some((target) => target.kind === 'column');
  const readAsValue = targets.every((target) => target.kind !== 'column') && marked.length === 0;
  return {
    targets,
    names,
    redshifts: readAsRedshift ? [...marked, ...loose] : marked,
    values: readAsValue ? [...withUnit, ...loose] : withUnit,
    marked: loose.length === 0,
    edition,
    words,
  };
}

/** Stop words, "redshift" before a number, and "a" unless it stands as the scale factor: last, or before a number. */
function isFiller(list: readonly Token[], n: number): boolean {
  const { text } = list[n] as Token;
  const next = list[n + 1];
  if (text === 'redshift') return next?.value !== undefined;
  if (text === 'a') return next !== undefined && next.value === undefined && !MARKERS.has(next.text);
  return STOP_WORDS.has(text);
}

/** The longest name that starts here. */
function nameAt(list: readonly Token[], n: number, { names, longest }: Vocabulary) {
  for (let length = Math.min(longest, list.length - n); length > 0; length--) {
    const run = list.slice(n, n + length);
    if (run.some((token) => token.value !== undefined)) continue;
    const called = names.get(keyOf(run.map((token) => token.term)));
    if (called) return { length, targets: targetsOf(called, run) };
  }
  return undefined;
}

/** The longest known unit behind the number at n. */
function unitBehind(list: readonly Token[], n: number, reader: Reader) {
  for (let length = LONGEST_UNIT; length > 0; length--) {
    const run = list.slice(n + 1, n + 1 + length);
    const key = run.map((token) => token.term).join('');
    if (run.length === length && reader.units.has(key)) return { key, length };
  }
  return undefined;
}
