import type { CodeSet } from '../model/codeSet.ts';
import type { LookMoment, Method } from '../model/protocol.ts';
import type { SessionChild, SessionHeader } from '../model/session.ts';

/** How a session was recorded, whichever kind of schedule its header holds. */
export interface RecordingFacts {
  readonly method: Method;
  readonly intervalMs: number | null;
  readonly observeMs: number | null;
  /** null unless looks are moments (momentary, headcount) and it is known. */
  readonly lookAt: LookMoment | null;
  readonly codeSet: CodeSet;
  readonly phases: readonly (string | null)[];
}

/** Everybody whose turn may come: the target children in the order of the schedule, then the reserves. */
export function childrenOf({ children, reserves }: SessionHeader): readonly SessionChild[] {
  return reserves === undefined ? children : [...children, ...reserves];
}

/** The method, lengths, codes and phases of a session. */
export function recordingFacts(header: SessionHeader): RecordingFacts {
  const { schedule } = header;
  if (schedule.kind === 'laid') {
    const { protocol } = schedule;
    return {
      method: protocol.method,
      intervalMs: protocol.intervalMs,
      observeMs: protocol.observeMs,
      lookAt: protocol.method === 'momentary' || protocol.method === 'headcount' ? protocol.lookAt : null,
      codeSet: protocol.codeSet,
      phases: schedule.phases,
    };
  }
  return {
    method: schedule.method,
    intervalMs: schedule.intervalMs,
    observeMs: schedule.observeMs,
    lookAt: null,
    codeSet: schedule.codeSet,
    phases: [...new Set(schedule.intervals.map((line) => line.phase))],
  };
}
