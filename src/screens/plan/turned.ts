import type { Seat, SeatingPlan } from '../../model/seatingPlan.ts';

/** A side of a place on the glass. */
export type Side = 'top' | 'right' | 'bottom' | 'left';

export interface Place {
  readonly column: number;
  readonly row: number;
}

export interface TurnedSeat extends Seat {
  /** 0-based place on the glass: x from the left, y from the top; the observer sits below the last y. */
  readonly x: number;
  readonly y: number;
  /** The sides on which a seat of the same table stands right beside it. */
  readonly joined: readonly Side[];
}

export interface TurnedPlan {
  readonly columns: number;
  readonly rows: number;
  /** In reading order on the glass: top to bottom, left to right. */
  readonly seats: readonly TurnedSeat[];
  /** Where the front of the room is on the glass. */
  readonly front: Side;
}

type Frame = Pick<SeatingPlan, 'columns' | 'rows' | 'observerSide'>;

/** Where a place of the room is on the glass, when the observer's side is at the bottom. */
export function onGlass(
  { columns, rows, observerSide }: Frame,
  { column, row }: Place,
): { x: number; y: number } {
  switch (observerSide) {
    case 'back':
      return { x: column, y: row };
    case 'front':
      return { x: columns - 1 - column, y: rows - 1 - row };
    case 'left':
      return { x: row, y: columns - 1 - column };
    case 'right':
      return { x: rows - 1 - row, y: column };
  }
}

const fronts = { back: 'top', front: 'bottom', left: 'left', right: 'right' } as const;

const steps: readonly { readonly side: Side; readonly x: number; readonly y: number }[] = [
  { side: 'top', x: 0, y: -1 },
  { side: 'right', x: 1, y: 0 },
  { side: 'bottom', x: 0, y: 1 },
  { side: 'left', x: -1, y: 0 },
];

/** The plan as the observer sees it: a quarter, half or no turn, never mirrored. */
export function turned(plan: SeatingPlan): TurnedPlan {
  const sideways = plan.observerSide === 'left' || plan.observerSide === 'right';
  const placed = plan.seats.map((seat) => ({ ...seat, ...onGlass(plan, seat) }));
  const tables = new Map(placed.map((seat) => [`${seat.x} ${seat.y}`, seat.table]));
  const seats = placed
    .map((seat) => ({
      ...seat,
      joined: steps
        .filter((step) => tables.get(`${seat.x + step.x} ${seat.y + step.y}`) === seat.table)
        .map((step) => step.side),
    }))
    .sort((a, b) => a.y - b.y || a.x - b.x);
  return {
    columns: sideways ? plan.rows : plan.columns,
    rows: sideways ? plan.columns : plan.rows,
    seats,
    front: fronts[plan.observerSide],
  };
}

/** Widths of the columns or heights of the rows, in seats: one where a seat stands, less for an aisle. */
export function tracks(count: number, taken: ReadonlySet<number>, aisle = 0.4): number[] {
  return Array.from({ length: count }, (_, i) => (taken.has(i) ? 1 : aisle));
}
