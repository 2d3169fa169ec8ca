import type { Background } from './background.ts';
import { conformalRateSquaredNearTurn } from './conformalRate.ts';
import { densities } from './densities.ts';
import { rateErrors } from './rateErrors.ts';
import type { TurningPoints } from './turningPoints.ts';

/** Bounds on the relative errors of the integrals of one epoch, in units of the unit roundoff 2^-53. */
export interface IntegralErrors {
  readonly age: number;
  readonly conformalTime: number;
  /** Of the comoving distance and of the lookback time. */
  readonly distance: number;
  readonly conformalFuture: number;
}

const STEP = 0.25;
/** Before the earliest row the terms settle to the leading one within this of ln a. */
const BEFORE = 12;
/** After the latest row an integral to the end of time has gathered all but a few per cent of itself within this. */
const AFTER = 4;
/** Between two samples the error of a smooth integrand cannot rise by more. */
const BETWEEN = 1.25;
/** The rule itself: weights, products, compensated sums, the truncation accepted for a panel, and one root. */
const RULE = 12;
/** e^-s, when s is taken as exact. */
const EXPONENTIAL = 2;
/** Within this of the maximum the integral runs in the root of the distance to it; see `span`. */
const NEAR_TURN = 0.5;

interface Sample {
  readonly s: number;
  readonly error: number;
}

/** Half the error of (aE)^2 at ln a = s: what 1/(aE) inherits. */
function integrandError(model: Background, s: number): number {
  const u = Math.exp(-s);
  const parts = densities(model, u);
  // Where dark energy has outgrown the range of doubles the integrand is zero.
  return Number.isFinite(parts.E2) ? rateErrors(model, parts, u, EXPONENTIAL).E2 / 2 : 0;
}

/**
 * What an integral through the maximum inherits: there (aE)^2 is taken as exactly zero, which moves the maximum by the
 * error of its terms over their slope, and the integral in proportion.
 */
function turnError(model: Background, maximum: number): number {
  const u = Math.exp(-maximum);
  const d = densities(model, u);
  const terms = (d.matter + d.photons + d.neutrinos + Math.abs(d.curvature) + Math.abs(d.darkEnergy)) / (u * u);
  const width = 1e-3;
  const slope = conformalRateSquaredNearTurn(model, maximum, width) / width;
  const worst = Math.max(...Object.values(model.errors)) + 3 * EXPONENTIAL + 30;
  return 30 + (5 * worst * terms) / slope;
}

function samples(model: Background, { bounce, maximum }: TurningPoints, places: readonly number[]): readonly Sample[] {
  const first = Math.max(bounce ?? Number.NEGATIVE_INFINITY, Math.min(0, ...places) - BEFORE);
  const last = Math.min((maximum ?? Number.POSITIVE_INFINITY) - NEAR_TURN, Math.max(0, ...places) + AFTER);
  const count = Math.max(0, Math.ceil((last - first) / STEP));
  const even = Array.from({ length: count + 1 }, (_, k) => first + k * STEP);
  return [...even, ...places, 0].sort((a, b) => a - b).map((s) => ({ s, error: integrandError(model, s) }));
}

/** Largest error so far, going through the samples in the order given. */
function runningMaximum(ordered: readonly Sample[]): ReadonlyMap<number, number> {
  let largest = 0;
  return new Map(
    ordered.map(({ s, error }) => {
      largest = Math.max(largest, error);
      return [s, largest];
    }),
  );
}

/**
 * Error bounds of the integrals at the given redshifts.
 *
 * An integral of a positive function is wrong by at most the largest relative error of the function on its way, plus
 * the rule's own, plus what the rounded nodes and ends do: those are wrong by 2 |s| units of ln a, and the integrands
 * are at most quadratic (age) or linear (conformal time) in a, or fall off with z (distances).
 */
export function integralErrors(
  model: Background,
  turns: TurningPoints,
  redshifts: readonly number[],
): readonly IntegralErrors[] {
  const places = redshifts.map((z) => -Math.log1p(z));
  const ascending = samples(model, turns, places);
  const upTo = runningMaximum(ascending);
  const from = runningMaximum(ascending.toReversed());
  const outwards = new Map([
    ...runningMaximum(ascending.filter(({ s }) => s <= 0).toReversed()),
    ...runningMaximum(ascending.filter(({ s }) => s >= 0)),
  ]);
  const atTurn = turns.maximum === undefined ? 0 : turnError(model, turns.maximum);
  return redshifts.map((z, k) => {
    const s = places[k] ?? 0;
    const log = Math.abs(s);
    // 1 + z of a future row is a difference: its error grows as |z|/(1+z).
    const end = z < 0 ? 4 * (-z / (1 + z)) : 2;
    const largest = (errors: ReadonlyMap<number, number>) =>
      BETWEEN * (errors.get(s) ?? Number.POSITIVE_INFINITY) + RULE;
    return {
      age: largest(upTo) + 8 * log + 6 + end,
      conformalTime: largest(upTo) + 4 * log + 6 + end,
      distance: largest(outwards) + 8,
      conformalFuture: Math.max(largest(from), atTurn) + 6 * log + 8 + end,
    };
  });
}
