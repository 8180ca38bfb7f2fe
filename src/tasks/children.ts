import { newId } from '../kernel/ids.ts';
import { ok, type Problem, problem, type Result } from '../kernel/result.ts';
import type { Child, Classroom } from '../model/classroom.ts';
import { editClassroom } from './edits.ts';
import type { Deps } from './ports.ts';
import { cleaned, nameFrom, sameName } from './text.ts';

export interface ChildWish {
  readonly pseudonym: string;
  readonly stratum: string | null;
}

/** Adds a child. Without consent nothing is written down: that is a refusal, not a child with a mark. */
export function addChild(
  deps: Deps,
  classroom: string,
  wish: ChildWish & { readonly consent: boolean },
): Promise<Result<Classroom>> {
  return editClassroom(deps, classroom, (before) => {
    if (!wish.consent) return problem('task.noConsent');
    const checked = checkedChild(before, wish, null);
    if (!checked.ok) return checked;
    const child: Child = { id: newId(deps.random), ...checked.value, removed: false };
    return ok({ children: [...before.children, child] });
  });
}

export function renameChild(
  deps: Deps,
  classroom: string,
  child: string,
  changes: Partial<ChildWish>,
): Promise<Result<Classroom>> {
  return editClassroom(deps, classroom, (before) => {
    const found = before.children.find((one) => one.id === child && !one.removed);
    if (found === undefined) return problem('task.noChild');
    const checked = checkedChild(before, { ...found, ...changes }, child);
    if (!checked.ok) return checked;
    return ok({
      children: before.children.map((one) => (one.id === child ? { ...one, ...checked.value } : one)),
    });
  });
}

/**
 * Withdraws a child: no longer drawn, seated or observed. The pseudonym stays behind a tombstone, or a union with
 * an older file would bring the child back. A draw that holds the child stands; a reserve steps in.
 */
export function removeChild(deps: Deps, classroom: string, child: string): Promise<Result<Classroom>> {
  return editClassroom(deps, classroom, (before) => {
    if (!before.children.some((one) => one.id === child && !one.removed)) return problem('task.noChild');
    const children = before.children.map((one) => (one.id === child ? { ...one, removed: true } : one));
    const seats = before.plan?.seats.map((seat) => (seat.child === child ? { ...seat, child: null } : seat));
    const plan = before.plan === null ? null : { ...before.plan, seats: seats ?? [] };
    return ok({ children, plan });
  });
}

/** A pseudonym that nobody else in the class has, and a stratum or none. */
export function checkedChild(
  classroom: Classroom,
  wish: ChildWish,
  self: string | null,
): Result<{ pseudonym: string; stratum: string | null }, Problem> {
  const pseudonym = nameFrom(wish.pseudonym, 'child');
  if (!pseudonym.ok) return pseudonym;
  const taken = classroom.children.some(
    (other) => other.id !== self && !other.removed && sameName(other.pseudonym, pseudonym.value),
  );
  if (taken) return problem('task.nameTaken', { what: 'child', name: pseudonym.value });
  if (wish.stratum === null || cleaned(wish.stratum) === '')
    return ok({ pseudonym: pseudonym.value, stratum: null });
  const stratum = nameFrom(wish.stratum, 'stratum');
  return stratum.ok ? ok({ pseudonym: pseudonym.value, stratum: stratum.value }) : stratum;
}
