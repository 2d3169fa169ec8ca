import { Decimal } from '../numerics/decimal.ts';
import { problemAt } from './checkYaml.ts';
import type { Problem } from './types.ts';
import type { YamlFile } from './yamlFile.ts';

/** A table page with more rows than this would help nobody; a step written too small reaches it at once. */
const MOST_REDSHIFTS = 100_000;

export interface Segment {
  readonly from: string;
  readonly to: string;
  readonly step: string;
}

/**
 * The redshifts of a grid in ascending order: the segments step by step in exact decimal arithmetic, both ends
 * included and written with the most decimals of its three numbers, joined without doubles (a join keeps its first
 * writing), and the single values in their places, as written.
 */
export function expandGrid(
  yaml: YamlFile,
  segments: readonly Segment[],
  values: readonly string[],
): { redshifts: Decimal[]; problems: Problem[] } {
  const problems: Problem[] = [];
  const report = (path: (string | number)[], wrong: string, expected: string) =>
    problems.push(problemAt(yaml, path, wrong, expected));

  const redshifts: Decimal[] = [];
  for (const [index, segment] of segments.entries()) {
    const last = redshifts.at(-1);
    const from = Decimal.parse(segment.from);
    if (last !== undefined && from.compare(last) < 0) {
      report(
        ['segments', index, 'from'],
        `the segment starts at ${from}, below the end of the one before`,
        `at least ${last}`,
      );
    }
    const steps = stepsOf(segment, MOST_REDSHIFTS - redshifts.length);
    if ('wrong' in steps) report(['segments', index, steps.key], steps.wrong, steps.expected);
    else redshifts.push(...(last?.compare(from) === 0 ? steps.redshifts.slice(1) : steps.redshifts));
  }
  const inSegments = new Set(redshifts.map(withoutTrailingZeros));
  const singles = values.map((value) => Decimal.parse(value));
  for (const [index, value] of singles.entries()) {
    const before = singles[index - 1];
    if (before !== undefined && value.compare(before) <= 0) {
      const wrong = value.compare(before) === 0 ? `${value} is given twice` : `${value} comes after ${before}`;
      report(['values', index], wrong, 'redshifts in ascending order, each once');
    } else if (inSegments.has(withoutTrailingZeros(value))) {
      report(['values', index], `${value} is already in a segment`, 'each redshift once');
    }
  }
  if (problems.length === 0 && redshifts.length + singles.length === 0) {
    report([], 'the grid has no redshifts', 'segments, or values, or both');
  }
  return { redshifts: [...redshifts, ...singles].sort((a, b) => a.compare(b)), problems };
}

type Steps = { redshifts: Decimal[] } | { key: keyof Segment; wrong: string; expected: string };

function stepsOf(segment: Segment, most: number): Steps {
  const [step, to] = [Decimal.parse(segment.step), Decimal.parse(segment.to)];
  // Adding a zero with the decimals of `to` gives `from` those decimals.
  const from = Decimal.parse(segment.from).plus(to.minus(to)).plus(step.minus(step));
  if (from.compare(to) >= 0)
    return { key: 'to', wrong: `the segment ends at ${to}`, expected: `more than its start, ${from}` };
  const count = to.minus(from).toNumber() / step.toNumber();
  if (count >= most) {
    return {
      key: 'step',
      wrong: `step ${step} makes about ${count.toPrecision(2)} redshifts`,
      expected: `at most ${MOST_REDSHIFTS} in a grid`,
    };
  }
  const redshifts: Decimal[] = [];
  let z = from;
  for (; z.compare(to) <= 0; z = z.plus(step)) redshifts.push(z);
  const last = redshifts.at(-1) ?? from;
  if (last.compare(to) === 0) return { redshifts };
  return {
    key: 'step',
    wrong: `step ${step} does not lead from ${segment.from} to ${segment.to}`,
    expected: `a step that divides the segment: near its end are ${last} and ${z}`,
  };
}

function withoutTrailingZeros(redshift: Decimal): string {
  const text = redshift.toString();
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}
