import type { SessionHeader } from '../model/session.ts';
import type { JournalEntry } from './entry.ts';

/** A session as it is kept and handed over: the frozen header and the journal. */
export interface StoredSession {
  readonly header: SessionHeader;
  readonly journal: readonly JournalEntry[];
}
