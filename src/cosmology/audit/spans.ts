import { integrate } from '../../numerics/extended/integrate.ts';
import { integrateTail } from '../../numerics/extended/integrateTail.ts';
import type { Real } from '../../numerics/extended/real.ts';
import { expansionSquared } from './contents.ts';
import type { Model } from './model.ts';
import type { Turns } from './turns.ts';

/**
 * The two integrals that all distances and times are made of, in c/H0 and 1/H0:
 * comoving distance, int dz/E (Hogg 1999, eq. 15), and time, int dz/((1+z) E) (eq. 30).
 */
export interface Span {
  readonly comoving: Real;
  readonly time: Real;
}

/** Both from 1 + z = lo to hi, lo <= hi. */
export function span(model: Model, turns: Turns, lo: Real, hi: Real): Span {
  const { arithmetic } = model;
  const [comoving, time] = arithmetic.scope<[Real, Real]>(() => {
    const turn = nearerTurn(turns, lo, hi);
    return (turn === null ? plain(model, lo, hi) : fromTurn(model, turn, lo, hi)) as [Real, Real];
  });
  return { comoving, time };
}

function plain(model: Model, lo: Real, hi: Real): readonly Real[] {
  return integrate(
    model.arithmetic,
    (u) => {
      const f = expansionSquared(model, u).sqrt().reciprocal();
      return [f, f.over(u)];
    },
    lo,
    hi,
  );
}

/**
 * E vanishes like the root of the distance to a turning point. With 1 + z = turn +- v^2 the integrand 2 v/E is smooth.
 */
function fromTurn(model: Model, turn: Real, lo: Real, hi: Real): readonly Real[] {
  const { arithmetic } = model;
  const above = !lo.below(turn);
  const distance = (u: Real) => u.minus(turn).magnitude().sqrt();
  const [near, far] = above ? [distance(lo), distance(hi)] : [distance(hi), distance(lo)];
  return integrate(
    arithmetic,
    (v) => {
      const u = above ? turn.plus(v.squared()) : turn.minus(v.squared());
      const f = v.times(2).over(expansionSquared(model, u).sqrt());
      return [f, f.over(u)];
    },
    near,
    far,
  );
}

function nearerTurn({ bounce, maximum }: Turns, lo: Real, hi: Real): Real | null {
  if (bounce === null || maximum === null) return bounce ?? maximum;
  return bounce.minus(hi).below(lo.minus(maximum)) ? bounce : maximum;
}

/** A tail starts no nearer to a maximum than at this many times its 1 + z: E must not vanish at its end. */
const AWAY_FROM_TURN = 2;

/** Power n of the component (1+z)^n that rules for z -> infinity. */
function earlyPower(model: Model): number {
  const powers: readonly (readonly [Real, number])[] = [
    [model.photons.plus(model.allMassless), 4],
    [model.matter, 3],
    [model.curvature, 2],
    [model.darkEnergy, model.darkPower.toNumber()],
  ];
  return Math.max(...powers.filter(([density]) => density.sign() !== 0).map(([, power]) => power));
}

/**
 * Both from 1 + z = lo to infinity, the Big Bang; null where they diverge or where there was none. With
 * 1 + z = lo e^x the integrands are u/E and 1/E, which fall like exp(-(n/2 - 1) x) and exp(-n x/2).
 */
export function sinceBigBang(model: Model, turns: Turns, lo: Real): { comoving: Real | null; time: Real | null } {
  const power = earlyPower(model);
  if (turns.bounce !== null || power <= 0) return { comoving: null, time: null };
  const safe = turns.maximum?.times(AWAY_FROM_TURN);
  if (safe === undefined || !lo.below(safe)) return tail(model, lo, power);
  const near = span(model, turns, lo, safe);
  const { comoving, time } = tail(model, safe, power);
  return { comoving: comoving?.plus(near.comoving) ?? null, time: time.plus(near.time) };
}

function tail(model: Model, lo: Real, power: number): { comoving: Real | null; time: Real } {
  const { arithmetic } = model;
  const finite = power > 2;
  const scale = arithmetic.real(1).over(finite ? power / 2 - 1 : power / 2);
  const results = integrateTail(
    arithmetic,
    (x) => {
      const u = x.exp().times(lo);
      const time = expansionSquared(model, u).sqrt().reciprocal();
      return finite ? [time, time.times(u)] : [time];
    },
    scale,
  );
  return { comoving: results[1] ?? null, time: results[0] as Real };
}

/**
 * Comoving distance from 1 + z = 0, the infinite future, to hi; null where it diverges, that is where no component is
 * left in the end that falls more slowly than (1+z)^2. With 1 + z = hi e^-x the integrand is u/E.
 */
export function untilInfinity(model: Model, hi: Real): Real | null {
  const { arithmetic } = model;
  const decay = 1 - model.darkPower.toNumber() / 2;
  const growing = model.wa.sign() > 0;
  if (model.darkEnergy.sign() <= 0 || !(growing || (model.wa.sign() === 0 && decay > 0))) return null;
  const [distance] = integrateTail(
    arithmetic,
    (x) => {
      const u = hi.over(x.exp());
      return [u.over(expansionSquared(model, u).sqrt())];
    },
    arithmetic.real(1).over(growing ? 1 : decay),
  );
  return distance ?? null;
}
