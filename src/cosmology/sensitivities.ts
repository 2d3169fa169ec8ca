import { Decimal } from '../numerics/decimal.ts';
import { type AlongStep, derivative, sidedDerivative } from '../numerics/derivative.ts';
import type { Parameters, ScalarParameter } from './parameters.ts';
import { type Sweep, sweep } from './sweep.ts';
import { type UncertainParameters, uncertainNames, uncertaintyOf } from './uncertain.ts';

/** How everything in a sweep follows one parameter. */
export interface Sensitivity {
  readonly parameter: ScalarParameter;
  /** Partial derivatives by the parameter, laid out as the sweep; NaN where the model or a neighbour has no value. */
  readonly derivatives: Sweep;
  /** Estimated bounds on their errors. */
  readonly errors: Sweep;
}

/** The largest step is this part of the standard uncertainty: small enough for the curvature of any column. */
const STEPS_PER_UNCERTAINTY = 32;
/** Steps below this part of a parameter's size would lose digits to rounding. */
const SMALLEST_STEP = 1 / 16384;

/** Parameters that no model has below zero. */
const NEVER_NEGATIVE: readonly ScalarParameter[] = ['H0', 'Omega_m', 'omega_b', 'omega_c', 'T_CMB', 'N_eff'];

/**
 * Partial derivatives of all quantities at the given redshifts and of all milestones by each parameter that has an
 * uncertainty, everything else that the set gives staying fixed.
 *
 * Method:   parameters are moved as decimals, so that the densities still add up to exactly 1. Central differences over
 *           1/32, 1/64 and 1/128 of the uncertainty, extrapolated; towards positive values only, for a parameter that
 *           is 0 and cannot be negative. Six sweeps for each parameter.
 * Accuracy: six digits or more, against test/reference/derivatives, wherever one u moves the value by more than 1e-7
 *           of itself; the errors returned say how many. A value that ceases to exist within the steps has no
 *           derivative.
 */
export function sensitivities(set: UncertainParameters, redshifts: readonly number[]): readonly Sensitivity[] {
  return uncertainNames(set).map((parameter) => {
    const value = Decimal.parse(set.parameters[parameter] ?? '0');
    const bounded = NEVER_NEGATIVE.includes(parameter);
    const step = stepOf(value, uncertaintyOf(set, parameter), bounded);
    const f: AlongStep = (t) => sweep(moved(set.parameters, parameter, value, step, t), redshifts);
    const { values, errors } = bounded && value.isZero() ? sidedDerivative(f) : derivative(f);
    const width = step.toNumber();
    return { parameter, derivatives: values.map((d) => d / width), errors: errors.map((e) => e / width) };
  });
}

/** A step of few digits, so that sums with it stay short. */
function stepOf(value: Decimal, u: number, bounded: boolean): Decimal {
  const size = Math.abs(value.toNumber()) || 1;
  const wanted = Math.max(u / STEPS_PER_UNCERTAINTY, SMALLEST_STEP * (bounded ? size : Math.max(size, 1)));
  const allowed = bounded && !value.isZero() ? Math.min(wanted, size / 2) : wanted;
  return Decimal.parse(allowed.toExponential(1));
}

function moved(parameters: Parameters, name: ScalarParameter, value: Decimal, step: Decimal, t: number): Parameters {
  return { ...parameters, [name]: value.plus(step.times(Decimal.parse(String(t)))).toString() };
}
