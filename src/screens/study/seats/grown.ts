import type { SeatingPlan } from '../../../model/seatingPlan.ts';
import type { Place } from '../../plan/turned.ts';

/** The table that a new seat joins: that of a seat right beside it, in the row first; undefined where none stands. */
export function tableBeside(plan: SeatingPlan, { column, row }: Place): number | undefined {
  const beside = [
    [column - 1, row],
    [column + 1, row],
    [column, row - 1],
    [column, row + 1],
  ];
  for (const [c, r] of beside) {
    const seat = plan.seats.find((one) => one.column === c && one.row === r);
    if (seat !== undefined) return seat.table;
  }
  return undefined;
}

/** The plan moved so that a place beyond its left or front edge lies in it, and where the place is then. */
export function grownFor(plan: SeatingPlan, place: Place): { plan: SeatingPlan; place: Place } {
  const [right, back] = [place.column < 0 ? 1 : 0, place.row < 0 ? 1 : 0];
  if (right === 0 && back === 0) return { plan, place };
  return {
    plan: {
      ...plan,
      columns: plan.columns + right,
      rows: plan.rows + back,
      seats: plan.seats.map((seat) => ({ ...seat, column: seat.column + right, row: seat.row + back })),
    },
    place: { column: place.column + right, row: place.row + back },
  };
}

/** The plan without empty columns and rows at its edges; a plan without seats stays as it is. */
export function trimmed(plan: SeatingPlan): SeatingPlan {
  if (plan.seats.length === 0) return plan;
  const columns = plan.seats.map((seat) => seat.column);
  const rows = plan.seats.map((seat) => seat.row);
  const [left, front] = [Math.min(...columns), Math.min(...rows)];
  return {
    ...plan,
    columns: Math.max(...columns) - left + 1,
    rows: Math.max(...rows) - front + 1,
    seats: plan.seats.map((seat) => ({ ...seat, column: seat.column - left, row: seat.row - front })),
  };
}

/** Where a place of `from` is in `to`, the same room after it grew or was trimmed; a room without a common seat did neither. */
export function moved(from: SeatingPlan, to: SeatingPlan, { column, row }: Place): Place {
  for (const before of from.seats) {
    const after = to.seats.find((one) => one.id === before.id);
    if (after !== undefined)
      return { column: column + after.column - before.column, row: row + after.row - before.row };
  }
  return { column, row };
}
