import type { JournalEntry } from '../journal/entry.ts';
import { inOrder } from '../journal/order.ts';
import { isCovered, type JournalState } from '../journal/state.ts';
import type { EpochMs } from '../kernel/units.ts';
import { epochOf } from '../kernel/wallTime.ts';

export interface Resumption {
  /** Session time of the last sign of life. */
  readonly from: number;
  /** Where the schedule stands now, by the wall clock; equal to `from` when paused or when the wall clock was set back. */
  readonly now: number;
}

/**
 * Where a session that was cut off stands: its grid has gone on since its last entry, by the wall clock, which is all
 * that outlives a dead battery (so it is an estimate). A paused schedule has stood still. null without entries.
 */
export function resumption(
  state: JournalState,
  journal: readonly JournalEntry[],
  wallNow: EpochMs,
): Resumption | null {
  const last = inOrder(journal).at(-1);
  if (last === undefined) return null;
  const from = state.read > 1 ? Math.max(state.at, last.at) : last.at;
  if (isCovered(state, 'paused')) return { from, now: from };
  const elapsed = wallNow - epochOf(last.wall);
  return { from, now: Math.max(from, last.at + (elapsed > 0 ? elapsed : 0)) };
}
