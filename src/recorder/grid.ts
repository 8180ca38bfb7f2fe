import type { CueKind } from '../journal/entry.ts';
import type { JournalState } from '../journal/state.ts';
import type { SessionHeader } from '../model/session.ts';
import { layOutSchedule, partDuration, type ScheduledInterval } from '../schedule/layOut.ts';
import type { TimedInterval } from './whoseTouch.ts';

/** A cue on the session's own clock, in milliseconds. */
export interface GridCue {
  readonly interval: number;
  readonly cue: CueKind;
  readonly at: number;
}

/** The schedule of one session, part by part, before anything is known of when the parts begin. */
export interface Plan {
  readonly intervals: readonly ScheduledInterval[];
  readonly parts: readonly PlannedPart[];
}

export interface PlannedPart {
  readonly phase: string;
  /** Milliseconds from its beginning until its last interval closes. */
  readonly duration: number;
  readonly rounds: number;
  readonly first: ScheduledInterval | null;
}

/** What a header plans; null when it holds a listed schedule, which nobody can record. */
export function planOf(header: SessionHeader): Plan | null {
  const { schedule } = header;
  if (schedule.kind !== 'laid') return null;
  const intervals = layOutSchedule(
    schedule,
    header.children.map((child) => child.id),
  );
  return {
    intervals,
    parts: schedule.phases.map((phase, part) => {
      const own = intervals.filter((line) => line.part === part);
      return {
        phase,
        duration: partDuration(intervals, part),
        rounds: own.at(-1)?.round ?? 0,
        first: own[0] ?? null,
      };
    }),
  };
}

/**
 * The intervals of the parts that have begun, on the session's clock, in order of their cues; of a part that was closed
 * only those whose cue came before.
 * @param continuous a duration record: what is watched ends with its part, while a last look may still be marked
 */
export function timedIntervals(
  plan: Plan,
  { origins, closed }: Pick<JournalState, 'origins' | 'closed'>,
  continuous = false,
): TimedInterval[] {
  return plan.intervals.flatMap((line) => {
    const origin = origins[line.part] ?? null;
    if (origin === null) return [];
    const cueAt = origin + line.cueMs;
    const closedAt = closed[line.part] ?? Number.POSITIVE_INFINITY;
    const closeAt = continuous ? Math.min(origin + line.closeMs, closedAt) : origin + line.closeMs;
    return cueAt < closedAt ? [{ number: line.number, cueAt, closeAt }] : [];
  });
}

/** The cues of the parts that have begun, in order; a part that was closed has none from then on. */
export function gridCues(
  plan: Plan,
  { origins, closed }: Pick<JournalState, 'origins' | 'closed'>,
): GridCue[] {
  const cues = plan.intervals.flatMap((line) => {
    const origin = origins[line.part] ?? null;
    if (origin === null) return [];
    const own: GridCue[] = [{ interval: line.number, cue: line.cue, at: origin + line.cueMs }];
    if (line.recordMs !== null) {
      own.push({ interval: line.number, cue: 'record', at: origin + line.recordMs });
    }
    const end = closed[line.part] ?? null;
    return end === null ? own : own.filter((cue) => cue.at < end);
  });
  return cues.sort((a, b) => a.at - b.at);
}

/** What is due in (after, until]? `list` is in order of `at`. */
export function dueIn<T extends { readonly at: number }>(
  list: readonly T[],
  after: number,
  until: number,
): readonly T[] {
  return list.slice(firstAfter(list, after), firstAfter(list, until));
}

/** Position of the first item after that time. */
function firstAfter(list: readonly { readonly at: number }[], time: number): number {
  let low = 0;
  let high = list.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((list[middle]?.at ?? Number.POSITIVE_INFINITY) <= time) low = middle + 1;
    else high = middle;
  }
  return low;
}
