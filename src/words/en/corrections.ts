import type { Format } from '../format.ts';

type F = Format;

/** What is said of a session afterwards: corrected looks, flags with their words, notes. */
export const corrections = {
  correctTitle: 'Correct a look',
  correctText:
    'The mark stays in the journal; the correction stands beside it, with your name and the reason.',
  correctOpen: 'Correct a look',
  correctChild: 'Child',
  correctLook: ({ phase, k, was }: { phase: string | null; k: number; was: string }) =>
    `${phase === null ? '' : `${phase}, `}look ${k}: ${was}`,
  correctWhich: 'Which look',
  correctTo: 'What it should be',
  correctMissing: ({ reason }: { reason: string }) => `missing: ${reason}`,
  correctWhy: 'Why',
  correctWhyHint: 'For whoever reads this in a year.',
  correctBy: 'Who corrects it',
  correctKeep: 'Keep the correction',
  correctKept: 'The correction is kept beside the mark.',
  correctNeeds: 'Say what it should be, why, and who corrects it.',
  choose: 'Choose …',

  // flags and notes
  notesTitle: 'Flags and notes',
  notesNone: 'No flag and no note was left.',
  flagAt: ({ at, interval }: { at: number; interval: number | null }, f: F) =>
    `Flag at ${f.clock(at)}${interval === null ? '' : `, interval ${f.whole(interval)}`}`,
  noteAt: ({ at }: { at: number }, f: F) => `Note at ${f.clock(at)}`,
  flagWithoutWords: 'No words yet.',
  addWords: 'Words for this flag',
  addNote: 'A note on this session',
  addNoteHint: 'No names. A safeguarding concern goes to the school’s designated person, not here.',
  keepWords: 'Keep the words',
  correctedTitle: 'Corrections',
  corrected: (
    { interval, to, by, why, wall }: { interval: number; to: string; by: string; why: string; wall: string },
    f: F,
  ) => `Interval ${f.whole(interval)} → ${to}. ${why} (${by}, ${f.day(wall)})`,
} as const;
