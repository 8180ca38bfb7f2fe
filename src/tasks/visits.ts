import { newId } from '../kernel/ids.ts';
import { seededRandom, shuffled } from '../kernel/random.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import type { Child, Draw } from '../model/classroom.ts';
import type { SessionChild } from '../model/session.ts';
import { type VisitPlan, visitPlan } from '../model/visitPlan.ts';
import { intervalsInPart } from '../schedule/layOut.ts';
import { type Attendance, replaceAbsent } from '../schedule/replaceAbsent.ts';
import { drawTurns } from '../schedule/turns.ts';
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
  const scans = protocol.method === 'headcount';
  if (draw === null && !scans) return problem('task.notDrawn');

  const absent = new Set(wish.absent);
  const here = children.filter((child) => !child.removed);
  // A headcount looks at everybody, so nobody has to be drawn for it.
  const today: Attendance =
    draw === null || scans
      ? { children: here.filter(({ id }) => !absent.has(id)).map(({ id }) => id), replaced: [] }
      : replaceAbsent(upTo(draw, protocol.childrenToDraw), absent, here);
  if (today.children.length === 0) return problem('task.nobodyThere');
  const byChance = protocol.order !== 'listed' && !scans;
  const orderSeed = byChance ? (wish.orderSeed ?? newSeed(deps.random)) : null;
  const order = orderSeed === null ? today.children : shuffled(today.children, seededRandom(orderSeed));
  const intervals = intervalsInPart(protocol.partLength, protocol, order.length);
  if (intervals === 0) return problem('task.noInterval');
  const eachRound = orderSeed !== null && protocol.order === 'random each round';
  const turns = eachRound
    ? { turns: drawTurns(protocol, order.length, intervals, wish.phases.length, orderSeed) }
    : {};
  const reserves =
    draw === null || scans ? [] : waiting(upTo(draw, protocol.childrenToDraw), today.children, absent, here);

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
    children: order.flatMap((id) => here.filter((one) => one.id === id).map(inSession)),
    ...(reserves.length === 0 ? {} : { reserves }),
    plan,
    draw: scans ? null : draw,
    orderSeed,
    schedule: { kind: 'laid', protocol, phases: [...wish.phases], ...turns },
  };
  if (!visitPlan.safeParse(prepared).success) return problem('task.visitOutOfRange');
  const frozen = await freezeVersions(deps, [protocol]);
  return frozen.ok ? ok({ plan: prepared, replaced: today.replaced }) : frozen;
}

const inSession = ({ id, pseudonym, stratum }: Child): SessionChild => ({ id, pseudonym, stratum });

/** Reserves who are there and were not needed yet, in their drawn order: they may step in during the session. */
function waiting(
  draw: Draw,
  today: readonly string[],
  absent: ReadonlySet<string>,
  here: readonly Child[],
): SessionChild[] {
  return draw.reserves
    .filter((id) => !absent.has(id) && !today.includes(id))
    .flatMap((id) => here.filter((one) => one.id === id).map(inSession));
}

/** A protocol that watches fewer children than were drawn takes the first ones; the others are its first reserves. */
function upTo(draw: Draw, count: number): Draw {
  return {
    ...draw,
    chosen: draw.chosen.slice(0, count),
    reserves: [...draw.chosen.slice(count), ...draw.reserves],
  };
}
