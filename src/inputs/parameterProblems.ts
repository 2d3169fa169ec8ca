import type { Decimal } from '../numerics/decimal.ts';
import { asMapping, type Mapping } from './asMapping.ts';
import { problemAt } from './checkYaml.ts';
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
  const source = asMapping<string>(set.source);
  if (set.kind !== 'published' || set.source === undefined) return [];
  const wanted = { doi: 'the DOI of the paper', where: 'table and column of the paper' };
  return Object.entries(wanted)
    .filter(([key]) => source[key] === undefined)
    .map(([key, what]) =>
      problemAt(yaml, ['source', key], `source.${key} is missing`, `${what}, as kind is published`),
    );
}

function densityProblems(yaml: YamlFile, parameters: Mapping<string>): Problem[] {
  const given = (name: string) => parameters[name] !== undefined;
  const at = (name: string, wrong: string, expected: string) => problemAt(yaml, ['parameters', name], wrong, expected);
  const problems: Problem[] = [];
  const physical = ['omega_b', 'omega_c'].filter(given);
  if (given('Omega_m') && physical.length > 0) {
    problems.push(
      at(
        'Omega_m',
        `matter is given twice: Omega_m and ${physical.join(', ')}`,
        'either Omega_m, or omega_b and omega_c',
      ),
    );
  } else if (!given('Omega_m') && physical.length === 1) {
    const missing = given('omega_b') ? 'omega_c' : 'omega_b';
    problems.push(at(missing, `parameters.${missing} is missing`, 'omega_b and omega_c together, or Omega_m instead'));
  } else if (!given('Omega_m') && physical.length === 0 && Object.keys(parameters).length > 0) {
    problems.push(at('Omega_m', 'the matter density is missing', 'Omega_m, or omega_b and omega_c'));
  }
  if (given('Omega_k') && given('Omega_DE')) {
    problems.push(
      at('Omega_DE', 'both Omega_k and Omega_DE are given', 'one of them: the other follows from the sum being 1'),
    );
  }
  return [...problems, ...neutrinoProblems(parameters, at)];
}

/** Massive neutrinos have their number and temperature from N_eff and T_CMB. */
function neutrinoProblems(
  parameters: Mapping<string>,
  at: (name: string, wrong: string, expected: string) => Problem,
): Problem[] {
  const { m_nu: masses } = parameters;
  if (!Array.isArray(masses) || !masses.some((mass) => decimalOf(mass)?.sign() === 1)) return [];
  return ['T_CMB', 'N_eff']
    .filter((name) => decimalOf(parameters[name])?.isZero())
    .map((name) => at(name, `${name} is 0, but m_nu has a mass`, `${name} greater than 0, or no masses: m_nu: []`));
}

/** The decimal of a number or of {value, u}; undefined if it is neither. */
function decimalOf(given: unknown): Decimal | undefined {
  const written = given instanceof WrittenNumber ? given : asMapping<'value'>(given).value;
  return (written instanceof WrittenNumber && written.decimal()) || undefined;
}
