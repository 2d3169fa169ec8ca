/** What a reader has narrowed a table to, or added to it; absent parts are as printed. */
export interface View {
  /** Redshifts as typed. */
  readonly from?: string | undefined;
  readonly to?: string | undefined;
  /** Ids of the columns shown, `z` aside. */
  readonly columns?: readonly string[] | undefined;
  /** Uncertainties stand below the values. */
  readonly u?: true | undefined;
}

/** Reads a view from the query of an address; `columns` are those the table has, others are passed over. */
export function readView(query: string, columns: readonly string[]): View {
  const parameters = new URLSearchParams(query);
  const asked = parameters.get('columns')?.split(',') ?? [];
  const shown = columns.filter((column) => asked.includes(column));
  return {
    from: parameters.get('from') ?? undefined,
    to: parameters.get('to') ?? undefined,
    columns: shown.length === 0 || shown.length === columns.length ? undefined : shown,
    u: parameters.get('u') === '1' || undefined,
  };
}

/** The query that says this view, "" for the whole table; other parameters of the old query stay. */
export function writeView(query: string, view: View): string {
  const parameters = new URLSearchParams(query);
  const { from, to, columns, u } = view;
  for (const [name, value] of Object.entries({ from, to, columns: columns?.join(','), u: u && '1' })) {
    if (value) parameters.set(name, value);
    else parameters.delete(name);
  }
  const written = parameters.toString().replaceAll('%2C', ',');
  return written === '' ? '' : `?${written}`;
}
