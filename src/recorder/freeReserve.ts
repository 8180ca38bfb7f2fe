import { awayNow, type JournalState } from '../journal/state.ts';
import type { Id } from '../kernel/ids.ts';

/** The reserve who would step in for a child who leaves now: the first who is there and stands in for nobody; null for none. */
export function freeReserve(state: JournalState, leaving: Id): Id | null {
  const standing = new Set(state.standIns.filter(({ to }) => to === null).map(({ by }) => by));
  const free = (state.header.reserves ?? []).find(
    ({ id }) => id !== leaving && !standing.has(id) && awayNow(state, id) === null,
  );
  return free?.id ?? null;
}
