import type { Format } from '../format.ts';

type F = Pick<Format, 'whole' | 'plural' | 'clock' | 'list'>;

const looks = (n: number, scans: boolean, f: F): string =>
  `${f.whole(n)} ${f.plural(n, scans ? { one: 'scan', other: 'scans' } : { one: 'look', other: 'looks' })}`;

/** Corrections in the room, after the fact. Each says first what it will do. */
export const roomCorrections = {
  correct: 'correct …',
  correctWhat: 'What was wrong?',
  correctLook: 'one of the last looks …',
  correctScan: 'one of the last scans …',
  correctSwap: 'two children taken for each other …',
  correctStretch: 'a stretch is of no use …',
  correctNothing: 'No look has been made yet.',
  correctNotTime:
    'What is in force is changed by touching it; an onset is taken back by undo. A stretch can be said to be of no use.',

  // one look
  lookTitle: 'Which look?',
  scanTitle: 'Which scan?',
  lookNumber: ({ number, name }: { number: number; name: string }, f: F) =>
    name === '' ? f.whole(number) : `${f.whole(number)} · ${name}`,
  lookAbout: ({ number, name, held }: { number: number; name: string; held: string }, f: F) =>
    `${name === '' ? 'Scan' : `${name}, look`} ${f.whole(number)}: ${held}`,
  shouldBe: 'It should be',
  shouldBeSeveral: 'It should be (one or more)',
  orMissing: 'or missing',
  willBe: ({ from, to }: { from: string; to: string }) => `${from} → ${to}`,
  willStay: 'That is what it holds.',
  correctDo: 'Correct it',
  heldNothing: 'nothing yet',
  heldMissing: ({ reason }: { reason: string }) => `missing: ${reason}`,
  onTask: ({ on }: { on: number }, f: F) => `${f.whole(on)} on-task`,
  onTaskFewer: 'fewer on-task',
  onTaskMore: 'more on-task',

  // two children
  swapFirst: 'Who was watched by mistake?',
  swapSecond: ({ child }: { child: string }) => `${child}, taken for whom?`,
  swapTitle: ({ one, other }: { one: string; other: string }) => `${one} and ${other}`,
  swapOver: ({ n }: { n: number }, f: F) => `Over the last ${looks(n, false, f)}`,
  swapFewer: 'fewer looks',
  swapMore: 'more looks',
  swapNothing: 'In these looks they have no turns to change. Take more looks.',
  swapPair: (
    {
      one,
      other,
      gets,
      otherGets,
    }: {
      one: { number: number; name: string };
      other: { number: number; name: string };
      gets: string;
      otherGets: string;
    },
    f: F,
  ) =>
    `${one.name}, look ${f.whole(one.number)} → ${gets}; ${other.name}, look ${f.whole(other.number)} → ${otherGets}`,
  swapDo: ({ n }: { n: number }, f: F) =>
    `Swap ${f.whole(n)} ${f.plural(n, { one: 'pair', other: 'pairs' })}`,

  // a stretch
  stretchTitle: 'Which stretch is of no use?',
  stretchLast: ({ minutes }: { minutes: number }, f: F) =>
    minutes === 1 ? 'the last minute' : `the last ${f.whole(minutes)} minutes`,
  stretchSince: 'since a look …',
  stretchSinceScan: 'since a scan …',
  stretchSinceWhich: 'Since which one?',
  stretchWhy: 'Why?',
  stretchWords: 'In words (may stay empty; no names)',
  stretchTakes: (
    { n, marked, scans, from, to }: { n: number; marked: number; scans: boolean; from: number; to: number },
    f: F,
  ) =>
    n === 0
      ? `No ${scans ? 'scan' : 'look'} lies between ${f.clock(from)} and ${f.clock(to)}.`
      : `From ${f.clock(from)} to ${f.clock(to)}: ${looks(n, scans, f)} will be missing, ${
          marked === 0 ? 'none of them marked' : `${f.whole(marked)} of them marked`
        }.`,
  stretchTakesTime: ({ from, to }: { from: number; to: number }, f: F) =>
    `The time from ${f.clock(from)} to ${f.clock(to)} will be missing.`,
  stretchDo: 'Take it out',
} as const;
