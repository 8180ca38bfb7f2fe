import type { EntryBody, KnownEntry } from '../journal/entry.ts';
import type { StoredSession } from '../journal/stored.ts';
import { problem, type Result } from '../kernel/result.ts';
import type { SessionMs } from '../kernel/units.ts';
import type { Deps } from './ports.ts';

/**
 * Adds an entry under this installation's own writer, after the recorder has left. Two tabs may take the same
 * sequence number; the one that comes second reads again and takes the next.
 */
export async function appendAfterwards(
  { store, clock, writer }: Deps,
  session: string,
  say: (stored: StoredSession) => Result<{ readonly at: number; readonly body: EntryBody }>,
): Promise<Result<null>> {
  let last: Result<null> = problem('task.noSession', { id: session });
  for (let attempt = 0; attempt < 5; attempt++) {
    const stored = await store.readSession(session);
    if (!stored.ok) return stored;
    if (stored.value === null) return problem('task.noSession', { id: session });
    const said = say(stored.value);
    if (!said.ok) return said;
    const seq = stored.value.journal.reduce(
      (next, entry) => (entry.writer === writer ? Math.max(next, entry.seq + 1) : next),
      0,
    );
    const stamp = { session, writer, seq, at: said.value.at as SessionMs, wall: clock.wall() };
    last = await store.appendEntries(session, [{ ...stamp, ...said.value.body } as KnownEntry]);
    if (last.ok || last.problem.code !== 'store.entryTaken') return last;
  }
  return last;
}
