import type { EntryKind, KnownEntry } from '../journal/entry.ts';
import type { JournalState } from '../journal/state.ts';
import type { Undoable } from './roomSnapshot.ts';

const canBeUndone: ReadonlySet<EntryKind> = new Set<EntryKind>([
  'marked',
  'missing',
  'corrected',
  'swapped',
  'unusable',
  'flagged',
  'noted',
  'left',
  'returned',
  'moved',
  'lessonPart',
  'interrupted',
  'continued',
  'breakStarted',
]);

/** Beyond these nothing is undone: time itself hangs on them. */
const barriers: ReadonlySet<EntryKind> = new Set<EntryKind>(['phaseStarted', 'ended']);

/** What one "undo" takes back: the latest thing that the observer did and that still counts. */
export function undoable(state: JournalState): Undoable | null {
  for (let i = state.entries.length - 1; i >= 0; i--) {
    const entry = state.entries[i] as KnownEntry;
    if (barriers.has(entry.kind)) return null;
    if (canBeUndone.has(entry.kind)) {
      return {
        target: { writer: entry.writer, seq: entry.seq },
        kind: entry.kind,
        interval: 'interval' in entry ? (entry.interval ?? null) : null,
        child:
          entry.kind === 'left' || entry.kind === 'returned' || entry.kind === 'moved' ? entry.child : null,
        code: entry.kind === 'marked' ? entry.code : null,
      };
    }
  }
  return null;
}

/** Session time of an entry that still counts; null when there is none. */
export function timeOf(state: JournalState, target: Undoable['target']): number | null {
  return (
    state.entries.find((entry) => entry.writer === target.writer && entry.seq === target.seq)?.at ?? null
  );
}
