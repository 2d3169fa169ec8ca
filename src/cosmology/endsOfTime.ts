import { CompensatedSum } from '../numerics/compensatedSum.ts';
import { integratePair } from '../numerics/integratePair.ts';
import type { Background } from './background.ts';
import { conformalRateSquared } from './conformalRate.ts';

/** What is left out of an integral once the leading power law is added, relative to the whole. */
const NEGLIGIBLE = 1e-19;
/** An end of time is followed no further than this in ln a; only integrals that barely converge reach it. */
const EARLIEST = -300;
const LATEST = 5000;

/** Power n of the component a^-n that rules for a -> 0. */
function earlyPower(model: Background): number {
  const powers = [
    [model.photons + model.allMassless, 4],
    [model.matter, 3],
    [model.curvature, 2],
    [model.darkEnergy, 3 * model.onePlusW],
  ] as const;
  return Math.max(...powers.filter(([density]) => density !== 0).map(([, power]) => power));
}

/**
 * The integrals from a = 0 to ln a = s, in 1/H0; null where they diverge.
 *
 * Near a = 0 the integrands are powers of a: panels of ln a are added until what the leading power leaves out is
 * negligible, and the rest is its closed form. The particle horizon needs a component that falls faster than a^-2,
 * an age one that falls at all.
 */
export function earlyIntegrals(model: Background, s: number): { conformal: number | null; time: number | null } {
  const power = earlyPower(model);
  const [conformal, time] = [new CompensatedSum(), new CompensatedSum()];
  if (power <= 0) return { conformal: null, time: null };
  for (let lo = s; ; lo -= 1) {
    const f = 1 / Math.sqrt(conformalRateSquared(model, lo));
    const rests = { conformal: f / (power / 2 - 1), time: (f * Math.exp(lo)) / (power / 2) };
    const bend = slopeError(model, lo, -1, 2 - power);
    const done = (rest: number, sum: number) => Math.abs(rest) * bend <= NEGLIGIBLE * (sum + rest);
    const settled = done(rests.time, time.value) && (power <= 2 || done(rests.conformal, conformal.value));
    if (settled || lo < EARLIEST) {
      conformal.add(rests.conformal);
      time.add(rests.time);
      return { conformal: power > 2 ? conformal.value : null, time: time.value };
    }
    const panel = integratePair(
      (x, out) => {
        const g = 1 / Math.sqrt(conformalRateSquared(model, x));
        out[0] = g;
        out[1] = g * Math.exp(x);
      },
      lo - 1,
      lo,
    );
    conformal.add(panel.first);
    time.add(panel.second);
  }
}

/** How far (aE)^2 departs from the power law of slope `slope` in ln a over one step. */
function slopeError(model: Background, s: number, step: 1 | -1, slope: number): number {
  const ratio = Math.log(conformalRateSquared(model, s + step) / conformalRateSquared(model, s));
  return Math.abs(ratio - step * slope);
}

/**
 * Conformal time from ln a = s to a -> infinity, in 1/H0, for a model that expands forever; null where it diverges,
 * that is where no component that falls more slowly than a^-2 is left in the end.
 */
export function lateConformalTime(model: Background, s: number): number | null {
  const slope = 2 - 3 * model.onePlusW;
  const converges = model.darkEnergy > 0 && (model.wa > 0 || (model.wa === 0 && slope > 0));
  if (!converges) return null;
  const total = new CompensatedSum();
  let width = 1;
  for (let lo = s; ; lo += width, width *= 1.2) {
    const f = 1 / Math.sqrt(conformalRateSquared(model, lo));
    // Growing exponentially in a, dark energy leaves less than this power law does.
    const rest = f / (slope / 2);
    const settled = model.wa === 0 ? rest * slopeError(model, lo, 1, slope) : f;
    if (settled <= NEGLIGIBLE * total.value || lo > LATEST) {
      if (model.wa === 0) total.add(rest);
      return total.value;
    }
    const panel = integratePair(
      (x, out) => {
        out[0] = 1 / Math.sqrt(conformalRateSquared(model, x));
        out[1] = 0;
      },
      lo,
      lo + width,
    );
    total.add(panel.first);
  }
}
