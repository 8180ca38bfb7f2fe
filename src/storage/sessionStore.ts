import type { SessionStore } from '../recorder/ports.ts';
import type { Store } from '../tasks/ports.ts';

/** The part of the store that a live session writes to. */
export function sessionStoreOf(store: Pick<Store, 'appendEntries' | 'pack'>, session: string): SessionStore {
  return {
    append: (entries) => store.appendEntries(session, entries),
    pack: () => store.pack(session),
  };
}
