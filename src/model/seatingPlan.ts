import * as z from 'zod/mini';
import { id } from './common.ts';

/** One chair. Neighbouring chairs with the same `table` stand at one table. Columns and rows count from 0, front row = 0. */
export const seat = z.object({
  id,
  column: z.int().check(z.minimum(0), z.maximum(19)),
  row: z.int().check(z.minimum(0), z.maximum(19)),
  table: z.int().check(z.minimum(0)),
  child: z.nullable(id),
});
export type Seat = z.infer<typeof seat>;

/** Where the observer sits, seen from above with the front of the room on top. Screens turn the plan so that this side is at the bottom. */
export const observerSide = z.enum(['back', 'front', 'left', 'right']);
export type ObserverSide = z.infer<typeof observerSide>;

export const seatingPlan = z.object({
  columns: z.int().check(z.minimum(1), z.maximum(20)),
  rows: z.int().check(z.minimum(1), z.maximum(20)),
  seats: z.array(seat),
  observerSide,
});
export type SeatingPlan = z.infer<typeof seatingPlan>;
