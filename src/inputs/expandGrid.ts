import { Decimal } from '../numerics/decimal.ts';
import { problemAt } from './checkYaml.ts';
import { type Segment, segmentSteps } from './segmentSteps.ts';
import type { Problem } from './types.ts';
import type { YamlFile } from './yamlFile.ts';

/** More rows in one table would help nobody; a step written too small reaches this at once. */
export const MOST_REDSHIFTS = 100_000;

/**
 * The redshifts of a grid in ascending order: its segments, joined without doubles (a join keeps its first writing),
 * and the single values in their places, as written.
 */
export function expandGrid(
  yaml: YamlFile,
  segments: readonly Segment[],
  values: readonly string[],
): { redshifts: Decimal[]; problems: Problem[] } {
  const joined = joinSegments(yaml, segments);
  const singles = values.map((value) => Decimal.parse(value));
  const problems = [...joined.problems, ...valueProblems(yaml, singles, joined.redshifts)];
  const redshifts = [...joined.redshifts, ...singles].sort((a, b) => a.compare(b));
  if (problems.length === 0 && redshifts.length === 0) {
    problems.push(problemAt(yaml, [], 'the grid has no redshifts', 'segments, or values, or both'));
  }
  return { redshifts, problems };
}

function joinSegments(yaml: YamlFile, segments: readonly Segment[]): { redshifts: Decimal[]; problems: Problem[] } {
  const redshifts: Decimal[] = [];
  const problems: Problem[] = [];
  for (const [index, segment] of segments.entries()) {
    const report = (key: keyof Segment, wrong: string, expected: string) =>
      problems.push(problemAt(yaml, ['segments', index, key], wrong, expected));
    const last = redshifts.at(-1);
    const order = last === undefined ? 1 : Decimal.parse(segment.from).compare(last);
    if (order < 0) report('from', `the segment starts at ${segment.from}, below the one before`, `at least ${last}`);
    const steps = segmentSteps(segment, MOST_REDSHIFTS - redshifts.length);
    if ('wrong' in steps) report(steps.key, steps.wrong, steps.expected);
    else redshifts.push(...steps.redshifts.slice(order === 0 ? 1 : 0));
  }
  return { redshifts, problems };
}

function valueProblems(yaml: YamlFile, values: readonly Decimal[], inSegments: readonly Decimal[]): Problem[] {
  const taken = new Set(inSegments.map(withoutTrailingZeros));
  return values.flatMap((value, index) => {
    const before = values[index - 1];
    const order = before === undefined ? 1 : value.compare(before);
    const report = (wrong: string, expected: string) => [problemAt(yaml, ['values', index], wrong, expected)];
    if (order < 0) return report(`${value} comes after ${before}`, 'redshifts in ascending order');
    if (order === 0) return report(`${value} is given twice`, 'each redshift once');
    return taken.has(withoutTrailingZeros(value))
      ? report(`${value} is already in a segment`, 'each redshift once')
      : [];
  });
}

function withoutTrailingZeros(redshift: Decimal): string {
  const text = redshift.toString();
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}
