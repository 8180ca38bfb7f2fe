import type { Format } from '../../format.ts';
import { peerLooks, short } from './short.ts';

type F = Format;

/** Protocols and their codes. */
export const protocolWords = {
  protocolNewTitle: 'How will you watch?',
  protocolTitle: ({ name, version }: { name: string; version: number }, f: F) =>
    `${name}, version ${f.whole(version)}.`,
  protocolUsed: ({ version }: { version: number }, f: F) =>
    `Version ${f.whole(version)} was used and stays as it is. What you change becomes version ${f.whole(version + 1)}.`,
  protocolUnused: 'Nobody has used this version yet: it is changed in place.',
  protocolName: 'Name of the protocol',
  howToWatch: 'How to watch',
  methodLegend: 'Method',
  momentary: 'momentary',
  momentaryHint:
    'One look at one moment of each interval. Estimates the share of time without leaning either way; rare, short things fall in between.',
  partial: 'partial interval',
  partialHint:
    'Whatever happened while you watched counts, however short. Good for not missing things; it overestimates the share of time.',
  whole: 'whole interval',
  wholeHint:
    'Only what lasted all the while that you watched counts. Good for steady work; it underestimates the share of time.',
  headcount: 'headcount',
  headcountHint:
    'At each prompt you count how many of those present are on-task. Good for the class as a whole; it tells of no single child.',
  duration: 'duration',
  durationHint:
    'One child all the time: you switch on and off as it happens. Gives the true time, and leaves no eyes for anybody else.',
  interval: 'Interval, in seconds',
  intervalHint: 'From one prompt to the next. Whole seconds, from 3 seconds to 10 minutes.',
  observe: 'Seconds of watching',
  observeHint:
    'Eyes on the child: what happens in this time counts. Whole seconds, from 3 seconds to 10 minutes.',
  record: 'Seconds for recording',
  recordHint:
    'Eyes on the tablet: time to touch what you saw; what happens now does not count. From 3 seconds to 10 minutes; 0 for none.',
  recordBetween: 'Either 0 or a whole number from 3 to 600 is needed.',
  lookAt: 'When to look',
  countAt: 'When to count',
  lookAtEnd: 'when the interval ends',
  lookAtStart: 'when the interval starts',
  lookAtHint: 'This is printed with every figure.',
  turns: 'Whose turn',
  turnsNext: 'the next child at each interval',
  turnsNextHint: 'Each child’s looks are spread over the whole lesson.',
  turnsBlock: 'several intervals in a row for each child',
  turnsBlockHint:
    'A block of looks at one child, then a block at the next. Easier on the eyes; each child is seen in stretches.',
  turnsOne: 'one child throughout',
  turnsOneHint: 'Chance or you say which, when a visit is prepared.',
  turnsSweep: 'all children, one after the other, at each prompt',
  turnsSweepHint:
    'A sweep: your eyes go once through the room, a few seconds a child, and rest until the next prompt.',
  turnsTarget: 'a target child, now and then a peer',
  turnsTargetHint: 'One child is compared with the others of the class.',
  inRow: 'Intervals in a row',
  inRowHint:
    'The length of a block. At 4 intervals of 15 seconds each child is watched for a minute at a time.',
  eachSeconds: 'Seconds a child',
  eachHint: 'All children together have to fit into the interval.',
  peerEvery: 'A peer at every … look',
  peerEveryHint: 'At 4 the target child has three looks, then a peer has one.',
  partLength: 'Length of a part',
  partLengthHint: 'A part is one phase: before the break, for example. Three hours at most.',
  byMinutes: 'by minutes',
  byRounds: 'by rounds',
  minutes: 'Minutes a part',
  rounds: 'Rounds a part',
  roundsHint: ({ kind }: { kind: string }) =>
    kind === 'block'
      ? 'A round is over when each child has had its block once.'
      : kind === 'sweep'
        ? 'A round is one sweep.'
        : kind === 'target'
          ? 'A round is over when each peer has had its look once.'
          : kind === 'one'
            ? 'A round is one look.'
            : kind === 'headcount'
              ? 'A round is one count.'
              : 'A round is over when each child has had its turn once.',
  grace: 'Grace, in seconds',
  graceHint:
    'Fingers come late: so long after a prompt a touch still belongs to the interval before, if that is empty.',
  whom: 'Whom to watch, and how long',
  toDraw: 'Children to draw',
  reserves: 'Reserves',
  reservesHint: 'They stand in for children who are away.',
  stepIn: 'When a child leaves during the lesson, a reserve steps in until it returns',
  everybodyNote: 'A headcount looks at everybody who is there: nobody is drawn, and there are no turns.',
  oneNote: 'A duration follows one child. Chance or you say which, when a visit is prepared.',
  order: 'Order of the children',
  orderRandom: 'at random, anew for each session',
  orderEachRound: 'at random, anew for each round',
  orderEachRoundHint: 'Nobody can tell whose turn comes next. The seed is kept.',
  orderListed: 'as drawn',
  afterPause: 'When you pause the schedule, the interval that it breaks is',
  afterPauseMissing: 'missing',
  afterPauseRepeat: 'repeated',
  afterPauseHint: 'Only who observes alone can pause. With two observers the schedule always runs on.',
  meansTitle: 'What it comes to',
  means: (
    { fewest, most, watched, minutes }: { fewest: number; most: number; watched: number; minutes: number },
    f: F,
  ) =>
    `${fewest === most ? f.whole(fewest) : `${f.whole(fewest)} to ${f.whole(most)}`} ${f.plural(most, { one: 'look', other: 'looks' })} at ${watched === 1 ? 'one child' : `each of ${f.whole(watched)} children`} in a part of ${short(minutes, f)} ${f.plural(minutes, { one: 'minute', other: 'minutes' })}.`,
  meansEverybody: ({ counts, minutes }: { counts: number; minutes: number }, f: F) =>
    `${f.whole(counts)} ${f.plural(counts, { one: 'count', other: 'counts' })} of everybody present in a part of ${short(minutes, f)} ${f.plural(minutes, { one: 'minute', other: 'minutes' })}.`,
  meansDuration: ({ minutes }: { minutes: number }, f: F) =>
    `One child, watched for all ${short(minutes, f)} ${f.plural(minutes, { one: 'minute', other: 'minutes' })} of a part.`,
  meansTarget: (
    { target, fewest, peers, minutes }: { target: number; fewest: number; peers: number; minutes: number },
    f: F,
  ) =>
    `${f.whole(target)} ${f.plural(target, { one: 'look', other: 'looks' })} at the target child and ${peerLooks(fewest, peers, f)} in a part of ${short(minutes, f)} ${f.plural(minutes, { one: 'minute', other: 'minutes' })}.`,
  meansNothing: 'Not one interval fits into a part.',
  warnLongInterval:
    'More than 30 seconds between looks: short changes fall in between. Shorten the interval if you can.',
  warnLongObserve:
    'More than 10 seconds of watching: nearly every interval will hold some off-task. Watch for a shorter time if you can.',
  warnFewLooks:
    'Fewer than 10 looks at a child: a figure for one child says little. Watch fewer children or longer.',
  warnSweepTooLong:
    'A sweep needs more time than an interval has: each child will get less. Make the interval longer, or watch fewer children.',
  warnFewCounts: 'Fewer than 10 counts: a figure for one part says little. Count more often or longer.',
  warnShortPart: 'A part of less than two minutes is good for trying things out, not for a figure.',
  pictureTitle: 'When each child is seen',
  pictureEverybody: 'When the class is counted',
  placeholderChild: ({ n }: { n: number }, f: F) => `child ${f.whole(n)}`,
  pictureNote: 'One part, with children in a listed order. Their real order comes with the visit.',
  pictureNoteEachRound:
    'One part, with an order by chance for each round as it might come. The real one comes with the visit.',
  codes: 'What can be recorded',
  codesNote:
    'A code is what one touch says of a child. Two to six of them, in the order in which they stand in the room. “Cannot see” is always there and is no code: such a look is missing.',
  codeSetName: 'Name of the code set',
  beginWith: ({ name }: { name: string }) => `Begin with ${name}`,
  starterUsed: ({ name }: { name: string }) => `The codes are those of ${name} now.`,
  codeLabel: ({ n }: { n: number }, f: F) => `Label of code ${f.whole(n)}`,
  codeGroup: ({ n }: { n: number }, f: F) => `Code ${f.whole(n)}`,
  codesKeys:
    'On a keyboard, 1 is the first code, 2 the second, and so on, and 0 is “cannot see”. Each observer may choose other keys.',
  codesKeysTo: 'Observers and their keys',
  counts: 'How it counts',
  countsOn: 'as on-task',
  countsOff: 'as off-task',
  countsOther: 'neither',
  definition: 'Definition',
  examples: 'Examples',
  nonExamples: 'What does not count',
  wording: 'Definition and examples',
  moveUp: ({ name }: { name: string }) => `Move ${name} up`,
  moveDown: ({ name }: { name: string }) => `Move ${name} down`,
  up: 'Up',
  down: 'Down',
  takeAway: 'Take away',
  takeCodeAway: ({ name }: { name: string }) => `Take ${name} away`,
  codeTaken: ({ name }: { name: string }) => `${name} is taken away.`,
  upmost: 'is the first',
  downmost: 'is the last',
  codesFewest: 'two codes are the fewest',
  codesMost: 'six codes are the most',
  addCode: 'Add a code',
  codeUnnamed: ({ n }: { n: number }, f: F) => `code ${f.whole(n)}`,
  cues: 'Prompts',
  channel: 'In which ear',
  channelBoth: 'both',
  channelLeft: 'left',
  channelRight: 'right',
  volume: 'Volume',
  volumeHint: 'Low enough that nobody but you hears it.',
  flash: 'Flash on the screen',
  vibration: 'Vibration',
  noVibration: 'This tablet does not vibrate; another one may.',
  headsUp: 'Heads-up ahead of the look',
  headsUpOff: 'none',
  headsUpChild: 'the child is spoken',
  headsUpSeat: 'the seat is spoken',
  headsUpHint: 'A quiet voice, or a soft tone where the tablet has none. The prompt itself stays a tone.',
  headsUpAhead: 'Seconds ahead',
  headsUpAheadHint: 'Less than the interval.',
  playCue: 'Play the prompt',
  cueSilent: 'No sound came. Look at the silent switch and the volume.',
  saveProtocol: 'Keep this protocol',
  saveNewVersion: ({ version }: { version: number }, f: F) => `Keep as version ${f.whole(version)}`,
  protocolKept: ({ name, version }: { name: string; version: number }, f: F) =>
    `${name} is kept as version ${f.whole(version)}.`,
  removeProtocol: 'Take this protocol off the list',
  protocolRemoved: ({ name }: { name: string }) =>
    `${name} is off the list. Sessions keep the version they used.`,
  versions: 'Versions',
  version: ({ n }: { n: number }, f: F) => `Version ${f.whole(n)}`,
  lookOver: 'Some entries do not fit yet. Look for the marked fields.',
  between: ({ min, max }: { min: number; max: number }, f: F) =>
    `A number from ${short(min, f)} to ${short(max, f)} is needed.`,
} as const;
