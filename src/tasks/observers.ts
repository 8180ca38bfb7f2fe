import { newId } from '../kernel/ids.ts';
import { ok, type Problem, problem, type Result } from '../kernel/result.ts';
import {
  type KeyMap,
  keyMap as keyMapSchema,
  type Manner,
  manner as mannerSchema,
  type Observer,
} from '../model/observer.ts';
import { nextRevision } from '../model/revision.ts';
import { editObserver, requireStudy } from './edits.ts';
import type { Deps } from './ports.ts';
import { nameFrom, sameName } from './text.ts';

/** A new observer under a working name or initials. */
export async function addObserver(deps: Deps, study: string, name: string): Promise<Result<Observer>> {
  const found = await requireStudy(deps, study);
  if (!found.ok) return found;
  const checked = await checkedName(deps, study, name, null);
  if (!checked.ok) return checked;
  const record: Observer = {
    id: newId(deps.random),
    study,
    name: checked.value,
    keyMap: null,
    removed: false,
    revision: nextRevision(null, deps.writer),
  };
  const kept = await deps.store.put({ observers: [{ record, previous: null }] });
  return kept.ok ? ok(record) : kept;
}

export function saveObserver(
  deps: Deps,
  observer: string,
  changes: { readonly name?: string; readonly keyMap?: KeyMap | null; readonly manner?: Manner },
): Promise<Result<Observer>> {
  return editObserver(deps, observer, async (before) => {
    const name = await checkedName(deps, before.study, changes.name ?? before.name, before.id);
    if (!name.ok) return name;
    const keyMap = changes.keyMap === undefined ? before.keyMap : changes.keyMap;
    if (keyMap !== null && !keyMapSchema.safeParse(keyMap).success) return problem('task.keysOutOfRange');
    const manner = changes.manner ?? before.manner;
    if (manner !== undefined && !mannerSchema.safeParse(manner).success)
      return problem('task.mannerOutOfRange');
    return ok({ name: name.value, keyMap, ...(manner === undefined ? {} : { manner }) });
  });
}

/** Takes the observer off the lists; recorded sessions keep the name. */
export async function removeObserver(deps: Deps, observer: string): Promise<Result<null>> {
  const removed = await editObserver(deps, observer, () => ok({ removed: true }));
  return removed.ok ? ok(null) : removed;
}

async function checkedName(
  deps: Deps,
  study: string,
  text: string,
  self: string | null,
): Promise<Result<string, Problem>> {
  const name = nameFrom(text, 'observer');
  if (!name.ok) return name;
  const others = await deps.store.observers(study);
  if (!others.ok) return others;
  const taken = others.value.some((other) => other.id !== self && sameName(other.name, name.value));
  return taken ? problem('task.nameTaken', { what: 'observer', name: name.value }) : name;
}
