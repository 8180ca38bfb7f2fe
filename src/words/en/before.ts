import type { Format } from '../format.ts';
import { peerLooks, short } from './study/short.ts';

/** What a visit cannot be prepared without. */
type Missing = 'class' | 'protocol' | 'phases' | 'children' | 'draw' | 'child';

type Purpose = 'record' | 'practice' | 'familiarisation';

type F = Format;

const inMinutes = (minutes: number, f: F): string =>
  `${short(Math.round(minutes * 10) / 10, f)} ${f.plural(minutes, { one: 'minute', other: 'minutes' })}`;

/** How many lessons the storage would hold; beyond a thousand nobody wants to know. */
const lessonsIn = (lessons: number, f: F): string =>
  lessons > 1000 ? `more than ${f.whole(1000)} lessons` : `about ${f.whole(lessons)} lessons`;

/** Before the visit: choosing class, protocol and children, and the checks at the classroom door. */
export const before = {
  /** For somebody who opened the page by chance. */
  appIs:
    'Lookbell is the timer, the prompt and the record sheet of a lesson observation, on this tablet and with no network.',

  // choosing
  chooseTitle: 'What will you observe?',
  noStudyTitle: 'First, a study.',
  noStudyText:
    'A study holds your classes, children, observers and protocols. Begin one, or open the demo study and look around.',
  toStudy: 'Go to The study',
  preparedAbout: ({ klass, children }: { klass: string; children: number }, f: F) =>
    `${klass} is prepared, with ${f.whole(children)} ${f.plural(children, { one: 'child', other: 'children' })}.`,
  preparedGo: 'Go on to the checks',
  preparedForget: 'Put it away',
  unfinished: ({ klass, time }: { klass: string; time: string }) =>
    `A recording of ${klass}, begun at ${time}, was not ended.`,
  unfinishedGo: 'Look at it',
  noClasses: 'The study has no class yet. Add one with its children first.',
  noObservers: 'The study has no observer yet.',
  addObserver: 'Name of the observer',
  addObserverHint: 'Initials or a working name, as the team knows you.',
  klass: 'Class',
  klassHint: ({ n }: { n: number }, f: F) =>
    `${f.whole(n)} ${f.plural(n, { one: 'child', other: 'children' })}`,
  protocol: 'Protocol',
  protocolAsLast: ({ ofClass }: { ofClass: boolean }) =>
    ofClass ? 'As last time in this class.' : 'As last time in this study.',
  toProtocol: 'Make a protocol',
  tryShort: 'Try it for a minute',
  tryShortHint:
    'Five seconds a look, two rounds, one phase: enough to see how it goes, too little for a figure. Say “practice” where you say who records, and it stays out of all results.',
  tryShortName: 'One minute, to try',
  phases: 'Phases of this lesson',
  phasesLast: ({ phases }: { phases: readonly string[] }, f: F) =>
    `Last time this class was seen in ${f.list(phases)} alone.`,
  phasesAll: ({ phases }: { phases: readonly string[] }) => phases.join(', break, '),
  phasesAllHint: 'One sitting: the break lies between, the children stay the same.',
  phasesOne: ({ phase }: { phase: string }) => `only ${phase}`,
  children: 'Children watched today',
  childrenDrawn: 'Drawn children who are there today',
  childrenHint: 'Take the tick away from a child who is not there. A reserve steps in, in drawn order.',
  notDrawn: ({ klass }: { klass: string }) =>
    `The children of ${klass} to be watched have not been drawn yet.`,
  drawNow: ({ n }: { n: number }, f: F) => `Draw ${f.whole(n)} at random`,
  tooFew: 'The class has no children yet. Add those with consent first.',
  toClass: 'Open the class',
  stepsIn: ({ by, absent }: { by: string; absent: string }) => `${by} steps in for ${absent}.`,
  nobodyStepsIn: ({ absent }: { absent: string }) =>
    `No reserve is left for ${absent}: one child fewer is watched.`,
  start: 'Agreed start (may stay empty)',
  startHint: 'Two observers may begin at this second by themselves; alone it is only written down.',
  prepare: 'Prepare the visit',
  firstOf: ({ missing }: { missing: Missing }) =>
    ({
      class: 'First choose the class.',
      protocol: 'First make a protocol: the study has none.',
      phases: 'First say which phases this lesson has.',
      children: 'First add the children of this class.',
      draw: 'First draw the children to watch.',
      child: 'First choose the child to watch, or draw one.',
    })[missing],
  everybody: 'Children of the class today',
  everybodyHint:
    'A headcount looks at everybody: nobody is drawn. Take the tick away from a child who is not there.',
  targetChild: 'Target child',
  targetChildHint: 'The others are its peers, in an order of their own.',
  onlyChild: 'The child to watch',
  onlyChildHint: 'All looks of the lesson go to this one child.',
  targetDrawn: 'drawn',
  targetOthers: 'others of the class',
  targetOpen: 'not chosen yet',
  targetByChance: ({ name }: { name: string }) => `as chance has it: ${name}`,
  targetAsDrawn: ({ name }: { name: string }) => `as drawn: ${name}`,
  scheduleTitle: 'The schedule',
  meaning: (
    {
      fewest,
      most,
      minutes,
      children,
      parts,
    }: { fewest: number; most: number; minutes: number; children: number; parts: number },
    f: F,
  ) =>
    `${fewest === most ? f.whole(fewest) : `${f.whole(fewest)} to ${f.whole(most)}`} ${f.plural(most, { one: 'look', other: 'looks' })} a child in ${inMinutes(minutes, f)}${parts > 1 ? ' in each phase' : ''}, ${f.whole(children)} ${f.plural(children, { one: 'child', other: 'children' })}.`,
  meaningCounts: (
    {
      counts,
      minutes,
      children,
      parts,
    }: { counts: number; minutes: number; children: number; parts: number },
    f: F,
  ) =>
    `${f.whole(counts)} ${f.plural(counts, { one: 'count', other: 'counts' })} of the class in ${inMinutes(minutes, f)}${parts > 1 ? ' in each phase' : ''}, ${f.whole(children)} ${f.plural(children, { one: 'child', other: 'children' })} present.`,
  meaningTarget: (
    {
      target,
      fewest,
      peers,
      minutes,
      parts,
    }: { target: number; fewest: number; peers: number; minutes: number; parts: number },
    f: F,
  ) =>
    `${f.whole(target)} ${f.plural(target, { one: 'look', other: 'looks' })} at the target child and ${peerLooks(fewest, peers, f)} in ${inMinutes(minutes, f)}${parts > 1 ? ' in each phase' : ''}.`,
  meaningDuration: ({ minutes, parts }: { minutes: number; parts: number }, f: F) =>
    `One child, watched for all of ${inMinutes(minutes, f)}${parts > 1 ? ' in each phase' : ''}.`,
  secondTitle: 'You are the second observer?',
  secondText:
    'Take the visit file of the first tablet: the same children, order and prompts, under your own name.',
  secondTake: 'Take over a visit file',
  cautions:
    'Consent and assent come first, under the rules of the school and the ethics board. A worry about a child goes to the school’s designated person, not into the record.',

  // the checks
  readyAbout: ({
    klass,
    protocol,
    how,
    phases,
  }: {
    klass: string;
    protocol: string;
    how: string;
    phases: readonly string[];
  }) => `${klass} · ${protocol} · ${how} · ${phases.join(', break, ')}`,
  readyTitle: ({ n }: { n: number }, f: F) =>
    n === 0
      ? 'Everything is ready. Go in.'
      : `${n === 1 ? 'One thing' : n === 2 ? 'Two things' : n === 3 ? 'Three things' : `${f.whole(n)} things`} before you go in.`,
  ready: 'ready',
  hold: 'on hold',
  unknown: 'not known',
  nothingPrepared: 'No visit is prepared.',
  toPrepare: 'Prepare one',

  observer: 'Observer',
  observerWho: ({ name, role, purpose }: { name: string; role: string; purpose: Purpose }) =>
    `${name}, ${role}${purpose === 'practice' ? '; this one is practice' : purpose === 'familiarisation' ? '; a familiarisation visit' : ''}.`,
  observerWhy: ({ why }: { why: 'as last time' | 'the only one' }) =>
    why === 'as last time' ? 'As last time on this tablet.' : 'The only observer of the study.',
  observerNobody: 'Say who records.',
  observerChoose: 'Choose',
  observerDialog: 'Who records on this tablet?',
  role: 'Who else records this lesson?',
  roleAlone: 'nobody',
  roleAloneHint: 'You may pause the schedule.',
  rolePrimary: 'a second observer checks mine',
  rolePrimaryHint: 'Your record counts.',
  roleSecond: 'I check the first observer',
  roleSecondHint: 'Your record checks theirs.',
  roleShortAlone: 'alone',
  roleShortPrimary: 'primary: this record counts',
  roleShortSecond: 'second: this record checks',
  practiceHint: 'Kept and marked as practice; left out of all results.',

  sound: 'Earpiece',
  soundAsk: 'Play the tone and say where you heard it. Nothing may come from the loudspeaker.',
  soundPlayed: 'Did you hear it, and only in your ear?',
  soundHeard: ({ output }: { output: string }) =>
    output === '' ? 'You heard the tone in your ear.' : `You heard the tone through ${output}.`,
  soundNotHeard:
    'You did not hear it. Look at the silent switch, the volume and the plug; the screen cue goes on without sound.',
  soundLoud: 'The class could hear it. Plug the earpiece in, or silence the prompts: the screen cue goes on.',
  soundStuck: 'The tablet gave no sound. The screen cue goes on without it.',
  headsUpVoice: ({ example }: { example: string }) =>
    `Ahead of each look a voice on this tablet says it, for example “${example}”, in both ears, also where the tones go to one. The prompt itself stays a tone.`,
  headsUpRows: 'The row nearest to you is the first; places count from the left.',
  headsUpNoVoice:
    'No voice is on this tablet itself, and none is fetched: ahead of each look two soft rising tones take its place.',
  headsUpTry: ({ voice }: { voice: boolean }) => (voice ? 'Hear the voice' : 'Hear the two tones'),
  headsUpStuck: 'The tablet gave no sound.',
  soundBlind:
    'This browser cannot tell when the earpiece is pulled out: keep the volume low and the silence button in mind.',
  soundLate: ({ ms }: { ms: number }, f: F) =>
    `Sound comes about ${f.whole(ms)} ms late here. A wired earpiece is quicker.`,
  soundPlay: 'Play tone',
  soundAgain: 'Play again',
  soundYes: 'In my ear',
  soundNo: 'Not at all',
  soundAll: 'Out loud',

  present: 'Children',
  presentList: ({ children }: { children: readonly string[] }, f: F) => `${f.list(children)}.`,
  presentAsk: 'Are they all here?',
  presentYes: 'All are here',
  presentNo: 'Somebody is away',
  awake: 'Kept awake',
  awakeHeld: 'The screen stays on while you record.',
  awakeRefused:
    'The tablet refuses to keep the screen on. Switch battery saving off, or touch the screen now and then.',
  awakeMissing: 'This browser cannot keep the screen on. Set the tablet’s own screen time to the longest.',
  room: 'Tablet storage',
  roomFree: ({ lessons }: { lessons: number }, f: F) =>
    `It has room for the records of ${lessonsIn(lessons, f)}.`,
  roomNotKept: ({ lessons }: { lessons: number }, f: F) =>
    `It has room for the records of ${lessonsIn(lessons, f)}, but the browser does not promise to keep them: install the app, and hand over the same day.`,
  roomLow: 'It is nearly full. Delete something else from the tablet before you record.',
  roomUnknown: 'The browser does not tell how much of it is free.',
  battery: 'Battery',
  batteryFull: ({ percent, charging }: { percent: number; charging: boolean }, f: F) =>
    `${f.percent(percent)}${charging ? ', charging' : ''}.`,
  batteryLow: ({ percent }: { percent: number }, f: F) =>
    `${f.percent(percent)} left. Charge it, or bring a cable.`,
  batteryUnknown: 'The browser does not tell. Look at the tablet’s own sign.',
  offline: 'Offline',
  offlineReady: 'Everything needed is on this tablet.',
  offlineNot: 'The app is not on this tablet yet. Stay online a moment and open it once more.',
  clock: 'Clock',
  clockText: ({ time, zone }: { time: string; zone: string }) =>
    `${time}, ${zone}. The schedule does not depend on it.`,
  onlyHere: 'Only here',
  onlyHereYes: 'No other window is recording.',
  onlyHereNo: 'Another window of this tablet is recording. End it there first.',

  goIn: 'Go in',
  goInAnyway: 'Go in anyway',
  goInNobody: 'First say who records: the record carries the observer’s name.',
  anywayNote:
    'On hold means not checked, or not well. What was on hold when you went in is written into the record of the session.',
  secondTablet: 'Second tablet',
  secondTabletText:
    'Hand the visit file over, so that both tablets watch the same children at the same prompts.',
  handVisit: 'Hand over the visit file',
  handMaking: 'The file is being made …',
  handAgain: 'The tablet asks for a second tap. Tap once more.',
  handed: 'The visit file has left this tablet.',
  again: 'Look again',
} as const;
