import type { MilestoneName } from '../cosmology/milestones.ts';
import type { ParameterSet } from '../inputs/types.ts';
import { pageColumn, pageNumber } from '../tables/pageCells.ts';
import type { EditionTables } from '../tables/types.ts';
import { address } from './addresses.ts';
import { alignPoints } from './alignPoints.ts';
import { byKind, type KindGroup } from './kindText.ts';
import { derivedOf, milestone, milestonesOf, setsOf, tablesOf, valueAt } from './lookUp.ts';
import { isUnchecked } from './setCautions.ts';
import { setTitle } from './setTitle.ts';
import { realMinus } from './writtenNumber.ts';

/** One parameter set with the numbers people compare first. */
export interface GlanceRow {
  readonly title: string;
  readonly address: string;
  readonly unchecked: boolean;
  /** HTML, one for each span of GLANCE_HEADS. */
  readonly cells: readonly string[];
}

/** Heads of the columns: HTML symbol, unit, and words for those who listen; two spans hold a value and its uncertainty. */
export const GLANCE_HEADS = [
  { symbol: '<i>H</i><sub>0</sub>', unit: 'km s<sup>−1</sup> Mpc<sup>−1</sup>', name: 'Hubble constant', span: 2 },
  { symbol: 'Ω<sub>m</sub>', unit: '', name: 'matter density', span: 2 },
  { symbol: '<i>w</i><sub>0</sub>, <i>w<sub>a</sub></i>', unit: '', name: 'dark energy equation of state', span: 1 },
  { symbol: '<i>t</i><sub>0</sub>', unit: 'Gyr', name: 'age today', span: 1 },
  { symbol: '<i>z</i><sub>eq</sub>', unit: '', name: 'redshift of matter-radiation equality', span: 1 },
  { symbol: '<i>D<sub>M</sub></i>(1)', unit: 'Mpc', name: 'transverse comoving distance to z = 1', span: 1 },
  { symbol: '<i>t</i>(1)', unit: 'Gyr', name: 'age at z = 1', span: 1 },
] as const;

/** Digits of the computed numbers: enough to tell the sets apart. */
const DIGITS = 4;

/** The sets of an edition at a glance, by kind. */
export function glance(pressed: EditionTables): KindGroup<GlanceRow>[] {
  const sets = setsOf(pressed);
  const columns = [
    alignPoints(sets.map(({ parameters }) => parameters.H0)),
    sets.map(({ uncertainties }) => plusMinus(uncertainties.H0)),
    alignPoints(sets.map((set) => set.parameters.Omega_m ?? derivedMatter(pressed, set.id))),
    sets.map(({ uncertainties }) => plusMinus(uncertainties.Omega_m)),
    sets.map(equationOfState),
    column(sets, (set) => milestoneValue(pressed, set, 'age_today')),
    column(sets, (set) => milestoneValue(pressed, set, 'z_equality')),
    column(sets, (set) => valueAt(tablesOf(pressed, set.id, 'distances'), 'D_M_Mpc', 1)),
    column(sets, (set) => valueAt(tablesOf(pressed, set.id, 'times'), 't_Gyr', 1)),
  ];
  const rows = sets.map((set, i) => ({
    set,
    row: {
      title: setTitle(set),
      address: address.set(pressed.edition.number, set.id),
      unchecked: isUnchecked(set),
      cells: columns.map((cells) => cells[i] ?? ''),
    },
  }));
  return byKind(rows, ({ set }) => set).map(({ kind, members }) => ({ kind, members: members.map(({ row }) => row) }));
}

/** Blank for a cosmological constant. */
function equationOfState({ parameters: { w0, wa } }: ParameterSet): string {
  return Number(w0) === -1 && Number(wa) === 0 ? '' : `${realMinus(w0)}, ${realMinus(wa)}`;
}

/** Computed where physical densities stand for it. */
function derivedMatter(pressed: EditionTables, set: string): string {
  const matter = derivedOf(pressed, set).find(({ name }) => name === 'Omega_m');
  return matter ? pageNumber(Number(matter.value), DIGITS) : '';
}

function plusMinus(u: string | undefined): string {
  return u === undefined ? '' : `± ${u}`;
}

function milestoneValue(pressed: EditionTables, set: ParameterSet, name: MilestoneName): number | null {
  const value = milestone(milestonesOf(pressed, set.id), name)?.value;
  return typeof value === 'number' ? value : null;
}

function column(
  sets: readonly ParameterSet[],
  of: (set: ParameterSet) => number | null | undefined,
): readonly string[] {
  return pageColumn(
    sets.map((set) => of(set) ?? null),
    DIGITS,
  ).cells;
}
