import { newId } from '../kernel/ids.ts';
import type { Random } from '../kernel/random.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import type { Seat, SeatingPlan } from '../model/seatingPlan.ts';

/**
 * Rooms as they often stand: tables of two in rows, tables of four, or one horseshoe open to the front.
 * `columns` and `rows` count tables.
 */
export type PlanPreset =
  | { readonly kind: 'pairs'; readonly columns: number; readonly rows: number }
  | { readonly kind: 'fours'; readonly columns: number; readonly rows: number }
  | { readonly kind: 'horseshoe'; readonly seats: number };

/** The most columns and rows that a plan can have. */
const most = 20;

type Place = Pick<Seat, 'column' | 'row' | 'table'>;

/** An empty plan; `task.planTooLarge` when it would not fit, `task.planEmpty` when it has no seat. */
export function planFromPreset(preset: PlanPreset, random: Random): Result<SeatingPlan> {
  const places = placesOf(preset);
  if (places.length === 0) return problem('task.planEmpty');
  const columns = Math.max(...places.map((place) => place.column)) + 1;
  const rows = Math.max(...places.map((place) => place.row)) + 1;
  if (columns > most || rows > most) return problem('task.planTooLarge', { most });
  const seats = places.map((place): Seat => ({ id: newId(random), ...place, child: null }));
  return ok({ columns, rows, seats, observerSide: 'back' });
}

function placesOf(preset: PlanPreset): Place[] {
  if (preset.kind === 'horseshoe') return horseshoe(whole(preset.seats, most * 3));
  const [across, down] = [whole(preset.columns, most), whole(preset.rows, most)];
  const deep = preset.kind === 'pairs' ? 1 : 2;
  // A table is two chairs wide with an aisle of one column beside it; tables of four have an aisle behind them too.
  return Array.from({ length: across * down }, (_, table) =>
    Array.from(
      { length: 2 * deep },
      (_, k): Place => ({
        column: (table % across) * 3 + (k % 2),
        row: Math.floor(table / across) * (deep === 1 ? 1 : 3) + Math.floor(k / 2),
        table,
      }),
    ),
  ).flat();
}

/** Down the left side, along the back, up the right side: one table. */
function horseshoe(seats: number): Place[] {
  const side = Math.floor(seats / 3);
  const back = seats - 2 * side;
  return Array.from({ length: seats }, (_, k): Place => {
    if (k < side) return { column: 0, row: k, table: 0 };
    if (k < side + back) return { column: k - side + 1, row: side, table: 0 };
    return { column: back + 1, row: side - 1 - (k - side - back), table: 0 };
  });
}

const whole = (n: number, limit: number): number =>
  Number.isFinite(n) ? Math.min(Math.max(0, Math.floor(n)), limit) : 0;
