import type { JournalEntry } from '../journal/entry.ts';
import { isKnownKind } from '../journal/known.ts';
import { StoreFailure } from './problems.ts';
import { entryShapes, misshapen, recordShapes, type Shapes, stampShapes } from './shapes.ts';

const shapesOf: Partial<Record<Form, Shapes>> = recordShapes;

/** Forms of sealed values. */
export type Form = 'study' | 'classroom' | 'observer' | 'protocol' | 'header' | 'entry' | 'facts' | 'journal';

/** One step of a migration: from the form's version `n` to `n + 1`. Pure. */
export type Step = (value: unknown) => unknown;

/**
 * The steps that lead from each older version to today's: `steps[form][0]` reads version 1 and gives version 2.
 * A member that is new and optional needs no step.
 */
export const steps: Readonly<Record<Form, readonly Step[]>> = {
  study: [],
  classroom: [],
  observer: [],
  protocol: [],
  header: [],
  entry: [],
  facts: [],
  journal: [],
};

/** The version in which this build writes a form. */
export const versionOf = (form: Form, all = steps): number => all[form].length + 1;

/**
 * Reads a row's value whatever version wrote it. Members that this build does not know stay where they are.
 * @throws StoreFailure `store.newerRow` when a newer build wrote it, `store.unreadable` when it is not what it says
 */
export function upcast<T>(form: Form, v: number, value: unknown, key: string, all = steps): T {
  const today = versionOf(form, all);
  if (v > today) throw new StoreFailure('store.newerRow', { form, key, found: v, expected: today });
  let result = value;
  try {
    for (const step of all[form].slice(v - 1)) result = step(result);
  } catch {
    throw new StoreFailure('store.unreadable', { form, key, where: `version ${v}` });
  }
  if (form === 'entry') checkEntry(result, key);
  else if (form === 'journal') for (const entry of asArray(result, key)) checkEntry(entry, key);
  else check(shapesOf[form], result, form, key);
  return result as T;
}

function check(shapes: Shapes | undefined, value: unknown, form: Form, key: string): void {
  const where = shapes === undefined ? null : misshapen(value, shapes);
  if (where !== null) throw new StoreFailure('store.unreadable', { form, key, where });
}

function checkEntry(value: unknown, key: string): void {
  check(stampShapes, value, 'entry', key);
  const { kind } = value as JournalEntry;
  if (typeof kind !== 'string')
    throw new StoreFailure('store.unreadable', { form: 'entry', key, where: 'kind' });
  if (isKnownKind(kind)) check(entryShapes[kind], value, 'entry', key);
}

function asArray(value: unknown, key: string): readonly unknown[] {
  if (Array.isArray(value)) return value;
  throw new StoreFailure('store.unreadable', { form: 'journal', key, where: '' });
}
