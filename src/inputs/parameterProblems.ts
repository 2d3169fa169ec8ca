import type { Parameters } from '../cosmology/parameters.ts';
import type { Decimal } from '../numerics/decimal.ts';
import { asMapping, type Mapping } from './asMapping.ts';
import { problemAt } from './checkYaml.ts';
import { hasUnknownKeys } from './parameterRules.ts';
import type { Problem } from './types.ts';
import { WrittenNumber } from './writtenNumber.ts';
import type { YamlFile } from './yamlFile.ts';

/**
 * What is wrong between the keys of one parameter set. Works on the file as it stands, so that these problems are
 * reported together with those of the single keys; a key that is itself wrong is passed over here.
 */
export function parameterProblems(yaml: YamlFile): Problem[] {
  const set = asMapping<'kind' | 'source' | 'parameters'>(yaml.data);
  return [...sourceProblems(yaml, set), ...densityProblems(yaml, asMapping(set.parameters))];
}

/** A published number must be found again in its paper. */
function sourceProblems(yaml: YamlFile, set: { kind?: unknown; source?: unknown }): Problem[] {
  const source = asMapping(set.source);
  if (set.kind !== 'published' || set.source === undefined) return [];
  const wanted = { doi: 'the DOI of the paper', where: 'table and column of the paper' };
  return Object.entries(wanted)
    .filter(([key]) => source[key] === undefined)
    .map(([key, what]) =>
      problemAt(yaml, ['source', key], `source.${key} is missing`, `${what}, as kind is published`),
    );
}

type Given = Mapping<keyof Parameters>;
type Report = (name: string, wrong: string, expected: string) => Problem;

function densityProblems(yaml: YamlFile, parameters: Given): Problem[] {
  const report: Report = (name, wrong, expected) => problemAt(yaml, ['parameters', name], wrong, expected);
  const problems = [...matterProblems(parameters, report), ...neutrinoProblems(parameters, report)];
  if (parameters.Omega_k === undefined || parameters.Omega_DE === undefined) return problems;
  const expected = 'one of them: the other follows from the sum being 1';
  return [...problems, report('Omega_DE', 'both Omega_k and Omega_DE are given', expected)];
}

function matterProblems(parameters: Given, report: Report): Problem[] {
  const physical = (['omega_b', 'omega_c'] as const).filter((name) => parameters[name] !== undefined);
  const [only] = physical;
  if (parameters.Omega_m !== undefined) {
    if (only === undefined) return [];
    const wrong = `matter is given twice: Omega_m and ${physical.join(', ')}`;
    return [report('Omega_m', wrong, 'either Omega_m, or omega_b and omega_c')];
  }
  // What is missing may stand there under a wrong name, which is reported already.
  if (physical.length === 2 || hasUnknownKeys(parameters) || Object.keys(parameters).length === 0) return [];
  if (only === undefined)
    return [report('Omega_m', 'the matter density is missing', 'Omega_m, or omega_b and omega_c')];
  const missing = only === 'omega_b' ? 'omega_c' : 'omega_b';
  return [report(missing, `parameters.${missing} is missing`, 'omega_b and omega_c together, or Omega_m instead')];
}

/** Massive neutrinos have their number and temperature from N_eff and T_CMB. */
function neutrinoProblems(parameters: Given, report: Report): Problem[] {
  const { m_nu: masses } = parameters;
  if (!Array.isArray(masses) || !masses.some((mass) => decimalOf(mass)?.sign() === 1)) return [];
  return (['T_CMB', 'N_eff'] as const)
    .filter((name) => decimalOf(parameters[name])?.isZero())
    .map((name) => report(name, `${name} is 0, but m_nu has a mass`, `${name} greater than 0, or no masses: m_nu: []`));
}

/** The decimal of a number or of {value, u}; undefined if it is neither. */
function decimalOf(given: unknown): Decimal | undefined {
  const written = given instanceof WrittenNumber ? given : asMapping<'value'>(given).value;
  return (written instanceof WrittenNumber && written.decimal()) || undefined;
}
