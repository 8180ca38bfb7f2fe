import type { SeatingPlan } from '../../model/seatingPlan.ts';
import { turned } from './turned.ts';

/** A seat as its observer would say where it is: aisles do not count. */
export interface SeatPlace {
  /** The row nearest to the observer is 1. */
  readonly row: number;
  /** From the left of its row, 1-based, free seats included. */
  readonly place: number;
  /** Seats in its row. */
  readonly of: number;
}

/** Where the observer sees a seat; null for a seat that the plan does not have. */
export function seatPlace(plan: SeatingPlan, seat: string): SeatPlace | null {
  const { seats } = turned(plan);
  const found = seats.find(({ id }) => id === seat);
  if (found === undefined) return null;
  const nearest = [...new Set(seats.map(({ y }) => y))].reverse();
  const row = seats.filter(({ y }) => y === found.y);
  return { row: nearest.indexOf(found.y) + 1, place: row.indexOf(found) + 1, of: row.length };
}
