import { entryKinds, entryStamp, type JournalEntry, knownEntry } from '../journal/entry.ts';
import { classroom } from '../model/classroom.ts';
import { observer } from '../model/observer.ts';
import { protocol } from '../model/protocol.ts';
import { sessionHeader } from '../model/session.ts';
import { study } from '../model/study.ts';
import { StoreFailure } from './problems.ts';

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

interface Check {
  safeParse(value: unknown): { success: boolean; error?: { issues: readonly { path: PropertyKey[] }[] } };
}
const checks: Partial<Record<Form, Check>> = { study, classroom, observer, protocol, header: sessionHeader };

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
  else check(checks[form], result, form, key);
  return result as T;
}

function check(schema: Check | undefined, value: unknown, form: Form, key: string): void {
  if (schema === undefined) return;
  const parsed = schema.safeParse(value);
  if (parsed.success) return;
  const where = (parsed.error?.issues[0]?.path ?? []).map(String).join('.');
  throw new StoreFailure('store.unreadable', { form, key, where });
}

function checkEntry(value: unknown, key: string): void {
  const kind = (value as JournalEntry | null)?.kind;
  check(entryKinds.includes(kind ?? '') ? knownEntry : entryStamp, value, 'entry', key);
}

function asArray(value: unknown, key: string): readonly unknown[] {
  if (Array.isArray(value)) return value;
  throw new StoreFailure('store.unreadable', { form: 'journal', key, where: '' });
}
