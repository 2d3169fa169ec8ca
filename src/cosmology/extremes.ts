import { findRoot } from '../numerics/findRoot.ts';
import type { Background } from './background.ts';
import { conformalRateSquared } from './conformalRate.ts';
import { transverseFactor } from './curvature.ts';
import { span } from './span.ts';
import type { TurningPoints } from './turningPoints.ts';

/** ln(1+z) is followed back to this; a crossing farther away does not occur in any universe with a past like ours. */
const FARTHEST = 60;
const STEP = 0.05;

interface Place {
  /** ln(1+z). */
  readonly n: number;
  /** Comoving distance to there, in c/H0. */
  readonly distance: number;
}

/** A fall below zero by less than this is rounding: some models only approach zero, and never cross it. */
const ROUNDING = 1e-12;

/**
 * The first place going back in time where f(n, distance) falls through zero; null where it never does. f is to be of
 * order 1 near its zero. Distances start from the last place where f was positive, so that a step and the search for
 * the root integrate over a step or two only.
 */
function firstFall(model: Background, turns: TurningPoints, f: (n: number, distance: number) => number): Place | null {
  const end = Math.min(FARTHEST, turns.bounce === undefined ? FARTHEST : -turns.bounce);
  let from: Place = { n: 0, distance: 0 };
  for (let step = 1; step * STEP < end; step++) {
    const { n, distance: base } = from;
    const distance = (x: number) => base + span(model, turns, -x, -n).conformal;
    const next = { n: step * STEP, distance: distance(step * STEP) };
    const value = f(next.n, next.distance);
    if (value < -ROUNDING) {
      const root = findRoot((x) => f(x, distance(x)), n, next.n);
      return { n: root, distance: distance(root) };
    }
    if (value > 0) from = next;
  }
  return null;
}

/** Redshift at which a comoving source recedes at the speed of light today: D_C = c/H0; null where none does. */
export function recessionAtLightSpeed(model: Background, turns: TurningPoints): number | null {
  const place = firstFall(model, turns, (_, distance) => 1 - distance);
  return place === null ? null : Math.expm1(place.n);
}

/**
 * The first maximum of the angular diameter distance, going back in time: its redshift and the distance in c/H0.
 * There dD_M/dz (1+z) = D_M, with dD_M/dz = cos_k(D_C)/E.
 */
export function largestAngularDistance(
  model: Background,
  turns: TurningPoints,
): { readonly z: number; readonly distance: number } | null {
  const transverse = (distance: number) => transverseFactor(model.curvature * distance * distance) * distance;
  const place = firstFall(model, turns, (n, distance) => {
    const slope = transverseSlope(model.curvature * distance * distance);
    const ratio = transverse(distance) * Math.sqrt(conformalRateSquared(model, -n));
    return (slope - ratio) / (Math.abs(slope) + Math.abs(ratio));
  });
  if (place === null) return null;
  return { z: Math.expm1(place.n), distance: transverse(place.distance) * Math.exp(-place.n) };
}

/** cosh(sqrt x), continued to cos(sqrt(-x)): the derivative of a transverse distance by the line-of-sight one. */
function transverseSlope(x: number): number {
  const r = Math.sqrt(Math.abs(x));
  return x > 0 ? Math.cosh(r) : Math.cos(r);
}
