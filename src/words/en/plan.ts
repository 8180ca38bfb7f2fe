import type { Format } from '../format.ts';

type F = Format;

/** The seating plan as a picture. */
export const plan = {
  you: 'you',
  seatOf: ({ name, row, column }: { name: string; row: number; column: number }, f: F) =>
    `${name}, row ${f.whole(row)}, place ${f.whole(column)}`,
  seatFree: ({ row, column }: { row: number; column: number }, f: F) =>
    `Free seat, row ${f.whole(row)}, place ${f.whole(column)}`,
  seatPlace: ({ row, column }: { row: number; column: number }, f: F) =>
    `Put a seat in row ${f.whole(row)}, place ${f.whole(column)}`,
} as const;
