import type { Real } from '../../numerics/extended/real.ts';
import { root } from '../../numerics/extended/root.ts';
import { contents, expansionSquared } from './contents.ts';
import type { Model } from './model.ts';

/** Where the expansion rate vanishes, as 1 + z; null where it never does. */
export interface Turns {
  /** The last bounce before today: there was no Big Bang. */
  readonly bounce: Real | null;
  /** The first maximum of the scale factor after today: the universe recollapses. */
  readonly maximum: Real | null;
}

/** Steps in ln(1+z): fine against the change of every component, which is at most a factor e^4 in one unit. */
const STEP = 1 / 32;
/** A search that no component decides ends here; only components of the same power lead so far. */
const FARTHEST = 700;
/** What is positive wins when it is so many times what is negative, and its share can only grow. */
const DOMINANT = 2;
/** Golden-section steps to the bottom of a dip: 0.618^60 of a step leaves nothing to see. */
const GOLDEN_STEPS = 60;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** The turning points next to today. E^2 can vanish only where curvature or dark energy is negative. */
export function turningPoints(model: Model): Turns {
  if (model.curvature.sign() >= 0 && model.darkEnergy.sign() >= 0) return { bounce: null, maximum: null };
  return { bounce: firstZero(model, 1), maximum: firstZero(model, -1) };
}

/** Follows E^2/(1+z)^2 in steps of ln(1+z), into the past (direction 1) or the future (-1), to its first zero. */
function firstZero(model: Model, direction: 1 | -1): Real | null {
  const { arithmetic } = model;
  const place = (x: number) => arithmetic.real(x * direction).exp();
  const rate = (u: Real) => expansionSquared(model, u).over(u.squared());
  const rateAt = (x: number) => arithmetic.forget(() => rate(place(x)).toNumber());
  const zeroBetween = (x1: number, x2: number) => root(arithmetic, rate, place(x1), place(x2));
  let [before, here] = [rateAt(0), rateAt(0)];
  for (let x = STEP; x < FARTHEST; x += STEP) {
    const next = rateAt(x);
    if (!(next > 0)) return zeroBetween(x - STEP, x);
    if (here < before && here < next) {
      const lowest = bottom(rateAt, x - 2 * STEP, x);
      if (rateAt(lowest) <= 0) return zeroBetween(x - 2 * STEP, lowest);
    }
    [before, here] = [here, next];
    if (arithmetic.forget(() => decided(model, place(x), direction))) return null;
  }
  return null;
}

function bottom(f: (x: number) => number, lo: number, hi: number): number {
  let [a, b] = [lo, hi];
  for (let step = 0; step < GOLDEN_STEPS; step++) {
    const [left, right] = [b - GOLDEN * (b - a), a + GOLDEN * (b - a)];
    if (f(left) < f(right)) b = right;
    else a = left;
  }
  return (a + b) / 2;
}

/** A component's density and the range of powers of 1 + z with which it changes from here on. */
interface Share {
  readonly density: number;
  readonly powers: readonly [number, number];
}

/** Whether beyond u nothing negative can win any more: the positive components that outgrow it already dominate it. */
function decided(model: Model, u: Real, direction: 1 | -1): boolean {
  const all = shares(model, u, direction);
  const negative = all.filter(({ density }) => density < 0);
  const outgrows = ({ powers }: Share) =>
    negative.every((other) => (direction > 0 ? powers[0] >= other.powers[1] : powers[1] <= other.powers[0]));
  const sum = (some: readonly Share[]) => some.reduce((total, { density }) => total + density, 0);
  return sum(all.filter((share) => share.density > 0 && outgrows(share))) > -DOMINANT * sum(negative);
}

function shares(model: Model, u: Real, direction: 1 | -1): readonly Share[] {
  const { matter, photons, neutrinos, curvature, darkEnergy } = contents(model, u);
  const [w0, wa] = [model.w0.toNumber(), model.wa.toNumber()];
  const here = 3 * (1 + w0 + wa * (1 - 1 / u.toNumber()));
  // w(a) changes one way only: from here to w0 + wa in the past, to minus wa times infinity in the future.
  const future = wa === 0 ? here : -wa * Number.POSITIVE_INFINITY;
  const end = direction > 0 ? model.darkPower.toNumber() : future;
  return [
    { density: matter.toNumber(), powers: [3, 3] },
    { density: photons.toNumber(), powers: [4, 4] },
    { density: neutrinos.toNumber(), powers: [3, 4] },
    { density: curvature.toNumber(), powers: [2, 2] },
    { density: darkEnergy.toNumber(), powers: [Math.min(here, end), Math.max(here, end)] },
  ];
}
