import type { SessionHeader } from '../model/session.ts';
import { layOutSchedule } from '../schedule/layOut.ts';

/** One interval as the header plans it, whichever kind of schedule it has. Part times in ms; NaN where a table gave none. */
export interface PlannedInterval {
  readonly number: number;
  readonly part: number;
  readonly phase: string | null;
  readonly round: number | null;
  readonly child: string | null;
  readonly openMs: number;
  readonly endMs: number;
  readonly cueMs: number;
  readonly closeMs: number;
  readonly lessonPart: string | null;
  readonly minutesFromBreak: number | null;
}

/** The planned intervals of a session, from its header alone. */
export function plannedIntervals(header: SessionHeader): PlannedInterval[] {
  const { schedule } = header;
  if (schedule.kind === 'laid') {
    return layOutSchedule(
      schedule,
      header.children.map((child) => child.id),
    ).map((line) => ({ ...line, lessonPart: null, minutesFromBreak: null }));
  }
  return schedule.intervals.map((line) => {
    const startMs = line.startMs ?? Number.NaN;
    const endMs = line.endMs ?? startMs + (schedule.intervalMs ?? Number.NaN);
    return {
      number: line.number,
      part: 0,
      phase: line.phase,
      round: line.round,
      child: line.child,
      openMs: startMs,
      endMs,
      cueMs: startMs,
      closeMs: endMs,
      lessonPart: line.lessonPart,
      minutesFromBreak: line.minutesFromBreak,
    };
  });
}
