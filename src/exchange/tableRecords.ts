import type { StoredSession } from '../journal/stored.ts';
import { byCodePoint } from '../kernel/compare.ts';
import type { Child, Classroom } from '../model/classroom.ts';
import type { Observer } from '../model/observer.ts';
import type { ReadOptions } from './types.ts';

/** Who "writes" the records that a table implies: they are the oldest state, and several tables' add up. */
export const tableWriter = 'table';

const revision = { counter: 0, writer: tableWriter };

/** The classes and observers that a table's sessions speak of and that the study does not have yet. */
export function tableRecords(
  sessions: readonly StoredSession[],
  { study: known }: ReadOptions,
): { classes: Classroom[]; observers: Observer[] } {
  const classes = new Map<string, Classroom>();
  const observers = new Map<string, Observer>();
  for (const { header } of sessions) {
    const { classroom, observer, study, condition } = header;
    if (classroom.name !== '' && !known?.classes?.some(({ id }) => id === classroom.id)) {
      const children = header.children.map((child) => ({ ...child, removed: false }));
      const record = {
        ...classroom,
        study,
        condition,
        children,
        plan: null,
        draw: null,
        removed: false,
        revision,
      };
      const before = classes.get(classroom.id);
      classes.set(classroom.id, addedUp(before ?? record, record));
    }
    if (!known?.observers?.some(({ id }) => id === observer.id))
      observers.set(observer.id, { ...observer, study, keyMap: null, removed: false, revision });
  }
  return { classes: [...classes.values()], observers: [...observers.values()] };
}

/** Two tables' states of one class: all children of both. Commutative, associative, idempotent. */
export function addedUp(a: Classroom, b: Classroom): Classroom {
  const children = new Map<string, Child>([...a.children, ...b.children].map((child) => [child.id, child]));
  const conditions = [a.condition, b.condition].filter((condition) => condition !== null);
  return {
    ...a,
    condition: conditions.sort(byCodePoint).at(-1) ?? null,
    children: [...children.values()].sort(
      (x, y) => byCodePoint(x.pseudonym, y.pseudonym) || byCodePoint(x.id, y.id),
    ),
  };
}
