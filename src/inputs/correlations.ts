import { smallestEigenvalue } from '../numerics/smallestEigenvalue.ts';
import { asMapping, type Mapping } from './asMapping.ts';
import { problemAt } from './checkYaml.ts';
import { hasUnknownKeys, SCALAR_PARAMETERS } from './parameterRules.ts';
import type { Problem } from './types.ts';
import { WrittenNumber } from './writtenNumber.ts';
import type { YamlFile } from './yamlFile.ts';

/** Rounding of a smallest eigenvalue of 0 (a coefficient of exactly 1) stays far below this for ten parameters. */
const EIGENVALUE_ROUNDING = 1e-12;

interface Entry {
  readonly index: number;
  readonly names: readonly [string, string];
  readonly coefficient: number;
}

/**
 * What is wrong between the correlations of a set and with its parameters. Entries that are no [parameter, parameter,
 * coefficient] within [-1, 1] are the schema's business and are passed over here.
 */
export function correlationProblems(yaml: YamlFile): Problem[] {
  const set = asMapping<'parameters' | 'correlations'>(yaml.data);
  const list = Array.isArray(set.correlations) ? set.correlations : [];
  const entries = list.flatMap((entry, index) => asEntry(entry, index));
  const problems = [
    ...entries.flatMap((entry) => withoutUncertainty(yaml, asMapping(set.parameters), entry)),
    ...entries.flatMap((entry) => repeated(yaml, entries, entry)),
  ];
  // A matrix means nothing while an entry is wrong.
  return problems.length > 0 || entries.length < list.length ? problems : indefinite(yaml, entries);
}

function asEntry(entry: unknown, index: number): Entry[] {
  const [first, second, written] = Array.isArray(entry) && entry.length === 3 ? entry : [];
  const coefficient = written instanceof WrittenNumber ? written.decimal()?.toNumber() : undefined;
  const known: readonly unknown[] = SCALAR_PARAMETERS;
  if (!known.includes(first) || !known.includes(second)) return [];
  if (coefficient === undefined || Math.abs(coefficient) > 1) return [];
  return [{ index, names: [first, second], coefficient }];
}

function withoutUncertainty(yaml: YamlFile, parameters: Mapping<string>, { index, names }: Entry): Problem[] {
  const [first, second] = names;
  // The parameter may stand there under a wrong name, which is reported already.
  const unknownKeys = hasUnknownKeys(parameters);
  if (first === second) {
    const expected = 'two different parameters';
    return [problemAt(yaml, ['correlations', index], `${first} is correlated with itself`, expected)];
  }
  return names.flatMap((name, i) => {
    if (unknownKeys && parameters[name] === undefined) return [];
    if (asMapping<'u'>(parameters[name]).u !== undefined) return [];
    const wrong = `correlation of ${name}, which has no uncertainty`;
    return [problemAt(yaml, ['correlations', index, i], wrong, `parameters.${name} as {value: ..., u: ...}`)];
  });
}

function repeated(yaml: YamlFile, entries: readonly Entry[], { index, names }: Entry): Problem[] {
  const pair = pairKey(names);
  if (!entries.some((other) => other.index < index && pairKey(other.names) === pair)) return [];
  return [problemAt(yaml, ['correlations', index], `${names.join(' and ')} are correlated twice`, 'each pair once')];
}

function pairKey(names: readonly [string, string]): string {
  return names.toSorted().join(' ');
}

/** A matrix with a negative eigenvalue would give some combination of the parameters a negative variance. */
function indefinite(yaml: YamlFile, entries: readonly Entry[]): Problem[] {
  if (entries.length === 0) return [];
  const names = [...new Set(entries.flatMap((entry) => entry.names))];
  const matrix = names.map((row) => names.map((column) => (row === column ? 1 : coefficientOf(entries, row, column))));
  const smallest = smallestEigenvalue(matrix);
  if (smallest >= -EIGENVALUE_ROUNDING) return [];
  const wrong = `the correlation matrix of ${names.join(', ')} has the eigenvalue ${smallest.toPrecision(3)}`;
  const expected = 'no negative eigenvalue: check the signs, or give more digits';
  return [problemAt(yaml, ['correlations'], wrong, expected)];
}

function coefficientOf(entries: readonly Entry[], row: string, column: string): number {
  return entries.find(({ names }) => names.includes(row) && names.includes(column))?.coefficient ?? 0;
}
