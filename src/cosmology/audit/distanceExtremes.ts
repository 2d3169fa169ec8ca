import type { Real } from '../../numerics/extended/real.ts';
import { root } from '../../numerics/extended/root.ts';
import { expansionSquared } from './contents.ts';
import { signedTransverse, transverseSlope } from './geometry.ts';
import type { Model } from './model.ts';
import { span } from './spans.ts';
import type { Turns } from './turns.ts';

/** A place on the way back in time. */
interface Place {
  /** 1 + z. */
  readonly u: Real;
  /** Comoving distance from today, c/H0. */
  readonly comoving: Real;
}

/** Steps in ln(1+z), and how far they go: no crossing lies beyond e^60 in any universe with a past like ours. */
const STEP = 1 / 8;
const FARTHEST = 60;
/** A fall below zero by less is rounding: some functions only approach zero. */
const ROUNDING = 1e-25;

/**
 * The first place going back in time where f, of order 1, falls through zero; null where it never does. Each step
 * integrates from the last place where f was positive.
 */
function firstFall(model: Model, { bounce }: Turns, f: (place: Place) => Real): Place | null {
  const { arithmetic } = model;
  const noTurns = { bounce, maximum: null };
  const end = bounce === null ? FARTHEST : Math.min(FARTHEST, Math.log(bounce.toNumber()));
  let last: Place = { u: arithmetic.real(1), comoving: arithmetic.real(0) };
  for (let step = 1; step * STEP < end; step++) {
    const from = last;
    const place = (u: Real): Place => ({ u, comoving: from.comoving.plus(span(model, noTurns, from.u, u).comoving) });
    const next = place(arithmetic.real(step * STEP).exp());
    const value = f(next);
    if (value.below(-ROUNDING)) return place(root(arithmetic, (u) => f(place(u)), from.u, next.u));
    if (value.sign() > 0) last = next;
  }
  return null;
}

/** Where a comoving source recedes at the speed of light today: D_C = c/H0. */
export function recessionAtLightSpeed(model: Model, turns: Turns): Place | null {
  return firstFall(model, turns, ({ comoving }) => comoving.negated().plus(1));
}

/**
 * Where D_A is largest, counted from today: there dD_M/dz (1+z) = D_M, which is D_M' u/E = D_M with D_M' its derivative
 * by the line-of-sight distance.
 */
export function largestAngularDistance(
  model: Model,
  turns: Turns,
): { readonly u: Real; readonly distance: Real } | null {
  const place = firstFall(model, turns, ({ u, comoving }) => {
    const slope = transverseSlope(model, comoving);
    const ratio = signedTransverse(model, comoving).times(expansionSquared(model, u).sqrt()).over(u);
    return slope.minus(ratio).over(slope.magnitude().plus(ratio.magnitude()));
  });
  return place && { u: place.u, distance: signedTransverse(model, place.comoving).over(place.u) };
}
