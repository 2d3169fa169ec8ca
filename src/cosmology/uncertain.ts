import type { Parameters, ScalarParameter } from './parameters.ts';

/** Parameters with their standard uncertainties and correlations, all as decimals. */
export interface UncertainParameters {
  readonly parameters: Parameters;
  /** Standard uncertainties; what has none is exact. */
  readonly uncertainties: Readonly<Partial<Record<ScalarParameter, string>>>;
  /** Correlation coefficients; a pair that is not listed is independent. */
  readonly correlations: readonly (readonly [ScalarParameter, ScalarParameter, string])[];
}

/** The parameters that have an uncertainty, in the order of the set. */
export function uncertainNames({ parameters, uncertainties }: UncertainParameters): readonly ScalarParameter[] {
  const names = Object.keys(parameters) as (keyof Parameters)[];
  return names.filter((name): name is ScalarParameter => name !== 'm_nu' && uncertainties[name] !== undefined);
}

/** Standard uncertainty of a parameter. */
export function uncertaintyOf({ uncertainties }: UncertainParameters, name: ScalarParameter): number {
  return Number(uncertainties[name] ?? 0);
}

/** The matrix of correlation coefficients of the given parameters, ones on the diagonal. */
export function correlationMatrix(
  { correlations }: UncertainParameters,
  names: readonly ScalarParameter[],
): readonly (readonly number[])[] {
  const between = (a: ScalarParameter, b: ScalarParameter) => {
    const entry = correlations.find(([one, other]) => (one === a && other === b) || (one === b && other === a));
    return Number(entry?.[2] ?? 0);
  };
  return names.map((row) => names.map((column) => (row === column ? 1 : between(row, column))));
}
