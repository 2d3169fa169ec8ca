/** An interpolated value is the sum of `weights[k] * values[first + k]`; the weights sum to 1. */
export interface Stencil {
  /** Index of the first node that takes part. */
  readonly first: number;
  readonly weights: readonly number[];
}

/**
 * Lagrange's polynomial through the `points` nodes nearest around one interval, as weights of their values at x:
 * 2 points are linear interpolation, 4 points are cubic with two nodes on either side.
 *
 * In the first and last interval, where one side has too few nodes, it is the first or last `points` nodes; where there
 * are fewer nodes than that, it is all of them, and the degree falls accordingly.
 *
 * @param nodes ascending, evenly spaced or not, at least two
 * @param interval x lies between `nodes[interval]` and `nodes[interval + 1]`
 * @param points even
 *
 * Source: Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 25.2.1 and 25.2.2.
 * Errors: RangeError if there is no such interval.
 */
export function lagrangeStencil(nodes: readonly number[], interval: number, points: number, x: number): Stencil {
  if (!(Number.isInteger(interval) && interval >= 0 && interval < nodes.length - 1)) {
    throw new RangeError(`${nodes.length} nodes have no interval ${interval}`);
  }
  const count = Math.min(points, nodes.length);
  const first = Math.min(Math.max(0, interval + 1 - points / 2), nodes.length - count);
  return { first, weights: weights(nodes.slice(first, first + count), x) };
}

/** The product over all other nodes of (x - other)/(own - other), for each node. */
function weights(nodes: readonly number[], x: number): readonly number[] {
  return nodes.map((own, k) => nodes.reduce((w, other, j) => (j === k ? w : (w * (x - other)) / (own - other)), 1));
}

/** The interpolated value, from one value for each node. */
export function interpolated(values: readonly number[], { first, weights }: Stencil): number {
  return weights.reduce((sum, weight, k) => sum + weight * (values[first + k] ?? Number.NaN), 0);
}
