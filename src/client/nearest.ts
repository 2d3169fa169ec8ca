/** Where a redshift stands in an ascending list: on a row, or between two of which one may be missing at an end. */
export type Standing =
  | { readonly at: number }
  | { readonly below: number | undefined; readonly above: number | undefined };

/** Index of the first entry >= z; the length of the list if there is none. */
export function firstFrom(ascending: readonly number[], z: number): number {
  let low = 0;
  let high = ascending.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((ascending[middle] as number) < z) low = middle + 1;
    else high = middle;
  }
  return low;
}

/**
 * Finds z in an ascending list. Two decimals that mean the same number ("0.5", "0.50") are the same double, so
 * equality is exact.
 */
export function nearest(ascending: readonly number[], z: number): Standing {
  const next = firstFrom(ascending, z);
  if (ascending[next] === z) return { at: next };
  return { below: next > 0 ? next - 1 : undefined, above: next < ascending.length ? next : undefined };
}
