import { type Problem, problem } from '../kernel/result.ts';
import { toWallTime } from '../kernel/wallTime.ts';
import type { Book } from './book.ts';
import type { SessionClock } from './clock.ts';
import { headStartMs } from './deeds.ts';
import type { Beginning, LiveOptions } from './liveSession.ts';
import type { RecorderPorts } from './ports.ts';
import { countInMs } from './standing.ts';

/** From the tap to session time 0 where no second was agreed: time to lay the first tick, then three, two, one. */
const countInFromTap = countInMs + headStartMs;

type Ports = Pick<RecorderPorts, 'page' | 'wall' | 'audio'>;

/**
 * Milliseconds from now to session time 0. The wall clock is read as the tick check says.
 * @param sinceTap milliseconds since the tap: two observers who tap together begin together, however long either sound takes
 */
function waitMs({ wall }: Pick<Ports, 'wall'>, { at, nudgeMs = 0 }: Beginning, sinceTap = 0): number {
  return at === undefined ? Math.max(headStartMs, countInFromTap - sinceTap) : at - (wall.now() + nudgeMs);
}

/** Why it cannot begin like this: the agreed second is so near that nobody could be counted in. */
export function tooNear(ports: Pick<Ports, 'wall'>, how: Beginning): Problem | null {
  if (waitMs(ports, how) >= countInFromTap) return null;
  const refused = problem('recorder.startTooNear', { seconds: Math.ceil(countInFromTap / 1000) });
  return refused.ok ? null : refused.problem;
}

/** Starts the time of a session that has no journal yet, and writes down how it began. */
export function openAnew(
  book: Book,
  clock: SessionClock,
  ports: Ports,
  options: LiveOptions,
  how: Beginning,
  sinceTap: number,
): void {
  const { page, wall, audio } = ports;
  const wait = waitMs(ports, how, sinceTap);
  clock.start(page.now(), -wait);
  const latency = audio.facts()?.latencyMs ?? null;
  book.write(-wait, {
    kind: 'started',
    checks: [...options.checks],
    anyway: options.anyway,
    ...(latency === null ? {} : { audioLatencyMs: latency }),
    ...(how.at === undefined ? {} : { agreedStart: toWallTime(how.at, wall.offsetMinutes(how.at)) }),
  });
  // A check that found nothing to nudge is a finding, too.
  if (how.nudgeMs !== undefined) book.write(-wait, { kind: 'clockNudged', by: Math.round(how.nudgeMs) });
}
