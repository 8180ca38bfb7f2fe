import { fold } from '../journal/step.ts';
import { newId } from '../kernel/ids.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import { dateOf } from '../kernel/wallTime.ts';
import { type Role, type SessionHeader, sessionHeader } from '../model/session.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import { appendAfterwards } from './appendAfterwards.ts';
import { requireObserver } from './edits.ts';
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
  const observer = await requireObserver(deps, wish.observer);
  if (!observer.ok) return observer;
  if (observer.value.study !== plan.study.id) return problem('task.noObserver', { id: wish.observer });
  const header: SessionHeader = {
    id: newId(deps.random),
    study: plan.study.id,
    classroom: plan.classroom,
    condition: plan.condition,
    visit: plan.visit,
    visitLabel: null,
    observer: { id: observer.value.id, name: observer.value.name },
    role: wish.role,
    practice: wish.practice,
    ...(wish.familiarisation === true ? { familiarisation: true } : {}),
    date: dateOf(deps.clock.wall()),
    plannedStart: plan.plannedStart,
    children: plan.children,
    ...(plan.reserves === undefined ? {} : { reserves: plan.reserves }),
    plan: plan.plan,
    draw: plan.draw,
    orderSeed: plan.orderSeed,
    schedule: plan.schedule,
    app: deps.app,
    device: deps.device,
    timeZone: deps.timeZone,
  };
  if (!sessionHeader.safeParse(header).success) return problem('task.visitOutOfRange');
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
