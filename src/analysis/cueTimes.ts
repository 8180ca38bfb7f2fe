import type { JournalState } from '../journal/state.ts';
import { epochOf } from '../kernel/wallTime.ts';
import type { SessionRecord } from './sessionRecord.ts';

/** When each interval's cue came, by the clock that the two tablets were set by: interval number → ms since 1970. */
export interface CueTimes {
  /** `cues`: as the journal has them; `starts`: the times that a table gives. */
  readonly by: 'cues' | 'starts';
  readonly times: ReadonlyMap<number, number>;
}

/**
 * The wall times of a record's cues: the entry's wall clock moved to the moment of delivery, and by the nudges of the
 * tick check. A clock that was set in mid-session is read as if it had gone on: what counts is the clock by which the
 * observers began. A table has none, but it may say when each interval began. null where nothing is known.
 */
export function cueTimes({ state, phase }: SessionRecord): CueTimes | null {
  const numbers = state.planned.filter((line) => line.phase === phase);
  const { schedule, plannedStart } = state.header;
  const times = new Map<number, number>();
  if (schedule.kind === 'listed') {
    const start = plannedStart === null ? Number.NaN : epochOf(plannedStart);
    for (const { number, openMs } of numbers)
      if (!Number.isNaN(start + openMs)) times.set(number, start + openMs);
    return times.size === 0 ? null : { by: 'starts', times };
  }
  const setForth = clockSetBy(state);
  for (const { number } of numbers) {
    // The last one: an interval that a pause broke is done once more.
    const cue = state.cues
      .get(number)
      ?.findLast(({ delivered, cue: kind }) => delivered !== null && kind !== 'record');
    if (cue === undefined || cue.delivered === null) continue;
    const wall = epochOf(cue.wall);
    if (!Number.isNaN(wall)) times.set(number, wall - setForth(cue) + state.nudge + (cue.delivered - cue.at));
  }
  return times.size === 0 ? null : { by: 'cues', times };
}

type Stamp = Pick<JournalState['entries'][number], 'writer' | 'seq'>;

/**
 * By how many ms the wall clock had been set forth when an entry was written. While a session runs its time and the
 * wall clock go alike, so what their distance changes by at a gap of the clock is what it was set by.
 */
function clockSetBy({ entries }: JournalState): (entry: Stamp) => number {
  const sets: { writer: string; seq: number; by: number }[] = [];
  const before = new Map<string, { readonly ahead: number; readonly paused: boolean }>();
  for (const { writer, seq, wall, at, ...entry } of entries) {
    const ahead = epochOf(wall) - at;
    const last = before.get(writer);
    // In a pause session time stands, so there the two cannot be told apart: left as it is.
    if (entry.kind === 'gap' && 'cause' in entry && entry.cause === 'clock' && last?.paused === false)
      sets.push({ writer, seq, by: ahead - last.ahead });
    const paused = entry.kind === 'paused' || (last?.paused === true && entry.kind !== 'resumed');
    before.set(writer, { ahead, paused });
  }
  return (entry) =>
    sets.reduce((sum, set) => (set.writer === entry.writer && set.seq <= entry.seq ? sum + set.by : sum), 0);
}
