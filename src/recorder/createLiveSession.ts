import type { SessionHeader } from '../model/session.ts';
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
  return new RunningSession(
    new SessionRun({ header, protocol: header.schedule.protocol, plan, ports, options }),
  );
}
