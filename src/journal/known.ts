import type { EntryKind, JournalEntry, KnownEntry } from './entry.ts';

/** The kinds of entries that this version understands. Named apart from their schema, so that recording loads no validator. */
export const entryKinds: readonly EntryKind[] = [
  'started',
  'cued',
  'marked',
  'missing',
  'corrected',
  'swapped',
  'unusable',
  'withdrawn',
  'interrupted',
  'continued',
  'paused',
  'resumed',
  'left',
  'returned',
  'moved',
  'lessonPart',
  'phaseStarted',
  'breakStarted',
  'breakEnded',
  'flagged',
  'noted',
  'clockNudged',
  'outputChanged',
  'gap',
  'ended',
  'amended',
  'settled',
];

const understood: ReadonlySet<string> = new Set(entryKinds);

export const isKnownKind = (kind: unknown): kind is EntryKind =>
  typeof kind === 'string' && understood.has(kind);

/** True for kinds that this version understands. */
export function isKnown(entry: JournalEntry): entry is KnownEntry {
  return understood.has(entry.kind);
}
