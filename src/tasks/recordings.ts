import { fold } from '../journal/step.ts';
import { newId } from '../kernel/ids.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import { dateOf } from '../kernel/wallTime.ts';
import type { Role, SessionHeader } from '../model/session.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import { appendAfterwards } from './appendAfterwards.ts';
import { headerOfVisit } from './headerOfVisit.ts';
import type { Deps, SessionSummary } from './ports.ts';

export interface SessionWish {
  /** The observer's id. */
  readonly observer: string;
  readonly role: Role | null;
  readonly practice: boolean;
  readonly familiarisation?: boolean;
}

/** Keeps the header of a session that is about to begin; its first entry is the recorder's. */
export async function startSession(
  deps: Deps,
  plan: VisitPlan,
  wish: SessionWish,
): Promise<Result<SessionHeader>> {
  const made = await headerOfVisit(deps, plan, {
    ...wish,
    id: newId(deps.random),
    date: dateOf(deps.clock.wall()),
  });
  if (!made.ok) return made;
  const header = made.value;
  const kept = await deps.store.createSession(header);
  return kept.ok ? ok(header) : kept;
}

/** Sessions that were begun on this tablet and never ended, newest first. */
export function resumeCandidates({ store }: Deps): Promise<Result<SessionSummary[]>> {
  return store.unfinishedSessions();
}

/** Ends a session that nobody will resume, where its journal stops. What was not reached is missing: ended early. */
export async function finishUnfinished(deps: Deps, session: string): Promise<Result<null>> {
  const summary = await deps.store.session(session);
  if (!summary.ok) return summary;
  if (summary.value === null) return problem('task.noSession', { id: session });
  if (summary.value.ended !== null) return problem('task.sessionEnded');
  const ended = await appendAfterwards(deps, session, (stored) => {
    const { at } = fold(stored.header, stored.journal);
    return ok({ at, body: { kind: 'ended', reason: 'early' } });
  });
  return ended.ok ? deps.store.pack(session) : ended;
}
