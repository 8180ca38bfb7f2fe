import { newId } from '../kernel/ids.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import type { Child } from '../model/classroom.ts';
import type { SessionChild } from '../model/session.ts';
import { type VisitPlan, visitPlan } from '../model/visitPlan.ts';
import { intervalsInPart } from '../schedule/layOut.ts';
import { hasTarget, looksAtEverybody, orderOfDay, watchesOne } from '../schedule/orderOfDay.ts';
import type { Attendance } from '../schedule/replaceAbsent.ts';
import { requireClassroom, requireStudy } from './edits.ts';
import type { Deps } from './ports.ts';
import { newSeed } from './seeds.ts';
import { freezeVersions } from './usedVersions.ts';

export interface VisitWish {
  readonly classroom: string;
  readonly protocol: { readonly id: string; readonly version?: number };
  readonly phases: readonly string[];
  /** Children who are not there today. */
  readonly absent: readonly string[];
  readonly plannedStart: string | null;
  /** For the order of the children; chance gives one when it is left out. */
  readonly orderSeed?: string;
  /** The child to be the target, or the only one watched; chance decides when it is left out. */
  readonly first?: string | null;
}

export interface PreparedVisit {
  readonly plan: VisitPlan;
  /** Who steps in for whom; null where no reserve was left. */
  readonly replaced: Attendance['replaced'];
}

/** Freezes the schedule of a visit: today's children in their order, the plan, the protocol's version. */
export async function prepareVisit(deps: Deps, wish: VisitWish): Promise<Result<PreparedVisit>> {
  const classroom = await requireClassroom(deps, wish.classroom);
  if (!classroom.ok) return classroom;
  const study = await requireStudy(deps, classroom.value.study);
  if (!study.ok) return study;
  const recipe = await deps.store.protocol(wish.protocol.id, wish.protocol.version);
  if (!recipe.ok) return recipe;
  const protocol = recipe.value;
  if (protocol === null || protocol.study !== study.value.id)
    return problem('task.noProtocol', { id: wish.protocol.id });
  const strange = wish.phases.find((phase) => !study.value.phases.includes(phase));
  if (strange !== undefined) return problem('task.noSuchPhase', { phase: strange });
  if (wish.phases.length === 0) return problem('task.noPhase');
  const { draw, children, plan, condition } = classroom.value;
  const first = hasTarget(protocol) ? (wish.first ?? null) : null;
  const absent = new Set(wish.absent);
  const here = children.filter((child) => !child.removed);
  if (first !== null && (absent.has(first) || !here.some(({ id }) => id === first)))
    return problem('task.firstNotThere');
  // Nobody has to be drawn where everybody is looked at, or where the one to be watched is chosen.
  const needsDraw = !looksAtEverybody(protocol) && !(first !== null && watchesOne(protocol));
  if (draw === null && needsDraw) return problem('task.notDrawn');
  const day = orderOfDay(protocol, classroom.value, {
    absent,
    first,
    orderSeed: wish.orderSeed ?? newSeed(deps.random),
    parts: wish.phases.length,
  });
  if (day.children.length === 0) return problem('task.nobodyThere');
  if (hasTarget(protocol) && !watchesOne(protocol) && day.children.length < 2)
    return problem('task.targetAloneToday');
  if (intervalsInPart(protocol.partLength, protocol, day.children.length) === 0)
    return problem('task.noInterval');
  const inSession = (ids: readonly string[]): SessionChild[] =>
    ids.flatMap((id) => here.filter((one) => one.id === id).map(asSessionChild));
  const reserves = inSession(day.reserves);

  const prepared: VisitPlan = {
    visit: newId(deps.random),
    study: {
      id: study.value.id,
      name: study.value.name,
      phases: study.value.phases,
      conditions: study.value.conditions,
      lessonParts: study.value.lessonParts,
    },
    classroom: { id: classroom.value.id, name: classroom.value.name },
    condition,
    plannedStart: wish.plannedStart,
    children: inSession(day.children),
    ...(reserves.length === 0 ? {} : { reserves }),
    plan,
    draw: looksAtEverybody(protocol) ? null : draw,
    orderSeed: day.orderSeed,
    schedule: {
      kind: 'laid',
      protocol,
      phases: [...wish.phases],
      ...(day.turns === undefined ? {} : { turns: day.turns }),
    },
  };
  if (!visitPlan.safeParse(prepared).success) return problem('task.visitOutOfRange');
  const frozen = await freezeVersions(deps, [protocol]);
  return frozen.ok ? ok({ plan: prepared, replaced: day.replaced }) : frozen;
}

const asSessionChild = ({ id, pseudonym, stratum }: Child): SessionChild => ({ id, pseudonym, stratum });
