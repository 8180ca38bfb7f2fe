import fc from 'fast-check';

/** Square tables of counts, 2 to 5 codes, not all zero. */
export const squareTable = fc
  .integer({ min: 2, max: 5 })
  .chain((q) =>
    fc.array(fc.array(fc.integer({ min: 0, max: 60 }), { minLength: q, maxLength: q }), {
      minLength: q,
      maxLength: q,
    }),
  )
  .filter((table) => table.flat().some((count) => count > 0));

/** The table with its codes in another order, the same for both observers. */
export function relabelled(table: number[][], order: number[]): number[][] {
  return order.map((i) => order.map((j) => (table[i] as number[])[j] as number));
}

export function transposed(table: number[][]): number[][] {
  return table.map((_, i) => table.map((row) => row[i] as number));
}

export const tableAndOrder = squareTable.chain((table) =>
  fc.tuple(
    fc.constant(table),
    fc.shuffledSubarray(
      table.map((_, i) => i),
      { minLength: table.length },
    ),
  ),
);
