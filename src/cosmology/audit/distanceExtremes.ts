import type { Real } from '../../numerics/extended/real.ts';
import { root } from '../../numerics/extended/root.ts';
import { expansionSquared } from './contents.ts';
import { signedTransverse, transverseSlope } from './geometry.ts';
import type { Model } from './model.ts';
import { sinceBigBang, span } from './spans.ts';
import type { Turns } from './turns.ts';

/** ln(1+z) to which the past is followed, in steps. */
const FARTHEST = 60;
const STEP = 1 / 16;

/** An epoch of the past and the comoving distance to it in c/H0. */
interface Place {
  /** 1 + z. */
  readonly u: Real;
  readonly comoving: Real;
}

/** Places from today outwards, up to the bounce if there is one. */
function* outwards(model: Model, turns: Turns): Generator<Place> {
  const { arithmetic } = model;
  const end = turns.bounce === null ? FARTHEST : Math.log(turns.bounce.toNumber());
  let here: Place = { u: arithmetic.real(1), comoving: arithmetic.real(0) };
  yield here;
  for (let x = STEP; x < end; x += STEP) {
    const u = arithmetic.real(x).exp();
    here = { u, comoving: distance(model, turns, here, u) };
    yield here;
  }
}

/** Comoving distance to 1 + z = u from that to a nearer place. */
function distance(model: Model, turns: Turns, from: Place, u: Real): Real {
  return from.comoving.plus(span(model, turns, from.u, u).comoving);
}

/** All comoving distance there is, to the Big Bang; null where it has no limit or there was none. */
function wholeDistance(model: Model, turns: Turns): Real | null {
  return sinceBigBang(model, turns, model.arithmetic.real(1)).comoving;
}

/** 1 + z at which a comoving source recedes at the speed of light today: D_C = c/H0. Null where none does. */
export function recessionAtLightSpeed(model: Model, turns: Turns): Real | null {
  if (wholeDistance(model, turns)?.below(1)) return null;
  let before: Place | null = null;
  for (const place of outwards(model, turns)) {
    const from: Place | null = before;
    if (from !== null && !place.comoving.below(1))
      return root(model.arithmetic, (u) => distance(model, turns, from, u).minus(1), from.u, place.u);
    before = place;
  }
  return null;
}

/** The change of D_A = |S(chi)|/u with u, times u^2: u |S|'/E - |S|. Zero when it is lost in the rounding of its terms. */
function slope(model: Model, { u, comoving }: Place): Real {
  const { arithmetic } = model;
  const transverse = signedTransverse(model, comoving);
  const rise = u.times(transverseSlope(model, comoving)).over(expansionSquared(model, u).sqrt());
  const change = rise.minus(transverse).times(transverse.sign() < 0 ? -1 : 1);
  const noise = transverse.magnitude().times(arithmetic.powerOfTen(-arithmetic.digits));
  return change.magnitude().below(noise) ? arithmetic.real(0) : change;
}

/** The place of the highest maximum of the angular diameter distance in the past, and its value in c/H0. */
export function largestAngularDistance(model: Model, turns: Turns): { u: Real; distance: Real } | null {
  const limit = transverseLimit(model, turns);
  let best: { u: Real; distance: Real } | null = null;
  let before: Place | null = null;
  let sign = 0;
  for (const place of outwards(model, turns)) {
    // No transverse distance is larger than the limit, so that no D_A from here on is larger than limit/u.
    if (best !== null && limit?.over(place.u).below(best.distance)) break;
    const next = slope(model, place).sign();
    if (before !== null && sign > 0 && next < 0) {
      const found = maximum(model, turns, before, place);
      if (best === null || best.distance.below(found.distance)) best = found;
    }
    if (next !== 0) sign = next;
    before = place;
  }
  return best;
}

function maximum(model: Model, turns: Turns, from: Place, to: Place): { u: Real; distance: Real } {
  const placeAt = (u: Real): Place => ({ u, comoving: distance(model, turns, from, u) });
  const u = root(model.arithmetic, (x) => slope(model, placeAt(x)), from.u, to.u);
  return { u, distance: signedTransverse(model, placeAt(u).comoving).magnitude().over(u) };
}

/** The largest transverse distance of the past; null where it has no limit. */
function transverseLimit(model: Model, turns: Turns): Real | null {
  if (model.curvature.sign() < 0) return model.curvature.magnitude().sqrt().reciprocal();
  const whole = wholeDistance(model, turns);
  return whole === null ? null : signedTransverse(model, whole);
}
