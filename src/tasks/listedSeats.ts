import { newId } from '../kernel/ids.ts';
import type { Random } from '../kernel/random.ts';
import type { Seat, SeatingPlan } from '../model/seatingPlan.ts';

/** A wish that could not be fulfilled, and why. */
export interface SeatLeftOpen {
  readonly line: number;
  /** As the list has it. */
  readonly seat: string;
  readonly why: 'not understood' | 'not in the plan' | 'taken';
}

interface SeatWish {
  /** Line of the list. */
  readonly line: number;
  readonly child: string;
  /** As the list has it: `B3` or `2-3` (row from the front, place from the left), or the number of a seat of the plan. */
  readonly seat: string;
}

/**
 * Puts children where a class list says they sit. A row and place that the plan does not have yet becomes a seat; a
 * wish that nobody can read, or that another child has, stays open.
 */
export function placeOnSeats(
  plan: SeatingPlan | null,
  wishes: readonly SeatWish[],
  random: Random,
): { plan: SeatingPlan | null; leftOpen: SeatLeftOpen[] } {
  if (wishes.length === 0) return { plan, leftOpen: [] };
  const leftOpen: SeatLeftOpen[] = [];
  const given = new Set<string>();
  const movers = new Set(wishes.map(({ child }) => child));
  let next: SeatingPlan = plan ?? { columns: 1, rows: 1, seats: [], observerSide: 'back' };
  // The plan as it stood says which seat is the third; children of the list leave theirs first.
  const numbered = [...next.seats].sort((a, b) => a.row - b.row || a.column - b.column);
  for (const wish of wishes) {
    const place = placeOf(wish.seat, numbered);
    const { line, seat: text } = wish;
    if (typeof place === 'string') {
      leftOpen.push({ line, seat: text, why: place });
      continue;
    }
    const standing = next.seats.find((seat) => seat.row === place.row && seat.column === place.column);
    const free = standing?.child == null || movers.has(standing.child);
    if (!free || given.has(`${place.row} ${place.column}`)) {
      leftOpen.push({ line, seat: text, why: 'taken' });
      continue;
    }
    given.add(`${place.row} ${place.column}`);
    const seat: Seat = standing ?? {
      id: newId(random),
      ...place,
      table: next.seats.reduce((last, one) => Math.max(last, one.table), -1) + 1,
      child: null,
    };
    const others = next.seats
      .filter((one) => one.id !== seat.id)
      .map((one) => (one.child === wish.child ? { ...one, child: null } : one));
    next = {
      ...next,
      columns: Math.max(next.columns, place.column + 1),
      rows: Math.max(next.rows, place.row + 1),
      seats: [...others, { ...seat, child: wish.child }],
    };
  }
  return { plan: next.seats.length === 0 ? plan : next, leftOpen };
}

interface Place {
  readonly row: number;
  readonly column: number;
}

function placeOf(text: string, numbered: readonly Seat[]): Place | Exclude<SeatLeftOpen['why'], 'taken'> {
  const compact = text.trim().toUpperCase();
  const lettered = /^([A-T])\s*(\d{1,2})$/.exec(compact);
  if (lettered !== null) return inRoom((lettered[1] ?? '').charCodeAt(0) - 64, Number(lettered[2]));
  const pair = /^(\d{1,2})\s*[-/.,:]\s*(\d{1,2})$/.exec(compact);
  if (pair !== null) return inRoom(Number(pair[1]), Number(pair[2]));
  if (!/^\d{1,3}$/.test(compact)) return 'not understood';
  const seat = numbered[Number(compact) - 1];
  return seat === undefined ? 'not in the plan' : { row: seat.row, column: seat.column };
}

const inRoom = (row: number, column: number): Place | 'not in the plan' =>
  row >= 1 && row <= 20 && column >= 1 && column <= 20
    ? { row: row - 1, column: column - 1 }
    : 'not in the plan';
