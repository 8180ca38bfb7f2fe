import { ok, problem, type Result } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import type { Observer } from '../model/observer.ts';
import { nextRevision } from '../model/revision.ts';
import type { Study } from '../model/study.ts';
import type { Deps } from './ports.ts';

type Answer<T> = Promise<Result<T>>;

/** The study, unless it is unknown or removed. */
export async function requireStudy({ store }: Deps, id: string): Answer<Study> {
  const found = await store.study(id);
  if (!found.ok) return found;
  return found.value === null || found.value.removed ? problem('task.noStudy', { id }) : ok(found.value);
}

export async function requireClassroom({ store }: Deps, id: string): Answer<Classroom> {
  const found = await store.classroom(id);
  if (!found.ok) return found;
  return found.value === null || found.value.removed ? problem('task.noClass', { id }) : ok(found.value);
}

export async function requireObserver({ store }: Deps, id: string): Answer<Observer> {
  const found = await store.observer(id);
  if (!found.ok) return found;
  return found.value === null || found.value.removed ? problem('task.noObserver', { id }) : ok(found.value);
}

type Change<T> = (record: T) => Result<Partial<T>> | Promise<Result<Partial<T>>>;

/** Edits a study on the revision that was read; the change says what is new, or why it cannot be. */
export async function editStudy(deps: Deps, id: string, change: Change<Study>): Answer<Study> {
  const before = await requireStudy(deps, id);
  if (!before.ok) return before;
  const changes = await change(before.value);
  if (!changes.ok) return changes;
  const record = edited(before.value, changes.value, deps.writer);
  const kept = await deps.store.put({ studies: [{ record, previous: before.value.revision }] });
  return kept.ok ? ok(record) : kept;
}

export async function editClassroom(deps: Deps, id: string, change: Change<Classroom>): Answer<Classroom> {
  const before = await requireClassroom(deps, id);
  if (!before.ok) return before;
  const changes = await change(before.value);
  if (!changes.ok) return changes;
  const record = edited(before.value, changes.value, deps.writer);
  const kept = await deps.store.put({ classes: [{ record, previous: before.value.revision }] });
  return kept.ok ? ok(record) : kept;
}

export async function editObserver(deps: Deps, id: string, change: Change<Observer>): Answer<Observer> {
  const before = await requireObserver(deps, id);
  if (!before.ok) return before;
  const changes = await change(before.value);
  if (!changes.ok) return changes;
  const record = edited(before.value, changes.value, deps.writer);
  const kept = await deps.store.put({ observers: [{ record, previous: before.value.revision }] });
  return kept.ok ? ok(record) : kept;
}

const edited = <T extends Study | Classroom | Observer>(
  before: T,
  changes: Partial<T>,
  writer: string,
): T => ({
  ...before,
  ...changes,
  revision: nextRevision(before.revision, writer),
});
