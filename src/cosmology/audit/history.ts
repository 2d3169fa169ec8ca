import type { Real } from '../../numerics/extended/real.ts';
import { shellVolume } from './geometry.ts';
import type { Model } from './model.ts';
import { type Span, sinceBigBang, span, untilInfinity } from './spans.ts';
import type { Turns } from './turns.ts';

/** Integrals of an epoch in c/H0 and 1/H0; null where they do not exist or were not asked for. */
export interface Moment {
  /** From today; null in the future. */
  readonly comoving: Real | null;
  readonly lookback: Real | null;
  /** Volume within that distance, (c/H0)^3. */
  readonly volume: Real | null;
  /** Since the Big Bang. */
  readonly age: Real | null;
  readonly conformalTime: Real | null;
  /** Conformal time that is left: to infinity, or through the maximum to the crunch. */
  readonly conformalFuture: Real | null;
}

/** Which of them are needed. */
export interface Needs {
  readonly fromToday: boolean;
  readonly volume: boolean;
  readonly sinceBigBang: boolean;
  readonly untilEnd: boolean;
}

/**
 * The integrals at the epochs 1 + z = places, in ascending order and none beyond a turning point. Gaps between
 * neighbours are integrated once and added up: from today outwards, from the Big Bang on, and from the end backwards.
 */
export function history(model: Model, turns: Turns, places: readonly Real[], needs: Needs): readonly Moment[] {
  const nothing = places.map(() => null);
  const any = needs.fromToday || needs.volume || needs.sinceBigBang || needs.untilEnd;
  const gaps = any ? places.slice(1).map((hi, k) => span(model, turns, places[k] as Real, hi)) : [];
  const past = needs.fromToday || needs.volume ? fromToday(model, turns, places, gaps) : nothing;
  const volumes = needs.volume ? volumesWithin(model, past) : nothing;
  const ages = needs.sinceBigBang ? fromBigBang(model, turns, places, gaps) : nothing;
  const left = needs.untilEnd ? untilEnd(model, turns, places, gaps) : nothing;
  return places.map((_, k) => ({
    comoving: past[k]?.comoving ?? null,
    lookback: past[k]?.time ?? null,
    volume: volumes[k] ?? null,
    age: ages[k]?.time ?? null,
    conformalTime: ages[k]?.comoving ?? null,
    conformalFuture: left[k] ?? null,
  }));
}

function fromToday(model: Model, turns: Turns, places: readonly Real[], gaps: readonly Span[]) {
  const today = model.arithmetic.real(1);
  let last: Span | null = null;
  return places.map((u, k): Span | null => {
    if (u.below(1)) return null;
    const gap: Span = last === null ? span(model, turns, today, u) : (gaps[k - 1] as Span);
    last = last === null ? gap : { comoving: last.comoving.plus(gap.comoving), time: last.time.plus(gap.time) };
    return last;
  });
}

function volumesWithin(model: Model, past: readonly (Span | null)[]) {
  let distance = model.arithmetic.real(0);
  let volume = distance;
  return past.map((here): Real | null => {
    if (here === null) return null;
    volume = volume.plus(shellVolume(model, distance, here.comoving));
    distance = here.comoving;
    return volume;
  });
}

type Ages = Readonly<Record<keyof Span, Real | null>>;

const plus = (a: Real | null, b: Real): Real | null => (a === null ? null : a.plus(b));

/** Conformal time and age at each place, added up from the earliest one on. */
function fromBigBang(model: Model, turns: Turns, places: readonly Real[], gaps: readonly Span[]): readonly Ages[] {
  const earliest = places[places.length - 1];
  if (earliest === undefined) return [];
  let age: Ages = sinceBigBang(model, turns, earliest);
  const ages = [age];
  for (const { comoving, time } of gaps.toReversed()) {
    age = { comoving: plus(age.comoving, comoving), time: plus(age.time, time) };
    ages.push(age);
  }
  return ages.reverse();
}

/**
 * Conformal time that is left at each place. A universe that recollapses passes the same scales on its way back, so
 * that what is left at the maximum is all the conformal time before it.
 */
function untilEnd(model: Model, turns: Turns, places: readonly Real[], gaps: readonly Span[]) {
  const latest = places[0];
  if (latest === undefined) return [];
  let left: Real | null;
  if (turns.maximum === null) {
    left = untilInfinity(model, latest);
  } else {
    // From here to the maximum, from there back to here, and from here to the crunch.
    const rise = span(model, turns, turns.maximum, latest).comoving;
    left = plus(sinceBigBang(model, turns, latest).comoving, rise.times(2));
  }
  const all = [left];
  for (const { comoving } of gaps) {
    left = plus(left, comoving);
    all.push(left);
  }
  return all;
}
