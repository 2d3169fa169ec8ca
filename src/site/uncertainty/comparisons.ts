import type { ParameterSet } from '../../inputs/types.ts';
import { type ComparedValue, dependences, type Follows } from './dependences.ts';
import { type ImpliedCovariance, impliedCovariance } from './impliedCovariance.ts';
import { PRINTED_ROWS, type PrintedRows, type PrintedValue } from './printedRows.ts';

/** A published uncertainty beside the propagated one. */
export interface UncertaintyComparison {
  readonly set: ParameterSet;
  readonly of: ComparedValue;
  readonly status: PrintedRows['status'];
  /** As printed; for D_M worked out from the rows whose ratio it is. */
  readonly published: string;
  /** From the set as it is shipped. */
  readonly ours: number;
  /** What the rows that the correlations come from allow, each within half a unit of its last digit. */
  readonly from: number;
  readonly to: number;
  /** Whether the published value, within its own rounding, lies in that range. */
  readonly agrees: boolean;
}

/** Printed and propagated uncertainties of the sets whose papers print enough; sets that are not there are left out. */
export function uncertaintyComparisons(sets: readonly ParameterSet[]): readonly UncertaintyComparison[] {
  return PRINTED_ROWS.flatMap((rows) => {
    const set = sets.find(({ id }) => id === rows.set);
    return set === undefined ? [] : comparisonsOf(set, rows);
  });
}

function comparisonsOf(set: ParameterSet, rows: PrintedRows): readonly UncertaintyComparison[] {
  const { follows, distance } = dependences(set, rows);
  const covariances = withinRounding(set, rows);
  const compare = (of: ComparedValue, published: string, low: number, high: number): UncertaintyComparison[] => {
    const found = follows.get(of);
    if (found === undefined) return [];
    const range = covariances.map((covariance) => uncertainty(found, covariance));
    const [from, to] = [Math.min(...range), Math.max(...range)];
    return [{ set, of, status: rows.status, published, ours: found.ours, from, to, agrees: high >= from && low <= to }];
  };
  const printed = (of: ComparedValue, u: string) => compare(of, u, Number(u) - halfUnit(u), Number(u) + halfUnit(u));
  return [
    ...printed('Omega_m', rows.Omega_m.u),
    ...rows.derived.flatMap(({ of, u }) => printed(of, u)),
    ...(rows.recombination === undefined ? [] : ratioOf(rows.recombination, distance, compare)),
  ];
}

/** sound/angle: the paper says nothing of their correlation, so u may be anything from the difference to the sum. */
function ratioOf(
  { sound, angle }: NonNullable<PrintedRows['recombination']>,
  distance: number,
  compare: (of: ComparedValue, published: string, low: number, high: number) => UncertaintyComparison[],
): UncertaintyComparison[] {
  const [a, b] = [relative(sound), relative(angle)];
  const independent = Math.hypot(a, b) * distance;
  return compare('D_M', independent.toPrecision(2), Math.abs(a - b) * distance, (a + b) * distance);
}

/** The covariances that the rows allow: each uncertainty up or down by half a unit of its last digit, or as printed. */
function withinRounding(set: ParameterSet, { Omega_m, tight }: PrintedRows): readonly ImpliedCovariance[] {
  const H0 = { value: set.parameters.H0, u: set.uncertainties.H0 ?? '0' };
  const ends = [-1, 0, 1];
  return ends.flatMap((a) =>
    ends.flatMap((b) =>
      ends.map((c) =>
        impliedCovariance({
          h: relative(H0, a),
          Omega_m: relative(Omega_m, b),
          tight: relative(tight, c),
          power: tight.power,
        }),
      ),
    ),
  );
}

function uncertainty({ x, y }: Follows, { xx, xy, yy }: ImpliedCovariance): number {
  return Math.sqrt(Math.max(0, x * x * xx + 2 * x * y * xy + y * y * yy));
}

/** u over the value, with u moved by so many halves of its last digit. */
function relative({ value, u }: PrintedValue, halves = 0): number {
  return (Number(u) + halves * halfUnit(u)) / Number(value);
}

/** Half a unit of the last printed digit. */
function halfUnit(text: string): number {
  const decimals = text.split('.')[1]?.length ?? 0;
  return Number(`0.5e-${decimals}`);
}
