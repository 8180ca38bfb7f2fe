import { problem, type Result } from '../kernel/result.ts';
import { type SessionHeader, sessionHeader } from '../model/session.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import { requireObserver } from './edits.ts';
import type { Deps } from './ports.ts';

/** What a session adds to the visit that it belongs to. */
export interface Sitting extends Pick<SessionHeader, 'id' | 'role' | 'practice' | 'date'> {
  /** The observer's id. */
  readonly observer: string;
  readonly familiarisation?: boolean | undefined;
  readonly fromPaper?: boolean | undefined;
}

/** The header of one observer's session at a visit, made of the visit's frozen plan. */
export async function headerOfVisit(
  deps: Deps,
  plan: VisitPlan,
  sitting: Sitting,
): Promise<Result<SessionHeader>> {
  const observer = await requireObserver(deps, sitting.observer);
  if (!observer.ok) return observer;
  if (observer.value.study !== plan.study.id) return problem('task.noObserver', { id: sitting.observer });
  const value: SessionHeader = {
    id: sitting.id,
    study: plan.study.id,
    classroom: plan.classroom,
    condition: plan.condition,
    visit: plan.visit,
    visitLabel: null,
    observer: { id: observer.value.id, name: observer.value.name },
    role: sitting.role,
    practice: sitting.practice,
    ...(sitting.familiarisation === true ? { familiarisation: true } : {}),
    ...(sitting.fromPaper === true ? { fromPaper: true } : {}),
    date: sitting.date,
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
  return sessionHeader.safeParse(value).success ? { ok: true, value } : problem('task.visitOutOfRange');
}
