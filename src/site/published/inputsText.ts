import type { Parameters } from '../../cosmology/parameters.ts';
import { renderFormula } from '../formula.ts';
import { PARAMETER_TEXT } from '../parameterText.ts';
import { unitHtml } from '../unitText.ts';
import { realMinus } from '../writtenNumber.ts';

/** What a plain model leaves unsaid: a cosmological constant. */
const USUAL: Readonly<Partial<Record<keyof Parameters, string>>> = { w0: '-1', wa: '0' };
const OF_RADIATION: readonly (keyof Parameters)[] = ['T_CMB', 'N_eff', 'm_nu'];

/** The parameters of a model in one line of HTML, those left out that say nothing. */
export function inputsText(parameters: Parameters): string {
  const dry = Number(parameters.T_CMB) === 0;
  const names = (Object.keys(PARAMETER_TEXT) as (keyof Parameters)[]).filter(
    (name) =>
      parameters[name] !== undefined && parameters[name] !== USUAL[name] && !(dry && OF_RADIATION.includes(name)),
  );
  return [...names.map((name) => equation(name, parameters[name] ?? '')), ...(dry ? ['no radiation'] : [])].join(', ');
}

function equation(name: keyof Parameters, value: string | readonly string[]): string {
  if (typeof value !== 'string' && value.length === 0) return 'massless neutrinos';
  const { symbol, unit } = PARAMETER_TEXT[name];
  const text = typeof value === 'string' ? realMinus(value) : value.join(' + ');
  const mathml = renderFormula(symbol, 'inline', 'src/site/parameterText.ts');
  return `<span class="tied">${mathml} = ${text}${unit === '' ? '' : ` ${unitHtml(unit)}`}</span>`;
}
