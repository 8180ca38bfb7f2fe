import type { Format } from '../format.ts';

/** What the recording screen says differently from method to method: looks, scans, time that was watched. */

type F = Pick<Format, 'whole' | 'plural' | 'clock' | 'list'>;

/** What a session counts: looks at one child, scans of everybody, or time. */
interface Amount {
  readonly unit: 'look' | 'scan' | 'time';
  readonly n: number;
  readonly ms: number;
}

function amount({ unit, n, ms }: Amount, f: F): string {
  if (unit === 'time') return `${f.clock(ms)} minutes`;
  return unit === 'scan'
    ? `${f.whole(n)} ${f.plural(n, { one: 'scan', other: 'scans' })}`
    : `${f.whole(n)} ${f.plural(n, { one: 'look', other: 'looks' })}`;
}

const isNone = ({ unit, n, ms }: Amount): boolean => (unit === 'time' ? ms < 1000 : n === 0);

const areMissing = (some: Amount, f: F): string =>
  `${amount(some, f)} ${some.unit === 'time' || some.n !== 1 ? 'are' : 'is'} missing`;

const nothingMissing = { look: 'No look is missing', scan: 'No scan is missing', time: 'No time is missing' };

export const roomMethods = {
  // the door
  doorKeptScans: ({ kept, of }: { kept: number; of: number }, f: F) =>
    kept === 0
      ? `No scan of ${f.whole(of)} was counted.`
      : `Kept: ${f.whole(kept)} of ${f.whole(of)} scans counted.`,
  doorKeptTime: ({ kept, of }: { kept: number; of: number }, f: F) =>
    `Kept: ${f.clock(kept)} of ${f.clock(of)} minutes watched.`,
  doorGoesOnScan: ({ number, of }: { number: number; of: number }, f: F) =>
    `Taken up now, it goes on at about scan ${f.whole(number)} of ${f.whole(of)}.`,
  doorGoesOnTime: ({ child, left }: { child: string; left: number }, f: F) =>
    `Taken up now, ${child} is watched for ${f.clock(left)} minutes more.`,
  doorBetweenTime: ({ ms }: { ms: number }, f: F) =>
    `${f.clock(ms)} minutes in between are missing: nobody knows what the child did.`,

  // before the tap that begins
  readyAmount: ({ unit, n, minutes }: { unit: Amount['unit']; n: number; minutes: number }, f: F) => {
    const time = `${f.whole(minutes)} ${f.plural(minutes, { one: 'minute', other: 'minutes' })}`;
    return unit === 'time' ? `watched for ${time}` : `${amount({ unit, n, ms: 0 }, f)} in ${time}`;
  },
  readyResumingTime: 'What was kept is here. The time in between is missing; nothing is in force at first.',

  // who to look at
  watchWhole: 'watch: what lasts throughout?',
  recordWhole: 'now record what lasted throughout',
  throughout: 'throughout',
  noneThroughout: 'none of these throughout',
  sweepLook: ({ place, of }: { place: number; of: number }, f: F) =>
    `look at · ${f.whole(place)} of ${f.whole(of)}`,
  sweepDone: 'This sweep is done.',
  sweepStillOpen: ({ child }: { child: string }) => `${child} may still be marked.`,
  sweepNext: ({ ms, child }: { ms: number; child: string }, f: F) =>
    `The next one begins in ${f.clock(ms)}, with ${child}.`,
  sweepLast: 'It was the last one.',
  lookAtTarget: 'look at · the target child',
  lookAtPeer: 'look at · a peer',
  watchTarget: 'watch · the target child',
  watchPeer: 'watch · a peer',
  recordTarget: 'now record · the target child',
  recordPeer: 'now record · a peer',
  insteadOf: ({ child }: { child: string }) => `in the place of ${child}`,

  // headcount
  howMany: 'How many are on-task?',
  countOf: ({ on, present }: { on: number | null; present: number }, f: F) =>
    `${on === null ? '–' : f.whole(on)} of ${f.whole(present)}`,
  countNone: 'Not counted yet',
  notSeen: 'no scan possible',
  present: ({ present }: { present: number }, f: F) => `${f.whole(present)} present`,
  presentFewer: 'fewer present',
  presentMore: 'more present',
  oneMore: 'one more',
  oneFewer: 'one fewer',
  sameAgain: 'as last time',
  allOnTask: 'all on-task',
  nobodyOnTask: 'nobody on-task',
  becomes: ({ on }: { on: number }, f: F) => `→ ${f.whole(on)}`,
  noLastTime: 'no scan before',
  noScanHint: 'no scan possible',
  planCount: 'Seating plan: touch a child who is on-task',
  scanOf: ({ round, rounds }: { round: number; rounds: number }, f: F) =>
    `scan ${f.whole(round)} of ${f.whole(rounds)}`,
  sweepOf: ({ round, rounds }: { round: number; rounds: number }, f: F) =>
    `sweep ${f.whole(round)} of ${f.whole(rounds)}`,
  countSaid: ({ on, present }: { on: number; present: number }, f: F) =>
    `${f.whole(on)} of ${f.whole(present)}`,

  // duration
  inForce: ({ what, since }: { what: string; since: number }, f: F) => `${what} since ${f.clock(since)}`,
  nothingInForce: 'Nothing is in force. Touch what the child does now.',
  inForceFor: ({ ms }: { ms: number }, f: F) => `for ${f.clock(ms)}`,
  ribbonTime: ({ now, of, missing }: { now: number; of: number; missing: number }, f: F) =>
    `Session: ${f.clock(now)} of ${f.clock(of)} minutes; ${missing < 1000 ? 'nothing is missing' : `${f.clock(missing)} minutes are missing`}`,

  // states in which nothing is marked, and the end
  missingSoFar: (some: Amount, f: F) =>
    isNone(some) ? `${nothingMissing[some.unit]} so far.` : `${areMissing(some, f)} so far.`,
  missingAtEnd: (some: Amount & { readonly of: number; readonly ofMs: number }, f: F) => {
    const all = amount({ unit: some.unit, n: some.of, ms: some.ofMs }, f);
    if (!isNone(some)) return `${areMissing(some, f)} of ${all}. The reasons stand with the figures.`;
    return some.unit === 'time' ? `All ${all} were watched.` : `All ${all} were made.`;
  },
  interruptedScans:
    'The schedule runs on in silence, so that two observers stay in step. Scans until the class goes on are missing: class interrupted.',
  interruptedTime:
    'Time runs on. What is seen until the class goes on is missing: class interrupted. Then touch anew what the child does.',
  pausedTime: 'Time stands still. Afterwards nothing is in force: touch anew what the child does.',
  pausedScans: 'The schedule stands still. No scan is lost.',
  endAmount: (some: Amount, f: F) => {
    if (isNone(some)) return 'Nothing is left to do.';
    if (some.unit === 'time')
      return `The last ${f.clock(some.ms)} minutes will be missing: ended early. What is kept stays kept.`;
    return `${amount(some, f)} not made yet will be missing: ended early. What is kept stays kept.`;
  },
  notTakenAfterLast: 'Not taken: the time is over.',

  // reserves
  stepsIn: ({ child }: { child: string }) =>
    `If it leaves or takes no part, ${child} steps in until it comes back.`,
  nobodyStepsIn: 'No reserve is left to step in.',
  awayStoodIn: ({ child, reason, by }: { child: string; reason: string; by: string }) =>
    `${child} (${reason}; ${by} stands in)`,
  standsIn: ({ child, instead }: { child: string; instead: string }) => `${child} (for ${instead})`,
} as const;
