import type { Format } from '../format.ts';

type F = Format;

/** What is said of a session afterwards: corrected looks, flags with their words, notes. */
export const corrections = {
  correctTitle: 'Correct a look',
  correctText:
    'The mark stays in the journal; the correction stands beside it, with your name and the reason.',
  correctOpen: 'Correct a look',
  correctScanTitle: 'Correct a scan',
  correctScanText:
    'The count stays in the journal; the correction stands beside it, with your name and the reason.',
  correctScanOpen: 'Correct a scan',
  correctNoDuration:
    'A recorded duration has no single looks: its stretches run from one touch to the next, and moving one would move its neighbours. In the room a stretch can be said to be of no use.',
  correctWhichScan: 'Which scan',
  correctScan: ({ phase, k, was }: { phase: string | null; k: number; was: string }) =>
    `${phase === null ? '' : `${phase}, `}scan ${k}: ${was}`,
  correctOn: 'On-task',
  correctPresent: 'Present',
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

  // what was recorded, where it is no looks
  completeScans: ({ scored, planned }: { scored: number; planned: number }, f: F) =>
    `${f.whole(scored)} of ${f.whole(planned)} ${f.plural(planned, { one: 'scan', other: 'scans' })} ${f.plural(scored, { one: 'was', other: 'were' })} counted.`,
  completeTime: ({ watched, planned }: { watched: number; planned: number }, f: F) =>
    `${f.clock(watched)} of ${f.clock(planned)} minutes were watched.`,
  missingTime: ({ ms, reasons }: { ms: number; reasons: readonly string[] }, f: F) =>
    ms < 1000 ? 'Nothing is missing.' : `${f.clock(ms)} minutes are missing: ${f.list(reasons)}.`,
  manyMissingTime: ({ percent }: { percent: number }, f: F) =>
    `${f.percent(percent)} of the time is missing.`,
  countedIn: ({ phase }: { phase: string | null }) => `children counted${phase === null ? '' : ` ${phase}`}`,
  scansMissingIn: ({ phase }: { phase: string | null }) =>
    `scans missing${phase === null ? '' : ` ${phase}`}`,
  watchedIn: ({ phase }: { phase: string | null }) => `watched (min:s)${phase === null ? '' : ` ${phase}`}`,
  timeMissingIn: ({ phase }: { phase: string | null }) =>
    `missing (min:s)${phase === null ? '' : ` ${phase}`}`,
  scans: 'Scan by scan',
  scan: 'scan',
  scanPhase: 'phase',
  scanOn: 'on-task',
  scanPresent: 'present',
  stretches: 'From touch to touch',
  stretchFrom: 'from',
  stretchTo: 'to',
  stretchLasted: 'lasted',
  stretchWhat: 'what',
  stretchWho: 'child',

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
  toCounts: ({ on, present }: { on: number; present: number }, f: F) =>
    `${f.whole(on)} of ${f.whole(present)}`,
  corrected: (
    { interval, to, by, why, wall }: { interval: number; to: string; by: string; why: string; wall: string },
    f: F,
  ) => `Interval ${f.whole(interval)} → ${to}. ${why} (${by}, ${f.day(wall)})`,
} as const;
