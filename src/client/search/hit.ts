/** One line of the list of results. */
export interface Hit {
  readonly href: string;
  readonly title: string;
  /** Where it stands: set, grid, edition. */
  readonly detail: string;
  /** The value, with its unit, where the index knows it. */
  readonly value?: string;
  /** The cell of a CSV file that holds the value, where the index does not. */
  readonly cell?: Cell;
}

export interface Cell {
  readonly csv: string;
  readonly redshift: string;
  readonly column: string;
  readonly unit: string;
}

/** "67.36 km/s/Mpc"; a number without unit stands alone. */
export function withUnit(value: string, unit: string): string {
  return unit === '' ? value : `${value} ${unit}`;
}

export function upperFirst(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
