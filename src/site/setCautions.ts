import type { ParameterSet } from '../inputs/types.ts';

/** Whether nobody has yet compared the values with the paper; the note of such a set says so. */
export function isUnchecked({ note }: ParameterSet): boolean {
  return /from memory/i.test(note ?? '');
}

const PALER =
  'Digits in paler ink are finer than the parameters warrant: they compare tables, they do not measure the sky.';

/** What is uncertain about the numbers of a set, in one or two sentences of HTML. */
export function uncertaintySentence({ parameters, uncertainties }: ParameterSet): string {
  if (Object.keys(uncertainties).length === 0) {
    return 'The set gives no uncertainties: its parameters are taken as exact, and no digit is paler.';
  }
  const u = uncertainties.H0;
  if (u === undefined) return PALER;
  const percent = (100 * Number(u)) / Number(parameters.H0);
  return `<i>H</i><sub>0</sub> is known to ${percent.toPrecision(1)} per cent. ${PALER}`;
}
