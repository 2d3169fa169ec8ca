import { Decimal } from '../../numerics/decimal.ts';
import type { Arithmetic } from '../../numerics/extended/arithmetic.ts';
import type { Real } from '../../numerics/extended/real.ts';
import type { Parameters } from '../parameters.ts';
import type { QuantityId } from '../quantities.ts';
import { type Audited, twice } from './audited.ts';
import { AUDITED_COLUMNS } from './columns.ts';
import { history, type Moment, type Needs } from './history.ts';
import { auditModel, type Model } from './model.ts';
import { row } from './row.ts';
import { type Turns, turningPoints } from './turns.ts';

/**
 * Columns of a model at redshifts as written, in extended precision: `result[row][column]`, in the order given; null
 * where the quantity does not exist. Only the integrals that the columns need are computed.
 *
 * Errors: RangeError for a redshift at or below -1; Error when startAudit has not resolved, or when an integral cannot
 *         be had to `digits` digits.
 */
export function auditRows(
  parameters: Parameters,
  redshifts: readonly string[],
  columns: readonly QuantityId[],
  digits: number,
): readonly (readonly (Audited | null)[])[] {
  const values = twice(digits, (arithmetic) => evaluate(arithmetic, parameters, redshifts, columns));
  return redshifts.map((_, k) => values.slice(k * columns.length, (k + 1) * columns.length));
}

function evaluate(
  arithmetic: Arithmetic,
  parameters: Parameters,
  redshifts: readonly string[],
  columns: readonly QuantityId[],
): readonly (string | null)[] {
  const model = auditModel(arithmetic, parameters);
  const turns = turningPoints(model);
  const reached = ascending(redshifts).flatMap((text) => {
    const u = placeOf(model, turns, text);
    return u === null ? [] : [{ text, u }];
  });
  const moments = history(
    model,
    turns,
    reached.map(({ u }) => u),
    needsOf(columns),
  );
  const found = new Map(
    reached.map(({ text, u }, k) => [text, cells(model, text, u, moments[k] as Moment, columns)] as const),
  );
  const blank = columns.map(() => null);
  return redshifts.flatMap((text) => found.get(text) ?? blank);
}

/** The distinct texts, in the order of their values. */
function ascending(redshifts: readonly string[]): readonly string[] {
  return [...new Set(redshifts)]
    .map((text) => ({ text, value: Decimal.parse(text) }))
    .sort((a, b) => a.value.compare(b.value))
    .map(({ text }) => text);
}

/** 1 + z; null for an epoch that the universe never sees. What differs from a turning point by rounding lies on it. */
function placeOf({ arithmetic }: Model, { bounce, maximum }: Turns, redshift: string): Real | null {
  const u = arithmetic.real(redshift).plus(1);
  if (u.sign() <= 0) throw new RangeError(`no epoch has the redshift ${redshift}`);
  const on = (turn: Real) =>
    u
      .minus(turn)
      .magnitude()
      .below(turn.times(arithmetic.powerOfTen(-arithmetic.digits)));
  if (maximum !== null && on(maximum)) return maximum;
  if (bounce !== null && on(bounce)) return bounce;
  const beyond = (maximum !== null && u.below(maximum)) || (bounce?.below(u) ?? false);
  return beyond ? null : u;
}

function needsOf(columns: readonly QuantityId[]): Needs {
  const needed = (need: keyof Needs) => columns.some((id) => AUDITED_COLUMNS[id].needs?.[need] ?? false);
  return {
    fromToday: needed('fromToday'),
    volume: needed('volume'),
    sinceBigBang: needed('sinceBigBang'),
    untilEnd: needed('untilEnd'),
  };
}

function cells(
  model: Model,
  redshift: string,
  u: Real,
  moment: Moment,
  columns: readonly QuantityId[],
): readonly (string | null)[] {
  const { arithmetic } = model;
  return arithmetic.forget(() => {
    const here = row(model, arithmetic.real(redshift), u, moment);
    return columns.map((id) => AUDITED_COLUMNS[id].value(here)?.toText() ?? null);
  });
}
