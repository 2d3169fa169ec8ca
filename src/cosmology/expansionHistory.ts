import { CompensatedSum } from '../numerics/compensatedSum.ts';
import type { Background } from './background.ts';
import { earlyIntegrals, lateConformalTime } from './endsOfTime.ts';
import { span } from './span.ts';
import { type TurningPoints, turningPoints } from './turningPoints.ts';

/** Integrals of one epoch in units of 1/H0 and c/H0; null where they do not exist. */
export interface Moment {
  /** Since the Big Bang. */
  readonly age: number | null;
  readonly conformalTime: number | null;
  /** From this epoch until today; null for the future. */
  readonly lookback: number | null;
  readonly comoving: number | null;
  /** Conformal time that is left: to infinity or to the crunch. */
  readonly conformalFuture: number | null;
}

export interface History {
  /** One for each redshift asked for, in the same order; null for epochs that never come. */
  readonly moments: readonly (Moment | null)[];
  readonly turns: TurningPoints;
  /** Age at the largest expansion of a recollapsing model, in 1/H0. */
  readonly ageAtMaximum: number | null;
}

/** ln a of an epoch and of a turning point are the same if they differ by rounding only. */
const SAME = 4e-16;

const TODAY = 0;

/** Running totals at the ends of consecutive spans, starting from `start` at the first end. */
function runningTotals(start: number | null, spans: readonly number[]): readonly (number | null)[] {
  if (start === null) return [null, ...spans.map(() => null)];
  const total = new CompensatedSum(start);
  return [
    total.value,
    ...spans.map((value) => {
      total.add(value);
      return total.value;
    }),
  ];
}

/**
 * The integrals of the expansion at the given redshifts, in one sweep from row to row.
 *
 * Every gap between neighbouring epochs is integrated once; ages add the gaps up from the Big Bang, distances from
 * today outwards, horizons from the end of time backwards, so each total is a sum of positive terms and keeps full
 * relative accuracy near its own zero.
 *
 * Accuracy: 5e-15 relative, against test/reference.
 */
export function expansionHistory(model: Background, redshifts: readonly number[]): History {
  const turns = turningPoints(model);
  const last = turns.maximum ?? Number.POSITIVE_INFINITY;
  const placeOf = redshifts
    .map((z) => -Math.log1p(z))
    .map((s) => (Math.abs(s - last) <= SAME * Math.max(1, Math.abs(s)) ? last : s));
  const places = [...new Set([TODAY, ...placeOf.filter((s) => s <= last)])].sort((a, b) => a - b);
  const [first = TODAY, final = TODAY] = [places[0], places[places.length - 1]];
  const spans = places.slice(1).map((hi, k) => span(model, turns, places[k] ?? hi, hi));
  const [conformal, time] = [spans.map((s) => s.conformal), spans.map((s) => s.time)];

  const early = turns.bounce === undefined ? earlyIntegrals(model, first) : { conformal: null, time: null };
  const ages = runningTotals(early.time, time);
  const conformalTimes = runningTotals(early.conformal, conformal);
  const toMaximum = turns.maximum === undefined ? null : span(model, turns, final, turns.maximum);
  const end = (totals: readonly (number | null)[]) => totals[totals.length - 1] ?? null;
  const whole = toMaximum === null ? null : add(end(conformalTimes), toMaximum.conformal);
  const left = toMaximum === null ? lateConformalTime(model, final) : add(whole, toMaximum.conformal);
  const futures = runningTotals(left, [...conformal].reverse()).toReversed();

  const today = places.indexOf(TODAY);
  const sinceThen = (values: readonly number[]) => runningTotals(0, values.slice(0, today).reverse()).toReversed();
  const [lookbacks, distances] = [sinceThen(time), sinceThen(conformal)];
  const moments = places.map((_, k) => ({
    age: ages[k] ?? null,
    conformalTime: conformalTimes[k] ?? null,
    lookback: lookbacks[k] ?? null,
    comoving: distances[k] ?? null,
    conformalFuture: futures[k] ?? null,
  }));
  const rows = new Map(places.map((s, k) => [s, moments[k] ?? null]));
  return {
    moments: placeOf.map((s) => rows.get(s) ?? null),
    turns,
    ageAtMaximum: toMaximum === null ? null : add(end(ages), toMaximum.time),
  };
}

function add(a: number | null, b: number): number | null {
  return a === null ? null : a + b;
}
