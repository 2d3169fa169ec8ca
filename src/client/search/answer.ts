import type { IndexedColumn } from '../../site/searchIndexTypes.ts';
import { realMinus } from '../../site/writtenNumber.ts';
import { targetsByWords } from './findByWords.ts';
import type { Hit } from './hit.ts';
import type { Library } from './library.ts';
import { quantityHits, setHits, tableHits } from './pageHits.ts';
import { parseQuery, type Query } from './query.ts';
import { type Rows, rowHits } from './rowHits.ts';
import { type Scope, scopeOf } from './scope.ts';
import { matchingValues, namedValues } from './valueHits.ts';
import type { Target } from './vocabulary.ts';

export interface Answer {
  /** How the query was read: "Luminosity distance, z = 0.5, planck". Empty if nothing was recognised. */
  readonly reading: string;
  readonly notes: readonly string[];
  /** The best first. */
  readonly hits: readonly Hit[];
}

const NOTHING: Answer = { reading: '', notes: [], hits: [] };

/** Answers a query: rows for redshifts, values for milestones and parameters, pages for names. */
export function answer(text: string, library: Library): Answer {
  const query = parseQuery(text, library.reader);
  const scope = scopeOf(library, query);
  if (!scope) return NOTHING;
  const named = query.targets.length > 0;
  const targets = named ? query.targets : describedTargets(library, scope);
  const unknown = named || targets.length === 0 ? scope.unknown : [];
  const found = query.redshifts.length + query.values.length > 0 ? byNumber : byName;
  const { hits, notes } = found(library, scope, query, targets);
  return {
    reading: reading(library, targets, query, scope),
    notes: [...notes, ...unknown.map((word) => `Nothing here is called “${word}”.`)],
    hits: distinct(hits),
  };
}

/** What no name of a quantity said is looked for in their descriptions: "horizon today", of which "horizon" is a topic too. */
function describedTargets(library: Library, scope: Scope): readonly Target[] {
  if (scope.unknown.length === 0) return [];
  const withTopics = targetsByWords(library, [...scope.topicWords, ...scope.unknown]);
  return withTopics.length > 0 ? withTopics : targetsByWords(library, scope.unknown);
}

/**
 * Rows before values, because a number is more often a redshift than a value looked up; but a bare number that no grid
 * has ("67.36") and that is somewhere the value of something is taken for that first.
 */
function byNumber(library: Library, scope: Scope, query: Query, targets: readonly Target[]): Rows {
  const columns = columnsAmong(library, targets);
  const inTables = columns.filter(({ topic }) => topic !== undefined);
  const rows = query.redshifts.map((redshift) => rowHits(scope, inTables, redshift));
  const onRows = rows.flatMap(({ hits }) => hits);
  const notes = rows.flatMap((row) => row.notes);
  const values = query.values.flatMap((typed) => matchingValues(library.index, scope, targets, typed));
  const valuesFirst = !query.marked && columns.length === 0 && values.length > 0 && notes.length > 0;
  const hits = valuesFirst ? [...values, ...onRows] : [...onRows, ...values];
  return { hits: [...hits, ...quantityHits(columns)], notes };
}

/** Named values of the first set, or of all named sets, then the pages and tables, then the values of the other sets. */
function byName(library: Library, scope: Scope, _query: Query, targets: readonly Target[]): Rows {
  const { named } = scope;
  const columns = columnsAmong(library, targets);
  const [first = [], ...others] = scope.sets.map((set) => namedValues(library.index, scope, set, targets));
  const rest = others.flat();
  const printed = [...new Set(columns.flatMap(({ topic }) => topic ?? []))];
  const topics = columns.length > 0 ? printed : scope.topics;
  const tables = columns.length > 0 || named.topics || named.grids ? tableHits(scope, topics) : [];
  const sets = named.sets ? setHits(scope) : [];
  const pages = [...quantityHits(columns), ...tables];
  const values = named.sets ? [...first, ...rest] : first;
  const hits = targets.length > 0 ? [...values, ...pages, ...sets] : [...sets, ...pages];
  return { hits: named.sets ? hits : [...hits, ...rest], notes: [] };
}

function columnsAmong({ index }: Library, targets: readonly Target[]): IndexedColumn[] {
  return targets.flatMap(({ kind, at }) => (kind === 'column' ? [index.columns[at] as IndexedColumn] : []));
}

/** Things asked for by one name are all given; the reading names them while they are few. */
const FEW = 2;

function reading({ index }: Library, targets: readonly Target[], query: Query, scope: Scope): string {
  const columnsOnly = query.redshifts.length > 0 && targets.some(({ kind }) => kind === 'column');
  const titles = targets.flatMap(({ kind, at }) => {
    if (columnsOnly && kind !== 'column') return [];
    const things = { column: index.columns, milestone: index.milestones, parameter: index.parameters }[kind];
    return things[at]?.title ?? [];
  });
  const different = [...new Set(titles)];
  const names = different.length <= FEW || query.names.length === 0 ? different.slice(0, FEW) : query.names;
  const redshifts = query.redshifts.map(({ text }) => `z = ${realMinus(text)}`);
  const edition = query.edition === undefined ? [] : [`edition ${query.edition}`];
  const joined = names === query.names ? names.join(' ') : names.join(' or ');
  return [joined, ...redshifts, scope.known.join(' '), ...edition].filter((part) => part !== '').join(', ');
}

function distinct(hits: readonly Hit[]): Hit[] {
  const seen = new Set<string>();
  return hits.filter(({ href, title }) => {
    const key = `${href} ${title}`;
    return !seen.has(key) && seen.add(key);
  });
}
