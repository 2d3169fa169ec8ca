import { type CorrelationMatrix, combinedUncertainty, correlatedWith } from './combinedUncertainty.ts';
import { isNonlinear, spread } from './nonlinearity.ts';
import type { ScalarParameter } from './parameters.ts';
import { type Sensitivity, sensitivities } from './sensitivities.ts';
import { placeAmong, type Sweep } from './sweep.ts';
import { thinned } from './thinned.ts';
import { correlationMatrix, type UncertainParameters, uncertaintyOf } from './uncertain.ts';

/** What one parameter contributes to u^2, as a part of the whole. */
export interface Share {
  readonly parameter: ScalarParameter;
  /** (c u)^2 / u(y)^2: as if it were independent of the others. */
  readonly alone: number;
  /** c u / u(y)^2 times the sum of r c u over the others: what the correlations add or take away. */
  readonly correlated: number;
}

/** Standard uncertainties of everything in a sweep, by place (see `cellPlace`, `milestonePlace`). */
export interface Propagation {
  readonly redshifts: readonly number[];
  /** NaN where the value or a neighbour does not exist. */
  readonly u: Sweep;
  /** What each parameter contributes; `alone` and `correlated` of all add up to 1. None where u is 0 or not there. */
  shares(place: number): readonly Share[];
  /** Whether u departs by more than a tenth from the spread of y for normally distributed parameters. */
  isNonlinear(place: number): boolean;
}

/**
 * Standard uncertainties by the law of propagation, u(y)^2 = sum over i, j of c_i u_i r_ij c_j u_j with the
 * sensitivities c_i = dy/dx_i: u(y) = sqrt(J V J^T). Null for a set that gives no uncertainties. Redshifts ascend.
 *
 * Source: JCGM 100:2008 (GUM), 5.1.2 and 5.2.2, eqs. 10 and 13 to 16.
 */
export function propagation(set: UncertainParameters, redshifts: readonly number[]): Propagation | null {
  const found = sensitivities(set, redshifts);
  const [first] = found;
  if (first === undefined) return null;
  const names = found.map(({ parameter }) => parameter);
  const r = correlationMatrix(set, names);
  const terms = found.map((sensitivity) => contribution(set, sensitivity));
  const u = first.derivatives.map((_, place) => combinedUncertainty(termsAt(terms, place), r));
  return {
    redshifts,
    u,
    shares: (place) => shares(names, termsAt(terms, place), r, u[place] as number),
    isNonlinear: nonlinearity(set, redshifts, u),
  };
}

/** Tells of a place whether u departs from the spread there; a row goes with the nearest of those looked at. */
function nonlinearity(set: UncertainParameters, redshifts: readonly number[], u: Sweep): (place: number) => boolean {
  const { rows, nearest } = thinned(redshifts);
  const probed = spread(
    set,
    rows.map((row) => redshifts[row] as number),
  );
  const all = redshifts.length;
  return (place) => {
    const standIn = placeAmong(place, all, all, (row) => rows[nearest[row] as number] as number);
    const probe = placeAmong(place, all, rows.length, (row) => nearest[row] as number);
    return isNonlinear(probed, probe, u[standIn] as number);
  };
}

/** c u of one parameter, for everything. */
function contribution(set: UncertainParameters, { parameter, derivatives }: Sensitivity): Sweep {
  const u = uncertaintyOf(set, parameter);
  return derivatives.map((c) => c * u);
}

function termsAt(terms: readonly Sweep[], place: number): readonly number[] {
  return terms.map((term) => term[place] as number);
}

function shares(
  names: readonly ScalarParameter[],
  terms: readonly number[],
  r: CorrelationMatrix,
  u: number,
): readonly Share[] {
  if (!(u > 0)) return [];
  return names.map((parameter, i) => {
    const term = terms[i] as number;
    return { parameter, alone: (term * term) / (u * u), correlated: (term * correlatedWith(terms, r, i)) / (u * u) };
  });
}
