import { ok, problem, type Result } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import type { Observer } from '../model/observer.ts';
import type { Protocol } from '../model/protocol.ts';
import { nextRevision } from '../model/revision.ts';
import { editClassroom } from './edits.ts';
import type { Deps } from './ports.ts';
import { sameName } from './text.ts';

/** Takes a withdrawal back: the same child again, on the seat it left if that is still free. */
export function restoreChild(
  deps: Deps,
  classroom: string,
  child: string,
  seat: string | null = null,
): Promise<Result<Classroom>> {
  return editClassroom(deps, classroom, (before) => {
    const found = before.children.find((one) => one.id === child);
    if (found === undefined) return problem('task.noChild');
    const taken = before.children.some(
      (one) => one.id !== child && !one.removed && sameName(one.pseudonym, found.pseudonym),
    );
    if (taken) return problem('task.nameTaken', { what: 'child', name: found.pseudonym });
    const children = before.children.map((one) => (one.id === child ? { ...one, removed: false } : one));
    const { plan } = before;
    if (plan === null || seat === null || plan.seats.some((one) => one.child === child))
      return ok({ children });
    const seats = plan.seats.map((one) => (one.id === seat && one.child === null ? { ...one, child } : one));
    return ok({ children, plan: { ...plan, seats } });
  });
}

/** Puts a class that was taken off the lists back on them. */
export async function restoreClass(deps: Deps, id: string): Promise<Result<Classroom>> {
  const found = await deps.store.classroom(id);
  if (!found.ok) return found;
  if (found.value === null) return problem('task.noClass', { id });
  const others = await deps.store.classes(found.value.study);
  if (!others.ok) return others;
  const clash = takenBy(found.value, others.value);
  if (clash) return problem('task.nameTaken', { what: 'class', name: found.value.name });
  const record = back(found.value, deps.writer);
  const kept = await deps.store.put({ classes: [{ record, previous: found.value.revision }] });
  return kept.ok ? ok(record) : kept;
}

/** Puts an observer back on the lists. */
export async function restoreObserver(deps: Deps, id: string): Promise<Result<Observer>> {
  const found = await deps.store.observer(id);
  if (!found.ok) return found;
  if (found.value === null) return problem('task.noObserver', { id });
  const others = await deps.store.observers(found.value.study);
  if (!others.ok) return others;
  const clash = takenBy(found.value, others.value);
  if (clash) return problem('task.nameTaken', { what: 'observer', name: found.value.name });
  const record = back(found.value, deps.writer);
  const kept = await deps.store.put({ observers: [{ record, previous: found.value.revision }] });
  return kept.ok ? ok(record) : kept;
}

/** Puts a protocol back on the lists, at the version at which it was taken off. */
export async function restoreProtocol(deps: Deps, id: string): Promise<Result<Protocol>> {
  const found = await deps.store.protocol(id);
  if (!found.ok) return found;
  if (found.value === null) return problem('task.noProtocol', { id });
  const others = await deps.store.protocols(found.value.study);
  if (!others.ok) return others;
  const clash = takenBy(found.value, others.value);
  if (clash) return problem('task.nameTaken', { what: 'protocol', name: found.value.name });
  const record = back(found.value, deps.writer);
  const kept = await deps.store.put({ protocols: [{ record, previous: found.value.revision }] });
  return kept.ok ? ok(record) : kept;
}

interface Named {
  readonly id: string;
  readonly name: string;
}

const takenBy = (record: Named, others: readonly Named[]): boolean =>
  others.some((other) => other.id !== record.id && sameName(other.name, record.name));

const back = <T extends Classroom | Observer | Protocol>(record: T, writer: string): T => ({
  ...record,
  removed: false,
  revision: nextRevision(record.revision, writer),
});
