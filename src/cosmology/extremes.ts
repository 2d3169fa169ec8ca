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

/**
 * The first place going back in time where f(n, distance) falls through zero; null where it never does.
 * The distance to the last step is kept, so that a step and the root search integrate over one step only.
 */
function firstFall(model: Background, turns: TurningPoints, f: (n: number, distance: number) => number): Place | null {
  const end = Math.min(FARTHEST, turns.bounce === undefined ? FARTHEST : -turns.bounce);
  let [n, reached] = [0, 0];
  while (n < end) {
    const [from, base] = [n, reached];
    const distance = (x: number) => base + span(model, turns, -x, -from).conformal;
    const next = Math.min(end, n + STEP);
    const far = distance(next);
    if (f(next, far) <= 0) {
      const root = findRoot((x) => f(x, distance(x)), from, next);
      return { n: root, distance: distance(root) };
    }
    [n, reached] = [next, far];
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
    return slope / Math.sqrt(conformalRateSquared(model, -n)) - transverse(distance);
  });
  if (place === null) return null;
  return { z: Math.expm1(place.n), distance: transverse(place.distance) * Math.exp(-place.n) };
}

/** cosh(sqrt x), continued to cos(sqrt(-x)): the derivative of a transverse distance by the line-of-sight one. */
function transverseSlope(x: number): number {
  const r = Math.sqrt(Math.abs(x));
  return x > 0 ? Math.cosh(r) : Math.cos(r);
}
