import type { EntryKind, JournalEntry } from '../journal/entry.ts';
import type { JournalState } from '../journal/state.ts';
import type { Desk, Present } from './deeds.ts';

/** What the journal tells of a start and of the waiting after it. */
const ofTheStart: ReadonlySet<EntryKind> = new Set<EntryKind>(['started', 'clockNudged', 'gap']);

/**
 * Takes the start back while nothing could be marked yet: before session time 0.
 *
 * The start is withdrawn, as by an undo, and the session waits for another one. Removing the session instead would lose
 * what the observer wrote down meanwhile (a note, a child who left), and the journal could no longer tell that there had
 * been another start; a kind of entry of its own would tell older programs nothing, while a withdrawal they know.
 *
 * @returns whether there was a start that could be called off
 */
export function callOff({ book, cues }: Pick<Desk, 'book' | 'cues'>, { now, place }: Present): boolean {
  if (place.phase !== 'counting in' || place.part !== 0) return false;
  // A first interval that is done again turns time back below 0: the session has begun all the same.
  if (book.state.entries.some(({ kind }) => kind === 'cued' || kind === 'resumed')) return false;
  for (const { kind, writer, seq } of book.state.entries)
    if (ofTheStart.has(kind)) book.write(now, { kind: 'withdrawn', target: { writer, seq } });
  cues.takeBack();
  return true;
}

/** True for a session whose start was called off, and that has not been begun anew. */
export function isCalledOff({ entries }: JournalState, journal: readonly JournalEntry[]): boolean {
  return journal.some(isStart) && !entries.some(isStart);
}

/** The start that was called off last: what stood on hold at the door stands on hold for the next one, too. */
export function lastStart(journal: readonly JournalEntry[]): { checks: readonly string[]; anyway: boolean } {
  const start = journal.findLast(isStart) as { checks?: readonly string[]; anyway?: boolean } | undefined;
  return { checks: start?.checks ?? [], anyway: start?.anyway ?? false };
}

const isStart = ({ kind }: { readonly kind: string }): boolean => kind === 'started';
