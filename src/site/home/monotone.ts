/** A stretch of a scale on which the quantity only rises or only falls. */
export interface Branch {
  readonly positions: readonly number[];
  readonly values: readonly number[];
}

/** Parts a scale where the quantity turns round; each part begins where the one before it ends. */
export function branches(positions: readonly number[], values: readonly number[]): Branch[] {
  const cuts = [0];
  for (let i = 1; i < values.length - 1; i++) {
    const [before = 0, here = 0, after = 0] = values.slice(i - 1, i + 2);
    if ((here - before) * (after - here) < 0) cuts.push(i);
  }
  return cuts.map((from, i) => {
    const to = (cuts[i + 1] ?? values.length - 1) + 1;
    return { positions: positions.slice(from, to), values: values.slice(from, to) };
  });
}

/** Position of a value on a branch, between the rows; undefined outside it. */
export function positionOf({ positions, values }: Branch, value: number): number | undefined {
  const rising = (values.at(-1) ?? 0) >= (values[0] ?? 0);
  const after = values.findIndex((v) => (rising ? v >= value : v <= value));
  if (after < 0) return undefined;
  const high = values[after] ?? value;
  if (high === value) return positions[after];
  const low = values[after - 1];
  if (low === undefined) return undefined;
  const [from = 0, to = 0] = positions.slice(after - 1, after + 1);
  return from + ((value - low) / (high - low)) * (to - from);
}
