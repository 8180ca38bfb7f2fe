import type { Format } from '../format.ts';

type F = Pick<Format, 'fixed' | 'clock' | 'whole' | 'plural'>;

/** Words for two observers who begin together: read on both tablets side by side, before the lesson. */
export const startTogether = {
  // how to begin
  howToStart: 'How do you two begin?',
  byCount: 'On a shared count',
  byCountHint: 'Both touch Start on “one”: as close as two fingers are, some tenths of a second.',
  bySecond: 'At an agreed second',
  bySecondHint: 'Each tablet begins by its own clock: as close as the two clocks are. Tick check first.',
  bySecondChecked: 'Each tablet begins by its own clock. The tick check brought the two together.',
  readyTitleSecond: 'Agree on a second.',
  readySecond:
    'Choose the same second on both tablets and touch Start on each. Three, two, one follows by itself.',
  agreedSecond: 'Agreed second',
  agreedSecondHint: 'Hours, minutes and seconds, as 10:42:00',
  agreedNotATime: 'This is no time of day. Type it as 10:42:00.',
  secondEarlier: '10 s earlier',
  secondLater: '10 s later',
  secondIn: ({ time, ms }: { time: string; ms: number }, f: F) =>
    `It is ${time} now: ${f.clock(ms)} minutes are left.`,
  secondGone: 'This second is too near or gone. Agree on a later one.',
  startAt: ({ time }: { time: string }) => `Start at ${time}`,

  // while it is awaited
  waitsFor: ({ time }: { time: string }) => `The schedule begins at ${time}, in`,
  waitsOther: 'Agreed on another second?',
  callOff: 'Call this start off',
  notBegunTitle: 'The session has not begun yet.',
  notBegunText:
    'Call this start off, and it waits to be begun anew. No look is missing, and what you wrote down stays kept.',
  notBegunStay: 'Go on waiting',

  // tick check
  tickCheck: 'Tick check with the other tablet',
  tickOpen: 'Tick check …',
  tickNone: 'The clocks of the two tablets have not been compared.',
  tickKept: ({ ms, ago }: { ms: number; ago: number }, f: F) => `${checkedAgo(ago, f)} ${readAs(ms, f)}`,
  tickAgain: 'Check anew …',
  tickHow:
    'Start the ticks on both tablets and hold them, or the earpieces, together. Nudge one of them, and only one, until the ticks are one.',
  tickTenth: 'Each tenth second has a lower tone after its tick: these have to fall together, too.',
  tickStart: 'Start the ticks',
  tickStop: 'Stop the ticks',
  tickSilent: 'The ticks do not sound. Touch “Start the ticks” again.',
  tickClock: 'Clock of this tablet, as nudged',
  tickNudge: ({ ms }: { ms: number }, f: F) => readAs(ms, f),
  tickNudges: 'Make the ticks of this tablet come',
  tickEarlierFine: '20 ms earlier',
  tickLaterFine: '20 ms later',
  tickEarlier: '1 s earlier',
  tickLater: '1 s later',
  tickKeys: 'Arrow keys: right and left 20 ms, up and down 1 s.',
  tickZero: 'Back to 0',
  tickKeep: 'The ticks are one',
  tickLeave: 'Leave as it was',
} as const;

/** How old the tick check is; after an hour two clocks may be some hundredths of a second further apart. From memory, no source. */
function checkedAgo(ms: number, f: F): string {
  const minutes = Math.floor(ms / 60_000);
  if (minutes < 1) return 'Tick check kept.';
  const hours = Math.floor(minutes / 60);
  return hours < 1
    ? `Checked ${f.whole(minutes)} ${f.plural(minutes, { one: 'minute', other: 'minutes' })} ago.`
    : `Checked ${f.whole(hours)} ${f.plural(hours, { one: 'hour', other: 'hours' })} ago, and clocks drift: better check anew.`;
}

/** How this tablet's clock is read after a nudge. */
function readAs(ms: number, f: F): string {
  if (ms === 0) return 'This tablet’s clock is read as it shows.';
  const by = `${f.fixed(Math.abs(ms) / 1000, 2)} s`;
  return `This tablet’s clock is read ${by} ${ms > 0 ? 'later' : 'earlier'} than it shows.`;
}
