import { z } from 'zod';
import type { ScalarParameter } from '../cosmology/parameters.ts';
import { checkYaml } from './checkYaml.ts';
import { correlationProblems } from './correlations.ts';
import { decimal, list, mapping, text, word } from './fields.ts';
import type { NumberRule } from './numberRules.ts';
import { parameterProblems } from './parameterProblems.ts';
import { PARAMETER_RULES, SCALAR_PARAMETERS } from './parameterRules.ts';
import type { Checked, ParameterSet } from './types.ts';
import { WrittenNumber } from './writtenNumber.ts';
import type { YamlFile } from './yamlFile.ts';

const UNCERTAINTY: NumberRule = { what: 'a standard uncertainty', above: '0' };
const COEFFICIENT: NumberRule = { what: 'a correlation coefficient', least: '-1', most: '1' };

/** A number, or a number with its standard uncertainty. */
function parameter(name: ScalarParameter) {
  const pair = mapping({ value: decimal(PARAMETER_RULES[name]), u: decimal(UNCERTAINTY).optional() });
  return z.preprocess((given) => (isMapping(given) ? given : { value: given }), pair);
}

const parameterName = word(SCALAR_PARAMETERS);

const schema = mapping({
  title: text('a title, as the paper labels the set'),
  kind: word(['published', 'house', 'textbook']),
  source: mapping({
    citation: text('authors, year, journal'),
    doi: text('a DOI such as 10.1051/0004-6361/201833910')
      .regex(/^10\.\d{4,9}\/\S+$/, { error: 'a DOI such as 10.1051/0004-6361/201833910, without address before it' })
      .optional(),
    where: text('table and column of the paper').optional(),
  }),
  parameters: mapping({
    H0: parameter('H0'),
    Omega_m: parameter('Omega_m').optional(),
    omega_b: parameter('omega_b').optional(),
    omega_c: parameter('omega_c').optional(),
    Omega_k: parameter('Omega_k').optional(),
    Omega_DE: parameter('Omega_DE').optional(),
    w0: parameter('w0'),
    wa: parameter('wa'),
    T_CMB: parameter('T_CMB'),
    N_eff: parameter('N_eff'),
    m_nu: list(
      decimal(PARAMETER_RULES.m_nu),
      'a list of neutrino masses in eV: [0, 0, 0.06], or [] if all are massless',
    ),
  }),
  correlations: list(
    z.tuple([parameterName, parameterName, decimal(COEFFICIENT)], {
      error: 'two parameters and a coefficient: [H0, Omega_m, -0.99]',
    }),
    'a list such as [[H0, Omega_m, -0.99]]',
  ).optional(),
  note: text('free text').optional(),
});

/** Reads one parameter set; the id is its file's name. */
export function parameterSet(id: string, yaml: YamlFile): Checked<ParameterSet> {
  const { value, problems } = checkYaml(yaml, schema);
  const all = [...problems, ...parameterProblems(yaml), ...correlationProblems(yaml)];
  if (value === null || all.length > 0) return { value: null, problems: all };
  const { parameters, correlations = [], ...rest } = value;
  const { m_nu, ...scalars } = parameters;
  const given = Object.entries(scalars).filter(([, pair]) => pair !== undefined);
  const values = given.map(([name, pair]) => [name, pair?.value]);
  const withU = given.filter(([, pair]) => pair?.u !== undefined).map(([name, pair]) => [name, pair?.u]);
  const set = {
    id,
    ...rest,
    parameters: { ...Object.fromEntries(values), m_nu },
    uncertainties: Object.fromEntries(withU),
    correlations,
  };
  return { value: set, problems: [] };
}

function isMapping(value: unknown): boolean {
  return typeof value === 'object' && value !== null && !Array.isArray(value) && !(value instanceof WrittenNumber);
}
