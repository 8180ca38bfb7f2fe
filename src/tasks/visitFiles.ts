import { readIncoming } from '../exchange/readIncoming.ts';
import type { IncomingFile } from '../exchange/types.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import type { Study } from '../model/study.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import type { Deps, Edits, StudyBundle } from './ports.ts';

/** Who "writes" what a visit file implies. It sorts before every installation's id: the real records win. */
const adoptedBy = '!visit file';
const oldest = { removed: false, revision: { counter: 0, writer: adoptedBy } };

/**
 * A second tablet takes over a visit: the study, class, children present and protocol that it does not have yet. What
 * it has stays as it is; the schedule itself is frozen in the plan.
 */
export async function adoptVisitFile(deps: Deps, file: IncomingFile): Promise<Result<VisitPlan>> {
  const read = await readIncoming(file);
  if (!read.ok)
    return { ok: false, problem: read.problems[0]?.problem ?? { code: 'task.noVisitFile', values: {} } };
  const [plan] = read.bundle.visitPlans;
  if (read.form !== 'visit' || plan === undefined) return problem('task.noVisitFile', { file: file.name });
  return adoptVisit(deps, plan);
}

/** The same with the visit itself, from a file or from a pairing card. */
export async function adoptVisit(deps: Deps, plan: VisitPlan): Promise<Result<VisitPlan>> {
  const edits = await missingRecords(deps, plan);
  if (!edits.ok) return edits;
  const kept = await deps.store.put(edits.value);
  return kept.ok ? ok(plan) : kept;
}

/** The records that a plan speaks of and that the store does not know. */
async function missingRecords({ store }: Deps, plan: VisitPlan): Promise<Result<Edits>> {
  const { protocol } = plan.schedule;
  const study = await store.study(plan.study.id);
  if (!study.ok) return study;
  if (study.value?.removed) return problem('task.studyRemoved', { name: study.value.name });
  const classroom = await store.classroom(plan.classroom.id);
  if (!classroom.ok) return classroom;
  const version = await store.protocol(protocol.id, protocol.version);
  if (!version.ok) return version;
  return ok({
    studies: study.value === null ? [{ record: studyOf(plan), previous: null }] : [],
    classes: classroom.value === null ? [{ record: classOf(plan), previous: null }] : [],
    protocols: version.value === null ? [{ record: protocol, previous: null }] : [],
  });
}

/** The same as a bundle, for imports that hold a visit file among others. */
export function adoptedBundle(plan: VisitPlan, kept: StudyBundle | null): StudyBundle {
  const { protocol } = plan.schedule;
  const hasClass = kept?.classes.some((one) => one.id === plan.classroom.id) ?? false;
  const hasProtocol =
    kept?.protocols.some((one) => one.id === protocol.id && one.version === protocol.version) ?? false;
  return {
    study: kept?.study ?? studyOf(plan),
    classes: hasClass ? [] : [classOf(plan)],
    observers: [],
    protocols: hasProtocol ? [] : [protocol],
    sessions: [],
  };
}

const studyOf = ({ study }: VisitPlan): Study => ({
  id: study.id,
  name: study.name,
  phases: study.phases,
  conditions: study.conditions,
  control: null,
  lessonParts: study.lessonParts,
  criterion: { agreement: 0.85, kappa: 0.6 },
  safeguarding: '',
  pairings: [],
  demo: false,
  ...oldest,
});

/** Children who are not in the plan have no name here, so their seats stand empty. */
function classOf(plan: VisitPlan): Classroom {
  const known = new Set(plan.children.map((child) => child.id));
  const seats = plan.plan?.seats.map((seat) =>
    seat.child === null || known.has(seat.child) ? seat : { ...seat, child: null },
  );
  return {
    id: plan.classroom.id,
    study: plan.study.id,
    name: plan.classroom.name,
    condition: plan.condition,
    children: plan.children.map((child) => ({ ...child, removed: false })),
    plan: plan.plan === null ? null : { ...plan.plan, seats: seats ?? [] },
    draw: plan.draw,
    ...oldest,
  };
}
