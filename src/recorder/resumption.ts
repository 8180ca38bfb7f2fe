import type { EntryKind, JournalEntry } from '../journal/entry.ts';
import { inOrder } from '../journal/order.ts';
import { isCovered, type JournalState } from '../journal/state.ts';
import type { EpochMs } from '../kernel/units.ts';
import { epochOf } from '../kernel/wallTime.ts';
import { isCalledOff } from './calledOff.ts';

export interface Resumption {
  /** Session time of the last sign of life. */
  readonly from: number;
  /** Where the schedule stands now, by the wall clock; equal to `from` when paused or when the wall clock was set back. */
  readonly now: number;
}

/** So many of the latest entries are asked: over hours the wall clock is trimmed, a little at a time. */
const asked = 20;

/** From these on session time and wall clock may run apart by another amount than before. */
const breaks: ReadonlySet<string> = new Set<EntryKind>(['started', 'paused', 'resumed', 'gap']);

/**
 * Where a session that was cut off stands: its grid has gone on since its last entry, by the wall clock, which is all
 * that outlives a dead battery (so it is an estimate). A paused schedule has stood still. null without entries, and where
 * the start was called off.
 */
export function resumption(
  state: JournalState,
  journal: readonly JournalEntry[],
  wallNow: EpochMs,
): Resumption | null {
  const ordered = inOrder(journal);
  const last = ordered.at(-1);
  if (last === undefined || isCalledOff(state, journal)) return null;
  // While both observers wait for their second, session time is still below 0, and the journal has spoken of no later one.
  const from = state.at > 0 ? Math.max(state.at, last.at) : last.at;
  if (isCovered(state, 'paused')) return { from, now: from };
  // An entry may be written down later than what it tells of (a busy page), never earlier: the smallest distance holds.
  const since = Math.max(
    0,
    ordered.length - asked,
    ordered.findLastIndex((entry) => breaks.has(entry.kind)),
  );
  const apart = Math.min(...ordered.slice(since).map((entry) => epochOf(entry.wall) - entry.at));
  const now = Number.isFinite(apart) ? wallNow - apart : from;
  // Before the last sign of life: the wall clock was set back, and nobody knows how long it was.
  return { from, now: Math.max(from, now) };
}
