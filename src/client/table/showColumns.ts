import type { Parts } from './parts.ts';

/** Hides the columns whose ids are not among `shown`; z always stays. */
export function showColumns({ table, columns }: Parts, shown: readonly string[]): void {
  const rows = Array.from(table.rows).filter((row) => row.parentElement !== table.tFoot);
  const lines: (HTMLCollection | undefined)[] = [
    table.querySelector('colgroup')?.children,
    ...rows.map((row) => row.cells),
  ];
  for (const { id, at } of columns) {
    const hidden = !shown.includes(id);
    for (const line of lines) {
      const cell = line?.[at];
      if (cell instanceof HTMLElement) cell.hidden = hidden;
    }
  }
  // The stamp at the foot spans the whole table; spanning hidden columns it would leave their room empty.
  for (const cell of table.tFoot?.rows[0]?.cells ?? []) cell.colSpan = shown.length + 1;
}
