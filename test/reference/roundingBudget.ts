import type { Parameters, ScalarParameter } from '../../src/cosmology/parameters.ts';
import { ourValue } from '../../src/site/published/evaluateCheck.ts';
import type { Reading, What } from '../../src/site/published/sourceSchema.ts';

export interface Digits {
  readonly published: string;
  readonly ratioOf?: readonly [string, string] | undefined;
  readonly inputs: Parameters;
  readonly what: What;
}

export type Uncertainties = Readonly<Partial<Record<ScalarParameter, string | undefined>>>;

/** Half a unit of the last printed digit: 0.005 for "13.80", 50 for "1.2e3". */
export function halfUnit(printed: string): number {
  const [mantissa = '', power = '0'] = printed.toLowerCase().split('e');
  const decimals = mantissa.split('.')[1]?.length ?? 0;
  return Number(`0.5e${Number(power) - decimals}`);
}

/** How far the published value may lie from the one its authors had, by its digits alone. */
export function printedBudget({ published, ratioOf }: Digits): number {
  if (!ratioOf) return halfUnit(published);
  const relative = ratioOf.reduce((sum, row) => sum + halfUnit(row) / Math.abs(Number(row)), 0);
  return Math.abs(Number(published)) * relative;
}

/** How far our value may lie from that of the authors' inputs: the sum of what each rounded input makes, alone. */
export function inputBudget({ inputs, what }: Digits, rounded: readonly ScalarParameter[]): number {
  const ours = ourValue(inputs, what);
  const effect = (changed: Parameters, formula: What) => Math.abs(ourValue(changed, formula) - ours);
  const ofParameters = rounded.map((name) => {
    const text = inputs[name] ?? '';
    return Math.max(...moved(text).map((value) => effect({ ...inputs, [name]: value }, what)));
  });
  const ofRedshift = moved(redshiftOf(what)).map((z) => effect(inputs, atRedshift(what, z)));
  return ofParameters.reduce((sum, one) => sum + one, 0) + Math.max(0, ...ofRedshift);
}

/**
 * How far the mean of our value over a distribution may lie from its value at the means, to second order: half the sum
 * of |second derivative| u_i u_j over all pairs, whatever the correlations, from differences over one u.
 */
export function meanBudget(digits: Digits, uncertainties: Uncertainties): number {
  const { inputs, what } = digits;
  const all = Object.entries(uncertainties) as [ScalarParameter, string][];
  const at = (...steps: readonly (readonly [ScalarParameter, number])[]) =>
    ourValue({ ...inputs, ...Object.fromEntries(steps.map(([name, u]) => [name, sum(inputs[name], u)])) }, what);
  const curved = all.map(([name, u]) => at([name, +u]) - 2 * at() + at([name, -u]));
  const mixed = all.flatMap(([name, u], k) =>
    all
      .slice(k + 1)
      .map(
        ([other, v]) =>
          (at([name, +u], [other, +v]) -
            at([name, +u], [other, -v]) -
            at([name, -u], [other, +v]) +
            at([name, -u], [other, -v])) /
          2,
      ),
  );
  return [...curved, ...mixed].reduce((total, term) => total + Math.abs(term), 0) / 2;
}

function sum(text: string | undefined, step: number): string {
  return String(Number(text) + step);
}

/** A decimal half a unit of its last digit lower and higher; an exact 0 or a milestone does not move. */
function moved(text: string): string[] {
  if (!/[1-9]/.test(text) || /^[a-z]/i.test(text)) return [];
  return [Number(text) - halfUnit(text), Number(text) + halfUnit(text)].map(String);
}

function redshiftOf({ of }: What): string {
  return 'z' in of ? of.z : '0';
}

/** The same comparison with all columns at another redshift. */
function atRedshift({ of, ...rest }: What, z: string): What {
  const shifted = (reading: Reading): Reading => ('z' in reading ? { ...reading, z } : reading);
  return { ...rest, of: shifted(of) };
}
