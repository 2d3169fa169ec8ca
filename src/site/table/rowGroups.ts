/** Rows that stand together, by index: from `start` to before `end`. */
export interface RowGroup {
  readonly start: number;
  readonly end: number;
}

const GROUP = 5;
/** A group is not cut short below this. */
const FEWEST = 3;

/**
 * Parts the rows of a grid into groups of at most five, as printed tables do. Where the redshifts rise by one in a decimal
 * place, a group begins at a multiple of five (0.00, 0.05, ...); elsewhere after every fifth row.
 */
export function rowGroups(redshifts: readonly string[]): RowGroup[] {
  const z = redshifts.map(Number);
  const starts = [0];
  for (let i = 1; i < z.length; i++) {
    const size = i - (starts.at(-1) ?? 0);
    if (size >= GROUP || (size >= FEWEST && beginsGroup(z, i))) starts.push(i);
  }
  return starts.map((start, i) => ({ start, end: starts[i + 1] ?? z.length }));
}

/** Whether row i is a multiple of five steps in a run of decimal steps that goes on after it. */
function beginsGroup(z: readonly number[], i: number): boolean {
  const [before = 0, here = 0, after = Number.NaN] = [z[i - 1], z[i], z[i + 1]];
  const step = after - here;
  const even = Math.abs(step - (here - before)) < 1e-6 * step;
  const place = Math.log10(step);
  const decimal = Math.abs(place - Math.round(place)) < 1e-6;
  const fives = here / (GROUP * step);
  return even && decimal && Math.abs(fives - Math.round(fives)) < 1e-6;
}
