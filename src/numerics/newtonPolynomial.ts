/**
 * The polynomial through all points, in Newton's form: quick to evaluate many times.
 *
 * @param nodes all different, evenly spaced or not
 * @param values one for each node
 *
 * Source: Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 25.2.26.
 */
export function newtonPolynomial(nodes: readonly number[], values: readonly number[]): (x: number) => number {
  const differences = [...values];
  for (let order = 1; order < nodes.length; order++) {
    for (let k = nodes.length - 1; k >= order; k--) {
      const rise = (differences[k] ?? 0) - (differences[k - 1] ?? 0);
      differences[k] = rise / ((nodes[k] ?? 0) - (nodes[k - order] ?? 0));
    }
  }
  return (x) => {
    let value = 0;
    for (let k = nodes.length - 1; k >= 0; k--) value = value * (x - (nodes[k] ?? 0)) + (differences[k] ?? 0);
    return value;
  };
}
