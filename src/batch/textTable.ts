/** A column: its head, and whether it holds numbers (set to the right). */
export interface Column {
  readonly head: string;
  readonly number?: boolean;
}

/** Lines of text with their columns aligned; nothing for no rows. Columns in which every cell is empty are left out. */
export function textTable(columns: readonly Column[], rows: readonly (readonly string[])[]): string {
  if (rows.length === 0) return '';
  const used = columns
    .map((column, i) => ({ ...column, cells: rows.map((row) => row[i] ?? '') }))
    .filter(({ cells }) => cells.some((cell) => cell !== ''))
    .map((column) => ({
      ...column,
      width: Math.max(...[column.head, ...column.cells].map((cell) => widthOf(cell))),
    }));
  const line = (cells: readonly string[]): string =>
    cells
      .map((cell, i) => {
        const column = used[i];
        const gap = ' '.repeat((column?.width ?? 0) - widthOf(cell));
        return column?.number === true ? gap + cell : cell + gap;
      })
      .join('  ')
      .trimEnd();
  return [
    line(used.map(({ head }) => head)),
    line(used.map(({ width }) => '-'.repeat(width))),
    ...rows.map((_, i) => line(used.map(({ cells }) => cells[i] ?? ''))),
  ].join('\n');
}

/** Characters as people count them; good enough for alignment. */
function widthOf(cell: string): number {
  return Array.from(cell).length;
}
