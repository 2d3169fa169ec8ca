import { type Document, isMap, isScalar, isSeq, LineCounter, type Node, type Pair, parseDocument } from 'yaml';
import { plainValue } from './plainValue.ts';
import type { Checked, Place } from './types.ts';
import { yamlProblem } from './yamlProblem.ts';

/** Keys and list positions that lead from the top of a file to a value. */
export type Path = readonly (string | number)[];

/** A mapping as it stands in a keeper's file: text, `WrittenNumber`, booleans, null, lists and mappings. */
export interface YamlFile {
  readonly file: string;
  readonly data: unknown;
  /** Place of the value at a path, or of its nearest part that the file does have. */
  placeOf(path: Path): Place;
  /** Place of the key itself. */
  placeOfKey(path: Path): Place;
}

/** Reads the text of one YAML file. Without a usable mapping at its top, the value is null and the problems say why. */
export function readYaml(file: string, text: string): Checked<YamlFile> {
  const lines = new LineCounter();
  const at = (offset: number): Place => {
    const { line, col } = lines.linePos(Math.min(offset, text.length));
    return { file, line: Math.max(line, 1), column: Math.max(col, 1) };
  };
  const parsed = parseDocument(text, { lineCounter: lines, prettyErrors: false, version: '1.2', schema: 'core' });
  const syntax = [...parsed.errors, ...parsed.warnings];
  if (syntax.length > 0)
    return { value: null, problems: syntax.map((e) => ({ ...at(e.pos[0]), ...yamlProblem(e, text) })) };
  const { contents } = parsed;
  if (contents === null || (isScalar(contents) && contents.value === null)) {
    return {
      value: null,
      problems: [{ ...at(0), wrong: 'the file is empty', expected: 'lines such as "title: ..."' }],
    };
  }
  if (!isMap(contents)) {
    const start = at(contents.range?.[0] ?? 0);
    const what = isSeq(contents) ? 'a list' : 'a single value';
    return {
      value: null,
      problems: [{ ...start, wrong: `the file holds ${what}`, expected: 'keys with values, such as "title: ..."' }],
    };
  }
  const { data, refused } = plainValue(contents);
  if (refused.length > 0) {
    return {
      value: null,
      problems: refused.map(({ offset, wrong, expected }) => ({ ...at(offset), wrong, expected })),
    };
  }
  return { value: { file, data, ...places(parsed, at) }, problems: [] };
}

function places(parsed: Document.Parsed, at: (offset: number) => Place) {
  const find = (path: Path, want: 'key' | 'value'): Place => {
    let node: unknown = parsed.contents;
    let found = at(0);
    path.forEach((step, depth) => {
      const pair = isMap(node) ? node.items.find(({ key }) => keyText(key) === String(step)) : undefined;
      const next = isSeq(node) && typeof step === 'number' ? node.items[step] : pair?.value;
      const shown = pair !== undefined && (want === 'key' || isEmpty(next)) ? pair.key : next;
      const isLast = depth === path.length - 1;
      const offset = offsetOf(isLast ? shown : (next ?? pair?.key));
      if (offset !== undefined) found = at(offset);
      node = next;
    });
    return found;
  };
  return { placeOf: (path: Path) => find(path, 'value'), placeOfKey: (path: Path) => find(path, 'key') };
}

function keyText(key: Pair['key']): string {
  return isScalar(key) ? (key.source ?? String(key.value)) : '';
}

/** A key without a value, as in "H0:"; pointing at the key is clearer than at the blank behind it. */
function isEmpty(node: unknown): boolean {
  return node === null || (isScalar(node) && node.value === null && (node.source ?? '') === '');
}

function offsetOf(node: unknown): number | undefined {
  return (node as Node | null | undefined)?.range?.[0];
}
