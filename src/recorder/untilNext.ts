import type { Reading } from './clock.ts';
import type { Standing } from './standing.ts';

/** A clock that seems to stand still has to be watched for a while before it can be believed again. */
const lookAgainMs: Partial<Record<Reading, number>> = { doubtful: 50, lost: 250 };

/** While the schedule stands still nothing is due; the screen's clock is looked at so often (ms). */
const pausedMs = 1000;

/**
 * Milliseconds until a running session has to be looked at again: whole seconds for the screen, and each thing that is
 * due at its own moment.
 * @param next session times of what comes next; infinite for nothing
 */
export function untilNext(now: number, place: Standing, reading: Reading, next: readonly number[]): number {
  const second = (Math.floor(now / 1000) + 1) * 1000;
  const due = place.phase === 'paused' ? pausedMs : Math.min(second, ...next) - now;
  // A strange reading of the audio clock is looked at again soon, before a cue comes out at a wrong moment or not at all.
  return Math.max(1, Math.ceil(Math.min(due, lookAgainMs[reading] ?? due)));
}
