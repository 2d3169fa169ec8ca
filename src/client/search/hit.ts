/** One line of the list of results. */
export interface Hit {
  readonly href: string;
  readonly title: string;
  /** Where it stands: set, grid, edition. */
  readonly detail: string;
  /** The value, where the index knows it. */
  readonly value?: Value;
  /** The cell of a CSV file that holds the value, where the index does not. */
  readonly cell?: Cell;
}

export interface Value {
  /** As the keeper or the CSV writes it. */
  readonly written: string;
  /** Standard uncertainty. */
  readonly u?: string;
  /** Plain text, "" if dimensionless. */
  readonly unit: string;
}

export interface Cell {
  readonly csv: string;
  readonly redshift: string;
  readonly column: string;
  readonly unit: string;
}

export function upperFirst(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
