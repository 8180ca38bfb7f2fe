import type { Format } from '../format.ts';

/** Words of the recording screen and of its door: short, since they are read at arm's length between two looks. */

type F = Pick<Format, 'whole' | 'plural' | 'clock' | 'list'>;

const looks = (n: number, f: F) => `${f.whole(n)} ${f.plural(n, { one: 'look', other: 'looks' })}`;
/** All that was written down: prompts, touches, notes, pauses. */
const entries = (n: number, f: F) => `${f.whole(n)} ${f.plural(n, { one: 'entry', other: 'entries' })}`;
const missingLooks = (n: number, f: F) =>
  `${looks(n, f)} ${f.plural(n, { one: 'is', other: 'are' })} missing`;

export const room = {
  // the door
  doorAbout: 'In the room',
  doorNothing: 'Nothing is being recorded.',
  doorNothingText: 'A session begins with the checks before the visit.',
  doorPrepared: ({ klass }: { klass: string }) => `The visit to ${klass} is prepared.`,
  doorToBefore: 'Before the visit',
  doorToReady: 'Go to the checks',
  doorRunning: 'A session is running.',
  doorRunningText: ({ klass }: { klass: string }) => `${klass}. Prompts go on while you are here.`,
  doorBack: 'Back into the room',
  doorOver: 'The session is over.',
  doorCutOff: ({ n }: { n: number }, f: F) =>
    n === 1 ? 'A session was cut off.' : `${f.whole(n)} sessions were cut off.`,
  doorBegan: ({ observer, day, time }: { observer: string; day: string; time: string }) =>
    `${observer} began it on ${day} at ${time}.`,
  doorNotBegun: ({ observer }: { observer: string }) => `${observer} went in, and it has not begun yet.`,
  doorKept: ({ kept, of }: { kept: number; of: number }, f: F) =>
    kept === 0
      ? `No look of ${f.whole(of)} was marked.`
      : `Kept: ${f.whole(kept)} of ${looks(of, f)} marked.`,
  doorGoesOnAt: ({ number, child, of }: { number: number; child: string; of: number }, f: F) =>
    `Taken up now, it goes on at about interval ${f.whole(number)} of ${f.whole(of)}${child === '' ? '' : `, with ${child}`}.`,
  doorStartsAt: ({ child }: { child: string }) =>
    child === '' ? 'It begins with the first interval.' : `It begins with ${child}.`,
  doorGoesOnWith: ({ phase }: { phase: string }) =>
    `Its part is over. Taken up now, it waits for “${phase}” to begin.`,
  doorPausedAt: ({ number }: { number: number }, f: F) =>
    `It was paused, and goes on at interval ${f.whole(number)}.`,
  doorTimeOver: 'Its time is over: no look is left to make.',
  doorBetween: ({ n }: { n: number }, f: F) =>
    n === 0
      ? 'No interval was lost so far.'
      : `${f.whole(n)} ${f.plural(n, { one: 'interval', other: 'intervals' })} in between ${f.plural(n, { one: 'is', other: 'are' })} missing, with that reason.`,
  doorTakeUp: 'Take it up',
  doorGoIn: 'Go in',
  doorClose: 'Close it for good',
  doorCloseTitle: 'Close this session for good?',
  doorCloseText:
    'What was kept stays kept. The looks not made are missing: ended early. It cannot be taken up again.',
  doorCloseDo: 'Close it',

  // opening
  opening: 'Opening the session …',
  notOpened: 'This session cannot be opened here.',
  toDoor: 'In the room',

  // before the tap that begins
  readyAbout: ({
    klass,
    protocol,
    practice,
    familiarisation,
  }: {
    klass: string;
    protocol: string;
    practice: boolean;
    familiarisation: boolean;
  }) =>
    `${klass} · ${protocol}${practice ? ' · practice' : ''}${familiarisation ? ' · familiarisation visit' : ''}`,
  readyTitle: 'Start when the lesson does.',
  readyTitleShared: 'Start on a shared count.',
  readyTitleResuming: 'Go on where the schedule is now.',
  readyAlone: 'A count-in follows: three, two, one. Then the schedule runs.',
  readyShared:
    'Count together: three, two, one. Both observers touch on “one”. A count-in follows on each tablet.',
  readyResuming: 'What was kept is here. Intervals in between are missing, with that reason.',
  readyFirst: ({ child }: { child: string }) => `First: ${child}`,
  readySilent: 'Sound is off; the cue is shown.',
  start: 'Start',
  goOn: 'Go on',
  starting: 'Starting …',
  leaveReady: 'Not now',
  countIn: 'The schedule begins in',

  // who to look at
  lookAt: 'look at',
  watch: 'watch',
  record: 'now record',
  first: 'first',
  next: ({ child }: { child: string }) => `then ${child}`,
  nextSame: 'then the same child',
  nextNone: 'the last look',
  atFirstCue: 'at the first cue',
  atNextCue: 'at the next cue',
  awayNow: ({ reason }: { reason: string }) => `is away: ${reason}`,
  armed: ({ child }: { child: string }) => `The next touch marks ${child}, the child before.`,
  everyone: 'the class',
  plan: 'Seating plan, seen from where you sit',
  awayList: ({ children }: { children: readonly string[] }, f: F) => `Away: ${f.list(children)}`,

  // the top row
  timeLeft: 'Time left',
  round: ({ round, rounds }: { round: number; rounds: number }, f: F) =>
    `round ${f.whole(round)} of ${f.whole(rounds)}`,
  ribbon: ({ now, of, missing }: { now: number; of: number; missing: number }, f: F) =>
    `Session: interval ${f.whole(now)} of ${f.whole(of)}; ${missingLooks(missing, f)}`,

  // targets
  codesLeft: 'Codes, left edge',
  codesRight: 'Codes, right edge',
  cannotSee: 'cannot see',
  noneOfThese: 'none of these',
  childBefore: 'child before',
  childBeforeArmed: 'marks the child before',
  key: ({ key }: { key: string }) =>
    (
      ({
        ' ': 'Space',
        PageUp: 'Page up',
        PageDown: 'Page down',
        ArrowLeft: '←',
        ArrowRight: '→',
        ArrowUp: '↑',
        ArrowDown: '↓',
      }) as Record<string, string>
    )[key] ?? (key.length === 1 ? key.toUpperCase() : key),

  // the bottom row
  rare: 'Things that happen now and then',
  undo: 'undo',
  undoNothing: 'nothing to undo',
  undoKind: ({ kind }: { kind: string }) =>
    (
      ({
        missing: 'cannot see',
        corrected: 'correction',
        swapped: 'swap',
        unusable: 'stretch of no use',
        flagged: 'flag',
        interrupted: 'class interrupted',
        continued: 'class goes on',
        paused: 'pause',
        resumed: 'going on',
        left: 'left',
        returned: 'came back',
        moved: 'moved',
        lessonPart: 'lesson part',
        noted: 'note',
        breakStarted: 'break started',
        breakEnded: 'first task given',
        phaseStarted: 'first task given',
        outputChanged: 'sound',
      }) as Record<string, string>
    )[kind] ?? kind,
  flag: 'flag',
  child: 'child …',
  interrupt: 'class interrupted',
  pause: 'pause',
  breakStarted: 'break started',
  firstTask: 'first task given',
  lessonPart: 'lesson part …',
  lessonPartNow: ({ part }: { part: string }) => `part: ${part}`,
  note: 'note …',
  end: 'end …',
  more: 'more …',
  silence: 'silence',
  soundOn: 'sound on',
  nothingMarked: 'nothing marked yet',
  kept: ({ kept, of }: { kept: number; of: number }, f: F) =>
    `${entries(of, f)}, ${kept === of ? 'all' : f.whole(kept)} kept`,
  dismiss: 'Seen',

  // panels
  moreTitle: 'More',
  noteTitle: 'Note',
  noteLabel: 'What happened? No names.',
  noteAboutFlag: 'About the last flag',
  noteKeep: 'Keep the note',
  partTitle: 'Which part of the lesson?',
  partNone: 'none of these',
  childTitle: 'Which child?',
  childWhat: ({ child }: { child: string }) => `What about ${child}?`,
  childLeftRoom: 'left the room',
  childWithAdult: 'is with another adult',
  childNotPart: 'takes no part',
  childBack: 'came back',
  childMoved: 'sits elsewhere …',
  childWhere: ({ child }: { child: string }) => `Where does ${child} sit now?`,
  childAway: ({ child, reason }: { child: string; reason: string }) => `${child} (${reason})`,
  endTitle: 'End the session now?',
  endWords: 'Why (may stay empty)',
  endDo: 'End the session',
  endNot: 'Go on recording',

  // states in which nothing is marked
  interruptedTitle: 'The class is interrupted.',
  interruptedText:
    'The schedule runs on in silence, so that two observers stay in step. Looks until the class goes on are missing: class interrupted.',
  interruptedDo: 'The class goes on',
  pausedTitle: 'Paused.',
  pausedText: 'The schedule stands still. No look is lost.',
  pausedDo: 'Go on',
  closedTitle: ({ phase }: { phase: string }) => `“${phase}” is done.`,
  closedText: 'Touch when the break starts. Prompts are silent until the first task after it.',
  closedLastTitle: 'The last look has been made.',
  breakTitle: 'Break.',
  breakText: ({ phase }: { phase: string }) =>
    `Touch when the first task after the break is given: “${phase}” begins after three, two, one.`,
  breakStartedDo: 'Break started',
  firstTaskDo: 'First task given',
  overTitle: 'The session is over.',
  overEarlyTitle: 'The session was ended early.',
  overKept: ({ of }: { of: number }, f: F) => `All kept: ${entries(of, f)} (prompts, touches and notes).`,
  overNotKept: ({ kept, of }: { kept: number; of: number }, f: F) =>
    `Kept ${f.whole(kept)} of ${entries(of, f)}. Stay here: the tablet is asked again.`,
  overAgain: 'Try again',
  overDo: 'Go to its figures',

  // holds: one calm sentence each
  holdRefused: ({ kept, of, why }: { kept: number; of: number; why: string }, f: F) =>
    `Kept ${f.whole(kept)} of ${entries(of, f)}. ${why}`,
  holdSoundStuck: 'The tablet gives no sound. Go on with the brass frame at each cue, or try the sound.',
  holdOutput: 'The output changed: cues are silent, the brass frame shows them. Sound again?',
  holdSoundTry: 'Try the sound',
  holdSoundOn: 'Sound on',
  holdAwake: 'The tablet may fall asleep. Touch the screen now and then.',
  holdGap: ({ seconds, cause, continuous }: { seconds: number; cause: string; continuous: boolean }, f: F) =>
    `${
      (
        {
          closed: 'The app was closed',
          hidden: 'The screen was hidden',
          asleep: 'The tablet slept',
          sound: 'The sound stood still',
          clock: 'The clock jumped',
        } as Record<string, string>
      )[cause] ?? 'The tablet was away'
    } for ${f.clock(seconds * 1000)} minutes. ${
      continuous
        ? 'That time is missing. Touch what the child does now.'
        : 'Cues that nobody got are missing: prompt failed.'
    }`,
  holdLeave: 'Still recording. End the session first, then leave.',
  notTaken: ({ why }: { why: string }) =>
    (
      ({
        'before the first cue': 'Not taken: the cue has not come yet.',
        'after the last interval': 'Not taken: the last look is closed.',
        'class interrupted': 'Not taken: the class is interrupted.',
        'nothing before': 'There is no look before this one.',
        'another scan': 'Not taken: a new scan has just begun.',
        'not running': 'Not taken: the schedule is not running.',
      }) as Record<string, string>
    )[why] ?? why,
} as const;
