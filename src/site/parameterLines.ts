import type { Parameters } from '../cosmology/parameters.ts';
import type { ParameterSet } from '../inputs/types.ts';
import { renderFormula } from './formula.ts';
import { PARAMETER_TEXT } from './parameterText.ts';
import { unitHtml } from './unitText.ts';
import { realMinus } from './writtenNumber.ts';

/** One parameter of a set, ready to print; all parts are HTML. */
export interface ParameterLine {
  readonly id: keyof Parameters;
  readonly symbol: string;
  readonly name: string;
  readonly value: string;
  /** Standard uncertainty; "" if the value is taken as exact. */
  readonly u: string;
  readonly unit: string;
}

/** The parameters a set gives, in order of printing. */
export function parameterLines({ parameters, uncertainties }: ParameterSet): ParameterLine[] {
  const ids = Object.keys(PARAMETER_TEXT) as (keyof Parameters)[];
  return ids.flatMap((id) => {
    const value = parameters[id];
    if (value === undefined) return [];
    const { symbol, name, unit } = PARAMETER_TEXT[id];
    const u = id === 'm_nu' ? undefined : uncertainties[id];
    return [
      {
        id,
        symbol: parameterSymbol(symbol),
        name,
        value: valueHtml(value),
        u: u === undefined ? '' : realMinus(u),
        unit: unitHtml(unit),
      },
    ];
  });
}

function valueHtml(value: string | readonly string[]): string {
  if (typeof value === 'string') return realMinus(value);
  return value.length === 0 ? 'all massless' : value.map(realMinus).join(', ');
}

function parameterSymbol(latex: string): string {
  return renderFormula(latex, 'inline', 'src/site/parameterText.ts');
}
