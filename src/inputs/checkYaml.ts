import type { z } from 'zod';
import type { Checked, Problem } from './types.ts';
import { WrittenNumber } from './writtenNumber.ts';
import type { YamlFile } from './yamlFile.ts';
import type { Path } from './yamlPlaces.ts';

/** Checks a file against a schema of `fields.ts`. Without a value there is at least one problem. */
export function checkYaml<Schema extends z.ZodType>(yaml: YamlFile, schema: Schema): Checked<z.output<Schema>> {
  const result = schema.safeParse(yaml.data);
  if (result.success) return { value: result.data, problems: [] };
  return { value: null, problems: result.error.issues.flatMap((issue) => problemsOf(yaml, issue)) };
}

/** A problem at a path of a file. */
export function problemAt(yaml: YamlFile, path: Path, wrong: string, expected: string): Problem {
  return { ...yaml.placeOf(path), wrong, expected };
}

function problemsOf(yaml: YamlFile, issue: z.core.$ZodIssue): Problem[] {
  const path = issue.path.map((step) => (typeof step === 'symbol' ? String(step) : step));
  if (issue.code === 'unrecognized_keys') {
    const expected = issue.message.split('\n');
    return issue.keys.map((key, i) => ({
      ...yaml.placeOfKey([...path, key]),
      wrong: `unknown key ${pathText([...path, key])}`,
      expected: expected[i] ?? '',
    }));
  }
  return [problemAt(yaml, path, received(yaml.data, path), issue.message)];
}

/** "parameters.H0 is missing", "values entry 3 is the text "x"". */
function received(data: unknown, path: Path): string {
  let value = data;
  for (const [depth, step] of path.entries()) {
    // A path may be longer than the file is deep: a lone number stands for {value: number}.
    if (!isContainer(value) || Array.isArray(value) !== (typeof step === 'number')) {
      return `${pathText(path.slice(0, depth))} is ${described(value)}`;
    }
    value = Object.hasOwn(value, step) ? value[step] : undefined;
    if (value === undefined) return `${pathText(path.slice(0, depth + 1))} is missing`;
  }
  return `${pathText(path)} is ${described(value)}`;
}

/** The value in words, for "... is ...". */
export function described(value: unknown): string {
  if (value instanceof WrittenNumber) return value.source;
  if (value === null || value === '') return 'empty';
  if (typeof value === 'string') return `the text "${value.length <= 60 ? value : `${value.slice(0, 57)}...`}"`;
  if (Array.isArray(value)) return value.length === 0 ? 'an empty list' : `a list of ${value.length}`;
  return typeof value === 'object' ? 'a mapping of keys' : String(value);
}

function isContainer(value: unknown): value is Record<string | number, unknown> {
  return typeof value === 'object' && value !== null && !(value instanceof WrittenNumber);
}

/** The path for people, list entries counted from 1. */
function pathText(path: Path): string {
  return path.reduce<string>((sofar, step) => {
    if (typeof step === 'number') return `${sofar} entry ${step + 1}`;
    return sofar === '' ? step : `${sofar}.${step}`;
  }, '');
}
