import type { StoredSession } from '../journal/stored.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import type { SessionSummary, StoreReader } from '../tasks/ports.ts';

export interface Along {
  readonly stopped: () => boolean;
  /** Awaited, so that a stop which comes in the meantime is heard before the next session is read. */
  readonly progress: (share: number) => void | Promise<void>;
}

/** The sessions of a study that `which` wants, one after the other, telling how far it is. */
export async function readSessions(
  store: StoreReader,
  study: string,
  which: (summary: SessionSummary) => boolean,
  { stopped, progress }: Along,
): Promise<Result<StoredSession[]>> {
  const listed = await store.listSessions(study);
  if (!listed.ok) return listed;
  const wanted = listed.value.filter(which);
  const sessions: StoredSession[] = [];
  for (const [i, { id }] of wanted.entries()) {
    if (stopped()) return problem('ask.stopped');
    const session = await store.readSession(id);
    if (!session.ok) return session;
    if (session.value !== null) sessions.push(session.value);
    await progress((i + 1) / (wanted.length + 1));
  }
  return ok(sessions);
}
