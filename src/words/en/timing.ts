import type { Format } from '../format.ts';

type F = Format;

const n = (f: F, count: number, one: string, other: string): string =>
  `${f.whole(count)} ${f.plural(count, { one, other })}`;

/** How well the prompts of a session kept time, and whether that can be relied on. */
export const timing = {
  timing: 'How well the prompts kept time',
  timingWord: ({ word }: { word: 'reliable' | 'withCare' | 'notReliable' }) =>
    ({ reliable: 'Reliable', withCare: 'With care', notReliable: 'Not reliable' })[word],
  timingReliable: 'Every prompt was heard, on its moment.',
  // what stands against it
  timingLost: ({ lost, of }: { lost: number; of: number }, f: F) =>
    `The prompts of ${f.whole(lost)} of ${n(f, of, 'interval', 'intervals')} came to nobody, or not all of them.`,
  timingTimeLost: ({ seconds, percent }: { seconds: number; percent: number }, f: F) =>
    `The tablet stood still for ${f.whole(seconds)} s in all, ${f.percentFine(percent)} of the time.`,
  timingOff: ({ off, ms, largest }: { off: number; ms: number; largest: number }, f: F) =>
    `In ${n(f, off, 'interval', 'intervals')} a prompt came more than ${f.whole(ms)} ms off its moment (at most ${f.whole(largest)} ms): two observers would not look at the same time.`,
  timingUneven: ({ ms, largest }: { ms: number; largest: number }, f: F) =>
    `Not every prompt came within ${f.whole(ms)} ms of its moment (at most ${f.whole(largest)} ms away).`,
  timingSilent: ({ silent, of }: { silent: number; of: number }, f: F) =>
    `${f.whole(silent)} of ${n(f, of, 'prompt', 'prompts')} had no sound: whoever did not look at the glass missed it.`,
  timingEstimated: ({ gaps }: { gaps: number }, f: F) =>
    `After ${n(f, gaps, 'gap', 'gaps')} the time was set by the tablet’s clock, so it is an estimate.`,
  // the figures
  timingLargest: ({ ms }: { ms: number }, f: F) =>
    `The prompt farthest from its planned moment was ${f.whole(ms)} ms away`,
  timingMedian: ({ ms }: { ms: number }, f: F) => `; half of them were within ${f.whole(ms)} ms.`,
  timingUnknown: 'This record holds no prompts, so their timing is not known.',
  timingCarriers: ({ heard, shown, failed }: { heard: number; shown: number; failed: number }, f: F) =>
    `${n(f, heard + shown + failed, 'prompt', 'prompts')}: ${f.list(
      [
        heard === 0 ? '' : `${f.whole(heard)} heard`,
        shown === 0 ? '' : `${f.whole(shown)} only shown or felt`,
        failed === 0 ? '' : `${f.whole(failed)} neither`,
      ].filter((text) => text !== ''),
    )}.`,
  timingResponses: (
    {
      marks,
      median,
      ninetieth,
      spread,
    }: { marks: number; median: number; ninetieth: number; spread: number },
    f: F,
  ) =>
    `A mark came ${f.fixed(median / 1000, 1)} s after its prompt (median of ${n(f, marks, 'first mark', 'first marks')}), nine in ten within ${f.fixed(ninetieth / 1000, 1)} s; the middle half spread over ${f.fixed(spread / 1000, 1)} s. Late marks and corrections are left out.`,
  timingLate: ({ late }: { late: number }, f: F) =>
    late === 0 ? 'No mark came late.' : `${n(f, late, 'mark', 'marks')} came late, within the grace.`,
  timingNudge: ({ ms }: { ms: number }, f: F) =>
    `The tick check set this tablet’s clock ${f.whole(Math.abs(ms))} ms ${ms > 0 ? 'forth' : 'back'}.`,
  timingGap: (
    { wall, seconds, cause, estimated }: { wall: string; seconds: number; cause: string; estimated: boolean },
    f: F,
  ) =>
    seconds === 0
      ? `${f.time(wall)}: ${cause}; no prompt was lost.`
      : `${f.time(wall)}: ${cause}, and ${f.fixed(seconds, seconds < 10 ? 1 : 0)} s of the schedule ran by${estimated ? ' (estimated)' : ''}.`,
  gapClosed: 'the tablet was closed or without power',
  gapHidden: 'the page was hidden',
  gapAsleep: 'the tablet was asleep',
  gapSound: 'the sound was stuck',
  gapClock: 'the tablet’s clock was set',
  timingNoGaps: 'The tablet never stood still.',
} as const;
