import { requireThat } from './requireThat.ts';

/** A square table of counts: rows = first observer, columns = second. */
export type CountTable = readonly (readonly number[])[];

export interface Margins {
  readonly n: number;
  readonly rows: number[];
  readonly columns: number[];
  /** Sum of the diagonal. */
  readonly agreed: number;
}

/** Checks that the table is square and holds counts, and sums it up. An empty or all-zero table is allowed. */
export function margins(table: CountTable, argument = 'table'): Margins {
  const size = table.length;
  const rows = new Array<number>(size).fill(0);
  const columns = new Array<number>(size).fill(0);
  let n = 0;
  let agreed = 0;
  table.forEach((row, i) => {
    requireThat(row.length === size, argument, 'must be square');
    row.forEach((count, j) => {
      requireThat(Number.isFinite(count) && count >= 0, argument, 'must hold counts, none negative');
      rows[i] = (rows[i] as number) + count;
      columns[j] = (columns[j] as number) + count;
      n += count;
      if (i === j) agreed += count;
    });
  });
  return { n, rows, columns, agreed };
}

/** The cells of a 2 × 2 table by row. */
export function fourCells(table: CountTable, argument = 'table'): [number, number, number, number] {
  requireThat(table.length === 2, argument, 'must be 2 by 2');
  margins(table, argument);
  const [[a, b], [c, d]] = table as unknown as [[number, number], [number, number]];
  return [a, b, c, d];
}
