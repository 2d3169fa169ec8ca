import { integratePair } from '../numerics/integratePair.ts';
import type { Background } from './background.ts';
import { conformalRateSquared, conformalRateSquaredNearTurn } from './conformalRate.ts';
import type { TurningPoints } from './turningPoints.ts';

/** The two integrals that every time and distance is made of, between two epochs. */
export interface Span {
  /** int ds/(aE): comoving distance over c/H0, conformal time times H0. */
  readonly conformal: number;
  /** int a ds/(aE): time times H0. */
  readonly time: number;
}

/** Within this of a turning point, in ln a, the variable is the root of the distance to it. */
const NEAR_TURN = 0.5;

type Rate = (x: number) => { readonly s: number; readonly rateSquared: number; readonly jacobian: number };

/** Both integrals over a variable x, given ln a, (aE)^2 and ds/dx at x. */
function integrated(rate: Rate, lo: number, hi: number): Span {
  const { first, second } = integratePair(
    (x, out) => {
      const { s, rateSquared, jacobian } = rate(x);
      const f = jacobian / Math.sqrt(rateSquared);
      out[0] = f;
      out[1] = f * Math.exp(s);
    },
    lo,
    hi,
  );
  return { conformal: first, time: second };
}

function plainSpan(model: Background, lo: number, hi: number): Span {
  return integrated((s) => ({ s, rateSquared: conformalRateSquared(model, s), jacobian: 1 }), lo, hi);
}

/**
 * The span of `width` in ln a whose nearer end lies `near` before (side 1) or after (side -1) a turning point. With
 * v the root of the distance to the turn the integrand's inverse root becomes smooth; a span that is short against
 * its distance has no need of that, and keeps the digits of its width in ln a.
 */
function turningSpan(model: Background, turn: number, side: 1 | -1, near: number, width: number): Span {
  const at = (distance: number, jacobian: number) => {
    const shift = side * distance;
    return { s: turn - shift, rateSquared: conformalRateSquaredNearTurn(model, turn, shift), jacobian };
  };
  if (width < near / 4) return integrated((x) => at(near + x, 1), 0, width);
  return integrated((v) => at(v * v, 2 * v), Math.sqrt(near), Math.sqrt(near + width));
}

const plus = (a: Span, b: Span): Span => ({ conformal: a.conformal + b.conformal, time: a.time + b.time });

/**
 * Both integrals between ln a = lo and ln a = hi, lo <= hi, between the turning points if there are any.
 *
 * Source: Hogg (1999), astro-ph/9905116, eqs. 15 and 30, with dz = -ds/a.
 */
export function span(model: Background, { bounce, maximum }: TurningPoints, lo: number, hi: number): Span {
  if (maximum !== undefined && hi > maximum - NEAR_TURN) {
    const split = Math.max(lo, maximum - NEAR_TURN);
    const upper = turningSpan(model, maximum, 1, maximum - hi, hi - split);
    return split > lo ? plus(span(model, { bounce }, lo, split), upper) : upper;
  }
  if (bounce !== undefined && lo < bounce + NEAR_TURN) {
    const split = Math.min(hi, bounce + NEAR_TURN);
    const lower = turningSpan(model, bounce, -1, lo - bounce, split - lo);
    return split < hi ? plus(lower, plainSpan(model, split, hi)) : lower;
  }
  return plainSpan(model, lo, hi);
}
