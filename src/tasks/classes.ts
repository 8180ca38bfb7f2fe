import { newId } from '../kernel/ids.ts';
import { ok, type Problem, problem, type Result } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import { nextRevision } from '../model/revision.ts';
import type { Study } from '../model/study.ts';
import { editClassroom, requireStudy } from './edits.ts';
import type { Deps } from './ports.ts';
import { nameFrom, sameName } from './text.ts';

export interface ClassWish {
  readonly name: string;
  readonly condition: string | null;
}

/** A new class without children. */
export async function addClass(deps: Deps, study: string, wish: ClassWish): Promise<Result<Classroom>> {
  const found = await requireStudy(deps, study);
  if (!found.ok) return found;
  const checked = await checkedWish(deps, found.value, wish, null);
  if (!checked.ok) return checked;
  const record: Classroom = {
    id: newId(deps.random),
    study,
    ...checked.value,
    children: [],
    plan: null,
    draw: null,
    removed: false,
    revision: nextRevision(null, deps.writer),
  };
  const kept = await deps.store.put({ classes: [{ record, previous: null }] });
  return kept.ok ? ok(record) : kept;
}

/** Another name or condition. Sessions keep those with which they were recorded. */
export function saveClass(
  deps: Deps,
  classroom: string,
  changes: Partial<ClassWish>,
): Promise<Result<Classroom>> {
  return editClassroom(deps, classroom, async (before) => {
    const study = await requireStudy(deps, before.study);
    if (!study.ok) return study;
    return checkedWish(
      deps,
      study.value,
      { name: before.name, condition: before.condition, ...changes },
      before.id,
    );
  });
}

/** Takes the class off the lists; its sessions stay. */
export async function removeClass(deps: Deps, classroom: string): Promise<Result<null>> {
  const removed = await editClassroom(deps, classroom, () => ok({ removed: true }));
  return removed.ok ? ok(null) : removed;
}

async function checkedWish(
  deps: Deps,
  study: Study,
  wish: ClassWish,
  self: string | null,
): Promise<Result<{ name: string; condition: string | null }, Problem>> {
  const name = nameFrom(wish.name, 'class');
  if (!name.ok) return name;
  const others = await deps.store.classes(study.id);
  if (!others.ok) return others;
  if (others.value.some((other) => other.id !== self && sameName(other.name, name.value)))
    return problem('task.nameTaken', { what: 'class', name: name.value });
  const { condition } = wish;
  if (condition === null) return ok({ name: name.value, condition });
  const listed = study.conditions.find((one) => sameName(one, condition));
  if (listed === undefined) return problem('task.noSuchCondition', { condition });
  return ok({ name: name.value, condition: listed });
}
