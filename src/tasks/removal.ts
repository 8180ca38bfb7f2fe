import { idFromContent } from '../kernel/idFromContent.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import { nextRevision } from '../model/revision.ts';
import type { Study } from '../model/study.ts';
import { requireStudy } from './edits.ts';
import type { Deps } from './ports.ts';

/** What somebody has to know before a study is removed. `token` is the answer "yes, this one, as it stands". */
export interface RemovalQuestion {
  readonly token: string;
  readonly name: string;
  readonly classes: number;
  readonly sessions: number;
  readonly notHandedOver: number;
  /** Sessions that were begun here and not ended: while there are any, the study stays. */
  readonly unfinished: number;
}

export async function askRemoveStudy(deps: Deps, study: string): Promise<Result<RemovalQuestion>> {
  const found = await weighed(deps, study);
  return found.ok ? ok(found.value.question) : found;
}

/** Removes a study and everything in it from this tablet. Refused when anything has changed since it was asked. */
export async function removeStudy(deps: Deps, study: string, token: string): Promise<Result<null>> {
  const found = await weighed(deps, study);
  if (!found.ok) return found;
  const { record, question } = found.value;
  if (question.unfinished > 0) return problem('task.sessionRuns');
  if (question.token !== token) return problem('task.changedSinceAsked');
  const tombstone: Study = {
    ...record,
    safeguarding: '',
    pairings: [],
    removed: true,
    revision: nextRevision(record.revision, deps.writer),
  };
  const removed = await deps.store.removeStudy({ record: tombstone, previous: record.revision });
  if (!removed.ok) return removed;
  const settings = await deps.store.settings();
  if (!settings.ok) return settings;
  const { study: shown, prepared } = settings.value;
  return deps.store.saveSettings({
    ...(shown === study && { study: null }),
    ...(prepared?.study.id === study && { prepared: null }),
  });
}

async function weighed(
  deps: Deps,
  id: string,
): Promise<Result<{ record: Study; question: RemovalQuestion }>> {
  const study = await requireStudy(deps, id);
  if (!study.ok) return study;
  const classes = await deps.store.classes(id);
  if (!classes.ok) return classes;
  const sessions = await deps.store.listSessions(id);
  if (!sessions.ok) return sessions;
  const { counter, writer } = study.value.revision;
  const contents = sessions.value.map((one) => `${one.id} ${one.entries} ${one.handedOver}`);
  const question: RemovalQuestion = {
    token: idFromContent('remove', id, `${counter} ${writer}`, String(classes.value.length), ...contents),
    name: study.value.name,
    classes: classes.value.length,
    sessions: sessions.value.length,
    notHandedOver: sessions.value.filter((one) => !one.handedOver).length,
    unfinished: sessions.value.filter((one) => one.here && one.ended === null).length,
  };
  return ok({ record: study.value, question });
}
