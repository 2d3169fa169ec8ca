import { isMap, isScalar, isSeq, LineCounter, type ParsedNode, parseDocument } from 'yaml';
import { plainValue } from './plainValue.ts';
import type { Checked, Place, Problem } from './types.ts';
import { offsetInYaml, type Path } from './yamlPlaces.ts';
import { yamlProblem } from './yamlProblem.ts';

/** A mapping as it stands in a keeper's file. */
export interface YamlFile {
  readonly file: string;
  /** Text, `WrittenNumber`, booleans, null, lists and mappings. */
  readonly data: unknown;
  /** Place of the value at a path, or of its nearest part that the file does have. */
  placeOf(path: Path): Place;
  /** Place of the key itself. */
  placeOfKey(path: Path): Place;
}

/** Reads the text of one YAML file. Without a usable mapping at its top, the value is null and the problems say why. */
export function readYaml(file: string, text: string): Checked<YamlFile> {
  const lines = new LineCounter();
  const parsed = parseDocument(text, { lineCounter: lines, prettyErrors: false, version: '1.2', schema: 'core' });
  const at = (offset: number): Place => {
    const { line, col } = lines.linePos(Math.min(offset, text.length));
    return { file, line: Math.max(line, 1), column: Math.max(col, 1) };
  };
  const problem = (offset: number, wrong: string, expected: string) => ({ ...at(offset), wrong, expected });
  const refuse = (problems: readonly Problem[]) => ({ value: null, problems });

  const syntax = [...parsed.errors, ...parsed.warnings].map((e) => ({ ...at(e.pos[0]), ...yamlProblem(e, text) }));
  if (syntax.length > 0) return refuse(firstOfEachLine(syntax));
  const { contents } = parsed;
  if (!isMap(contents)) return refuse([problem(contents?.range?.[0] ?? 0, ...noMapping(contents))]);
  const { data, refused } = plainValue(contents);
  if (refused.length > 0) return refuse(refused.map(({ offset, wrong, expected }) => problem(offset, wrong, expected)));
  const value: YamlFile = {
    file,
    data,
    placeOf: (path) => at(offsetInYaml(contents, path, 'value')),
    placeOfKey: (path) => at(offsetInYaml(contents, path, 'key')),
  };
  return { value, problems: [] };
}

function noMapping(contents: ParsedNode | null): [wrong: string, expected: string] {
  if (contents === null || (isScalar(contents) && contents.value === null)) {
    return ['the file is empty', 'lines such as "title: ..."'];
  }
  const what = isSeq(contents) ? 'a list' : 'a single value';
  return [`the file holds ${what}`, 'keys with values, such as "title: ..."'];
}

/** One slip makes the parser stumble again and again over what follows in its line. */
function firstOfEachLine(problems: readonly Problem[]): Problem[] {
  return problems.filter(({ line }, index) => problems.findIndex((other) => other.line === line) === index);
}
