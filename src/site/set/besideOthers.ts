import type { Parameters } from '../../cosmology/parameters.ts';
import type { ParameterSet } from '../../inputs/types.ts';
import { pageColumn, pageNumber } from '../../tables/pageCells.ts';
import type { EditionTables } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { renderFormula } from '../formula.ts';
import { derivedOf, milestone, milestonesOf, setsOf, tablesOf, valueAt } from '../lookUp.ts';
import { type ParameterLine, parameterLines } from '../parameterLines.ts';
import { PARAMETER_TEXT } from '../parameterText.ts';
import { setTitle } from '../setTitle.ts';

/** One set beside the others: equal values are ditto marks, so that the eye finds what differs. */
export interface BesideOthers {
  /** Heads: MathML and words. */
  readonly heads: readonly { readonly symbol: string; readonly name: string }[];
  /** The set itself first. */
  readonly rows: readonly { readonly title: string; readonly address: string; readonly cells: readonly string[] }[];
}

const DITTO = '″';
const DIGITS = 5;
const MATTER_DIGITS = 4;

export function besideOthers(pressed: EditionTables, own: ParameterSet): BesideOthers {
  const sets = [own, ...setsOf(pressed).filter(({ id }) => id !== own.id)];
  const lines = sets.map(parameterLines);
  const ids = (Object.keys(PARAMETER_TEXT) as (keyof Parameters)[]).filter((id) =>
    lines.some((some) => valueIn(some, id) !== valueIn(lines[0] ?? [], id)),
  );
  const ages = pageColumn(
    sets.map((set) => numberOrNull(milestone(milestonesOf(pressed, set.id), 'age_today')?.value)),
    DIGITS,
  ).cells;
  const distances = pageColumn(
    sets.map((set) => valueAt(tablesOf(pressed, set.id, 'distances'), 'D_M_Mpc', 1) ?? null),
    DIGITS,
  ).cells;
  return {
    heads: [
      ...ids.map((id) => ({ symbol: inline(PARAMETER_TEXT[id].symbol), name: PARAMETER_TEXT[id].name })),
      { symbol: inline('t_0'), name: 'Age today, Gyr' },
      { symbol: inline('D_M(1)'), name: 'Transverse comoving distance to z = 1, Mpc' },
    ],
    rows: sets.map((set, i) => ({
      title: setTitle(set),
      address: address.set(pressed.edition.number, set.id),
      cells: [
        ...ids.map((id) => {
          const value = valueIn(lines[i] ?? [], id);
          if (id === 'Omega_m' && value === '') return `<i>${derivedMatter(pressed, set)}</i>`;
          return cell(value, valueIn(lines[0] ?? [], id), i === 0);
        }),
        ages[i] ?? '',
        distances[i] ?? '',
      ],
    })),
  };
}

function cell(value: string, own: string, first: boolean): string {
  return !first && value !== '' && value === own ? DITTO : value;
}

function valueIn(lines: readonly ParameterLine[], id: keyof Parameters): string {
  return lines.find((line) => line.id === id)?.value ?? '';
}

function derivedMatter(pressed: EditionTables, { id }: ParameterSet): string {
  const matter = derivedOf(pressed, id).find(({ name }) => name === 'Omega_m');
  return matter ? pageNumber(Number(matter.value), MATTER_DIGITS) : '';
}

function numberOrNull(value: number | string | null | undefined): number | null {
  return typeof value === 'number' ? value : null;
}

function inline(latex: string): string {
  return renderFormula(latex, 'inline', 'src/site/parameterText.ts');
}
