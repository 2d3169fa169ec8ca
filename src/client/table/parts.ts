/** One row of the table of numbers. */
export interface Row {
  readonly element: HTMLTableRowElement;
  /** As the grid writes it. */
  readonly written: string;
  readonly z: number;
}

/** A column after z. */
export interface ColumnPart {
  readonly id: string;
  readonly name: string;
  /** Position among the cells of a row; z is 0. */
  readonly at: number;
}

/** The table of numbers, and what can be done to it. */
export interface Parts {
  readonly table: HTMLTableElement;
  readonly rows: readonly Row[];
  /** `rows[n].z`, ascending. */
  readonly redshifts: readonly number[];
  readonly columns: readonly ColumnPart[];
}

/** Reads the table as the page printed it: a row's id is `z=` and its redshift, a head names its column. */
export function partsOf(table: HTMLTableElement): Parts {
  const rows = Array.from(table.tBodies)
    .flatMap((group) => Array.from(group.rows))
    .map((element) => ({ element, written: element.id.slice(2), z: Number(element.id.slice(2)) }));
  const heads = Array.from(table.tHead?.rows[0]?.cells ?? []);
  const columns = heads.map((head, at) => ({ id: head.dataset.column ?? '', name: nameOf(head), at })).slice(1);
  return { table, rows, redshifts: rows.map(({ z }) => z), columns };
}

function nameOf(head: HTMLElement): string {
  return head.querySelector<HTMLElement>('[title]')?.title ?? head.textContent.trim();
}
