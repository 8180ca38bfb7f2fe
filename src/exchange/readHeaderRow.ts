import { excerpt, type Fault, fault } from './problemValues.ts';
import { columnName } from './scanCsv.ts';
import { neededColumns, type TableColumn, tableColumns } from './tableColumns.ts';

export interface HeaderRow {
  /** Where each known column stands. */
  readonly places: ReadonlyMap<TableColumn, number>;
  /** The other columns, as they are written, and where they stand. */
  readonly others: readonly { readonly name: string; readonly place: number }[];
  readonly width: number;
}

/** The header row: names in any order, trimmed, whatever their case. */
export function readHeaderRow(
  cells: readonly string[],
): { readonly ok: true; readonly header: HeaderRow } | { readonly ok: false; readonly fault: Fault } {
  const places = new Map<TableColumn, number>();
  const others: { name: string; place: number }[] = [];
  for (const [place, cell] of cells.entries()) {
    const name = columnName(cell);
    const column = tableColumns.find((known) => known === name);
    if (column === undefined) {
      if (name !== '') others.push({ name: cell.trim(), place });
    } else if (places.has(column)) return { ok: false, fault: fault('table.columnTwice', { column }) };
    else places.set(column, place);
  }
  const absent = neededColumns.filter((column) => !places.has(column));
  if (absent.length === 0) return { ok: true, header: { places, others, width: cells.length } };
  const found = excerpt(cells.map((cell) => excerpt(cell.trim())).join(', '));
  return { ok: false, fault: fault('table.columns', { absent: absent.join(', '), found }) };
}
