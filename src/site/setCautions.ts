import type { ParameterSet } from '../inputs/types.ts';

/** Whether nobody has yet compared the values with the paper; the note of such a set says so. */
export function isUnchecked({ note }: ParameterSet): boolean {
  return /from memory/i.test(note ?? '');
}

/** What is uncertain about the parameters of a set, in one sentence of HTML. */
export function uncertaintySentence({ parameters, uncertainties }: ParameterSet): string {
  const u = uncertainties.H0;
  if (u === undefined) {
    return Object.keys(uncertainties).length > 0
      ? 'The parameters are uncertain; the digits printed are those of the values as given.'
      : 'The parameters are taken as exact.';
  }
  const percent = (100 * Number(u)) / Number(parameters.H0);
  return (
    `<i>H</i><sub>0</sub> is known to ${percent.toPrecision(1)} per cent: digits beyond that compare ` +
    'tables, they do not measure the sky.'
  );
}
