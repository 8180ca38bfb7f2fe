import type { JournalEntry } from '../journal/entry.ts';
import { fold } from '../journal/step.ts';
import type { SessionHeader } from '../model/session.ts';
import { isCalledOff, lastStart } from './calledOff.ts';
import { planOf } from './grid.ts';
import type { LiveOptions, LiveSession } from './liveSession.ts';
import type { RecorderPorts } from './ports.ts';
import { RunningSession } from './runningSession.ts';
import { SessionRun } from './sessionRun.ts';

/** Makes a session of its frozen header, ready to begin. Throws for a listed schedule, which no screen offers. */
export function createLiveSession(
  header: SessionHeader,
  ports: RecorderPorts,
  options: LiveOptions,
): LiveSession {
  const plan = planOf(header);
  if (plan === null || header.schedule.kind !== 'laid') {
    throw new Error('A schedule from a table cannot be recorded.');
  }
  const inputs = { header, protocol: header.schedule.protocol, plan, ports };
  const { resumeFrom = [], ...others } = options;
  const again = (calledOff: readonly JournalEntry[]): SessionRun =>
    new SessionRun({ ...inputs, options: { ...others, ...lastStart(calledOff) }, calledOff });
  const first = isCalledOff(fold(header, resumeFrom), resumeFrom)
    ? again(resumeFrom)
    : new SessionRun({ ...inputs, options });
  return new RunningSession(first, again);
}
