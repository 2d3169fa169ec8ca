/** A vector-valued function near a point, of the distance to it in steps. A component that does not exist is NaN. */
export type AlongStep = (t: number) => Float64Array;

/** First derivatives at the point, by the distance in steps. */
export interface Derivative {
  /** NaN where the component does not exist at one of the points looked at; exactly 0 where only rounding is left. */
  readonly values: Float64Array;
  /** Estimated bounds on |value - truth|, from truncation and rounding. */
  readonly errors: Float64Array;
}

/** Difference quotients over 1, 1/2 and 1/4 step, and how their errors fall with the step. */
interface Quotients {
  readonly quotients: readonly [Float64Array, Float64Array, Float64Array];
  /** By which factors the first and the second error term shrink from a quotient to the next. */
  readonly ratios: readonly [number, number];
  /** By how much the errors of the function's values are multiplied on the way to the result. */
  readonly amplification: number;
  /** The function's values near the point, for their size. */
  readonly nearby: Float64Array;
}

/** Relative error of the function's values: the integrals of the kernel are good to 5e-15, what is made of them to this. */
const VALUE_ERROR = 1e-14;

/**
 * First derivatives by central differences over 1, 1/2 and 1/4 step, extrapolated twice. Six evaluations.
 *
 * Source:   Richardson (1911), Phil. Trans. R. Soc. A 210, 307.
 * Accuracy: what is left out is of the sixth order in the step. The error stated holds the change by the last
 *           extrapolation, which is of the fourth order and so on the safe side.
 */
export function derivative(f: AlongStep): Derivative {
  const nearby = f(1 / 4);
  return extrapolated({
    quotients: [quotient(f(1), f(-1), 2), quotient(f(1 / 2), f(-1 / 2), 1), quotient(nearby, f(-1 / 4), 1 / 2)],
    ratios: [4, 16],
    amplification: 8, // (16/15) (4/3) (2/(1/2)) = 5.7 from the last quotient, below 1 from the others
    nearby,
  });
}

/**
 * The same from one side, for a point at the end of the domain: f(0), f(1/4), f(1/2) and f(1). Four evaluations; what
 * is left out is of the third order in the step.
 */
export function sidedDerivative(f: AlongStep): Derivative {
  const nearby = f(0);
  return extrapolated({
    quotients: [quotient(f(1), nearby, 1), quotient(f(1 / 2), nearby, 1 / 2), quotient(f(1 / 4), nearby, 1 / 4)],
    ratios: [2, 4],
    amplification: 32, // (4/3) 2 (2/(1/4)) = 21.3 from the last quotient, 8 from the one before, 1 from the first
    nearby,
  });
}

function quotient(ahead: Float64Array, behind: Float64Array, distance: number): Float64Array {
  return ahead.map((y, k) => (y - (behind[k] as number)) / distance);
}

function extrapolated({ quotients, ratios, amplification, nearby }: Quotients): Derivative {
  const [whole, half, quarter] = quotients;
  const [first, second] = ratios;
  const values = new Float64Array(nearby.length);
  const errors = new Float64Array(nearby.length);
  for (let k = 0; k < nearby.length; k++) {
    const middle = half[k] as number;
    const coarse = (first * middle - (whole[k] as number)) / (first - 1);
    const fine = (first * (quarter[k] as number) - middle) / (first - 1);
    const value = (second * fine - coarse) / (second - 1);
    const noise = amplification * VALUE_ERROR * Math.abs(nearby[k] as number);
    values[k] = Math.abs(value) <= noise ? 0 : value;
    errors[k] = Math.abs(value - fine) + noise;
  }
  return { values, errors };
}
