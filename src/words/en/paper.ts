import type { Format } from '../format.ts';

type F = Format;

/** `3:20` from milliseconds; a tenth is written where there is one. */
const clock = (ms: number): string => {
  const tenths = Math.round(ms / 100);
  const seconds = Math.floor(tenths / 10) % 60;
  const rest = tenths % 10 === 0 ? '' : `.${tenths % 10}`;
  return `${Math.floor(tenths / 600)}:${String(seconds).padStart(2, '0')}${rest}`;
};

/** The schedule on paper, and a written sheet typed in. */
export const paper = {
  clock: ({ ms }: { ms: number }) => clock(ms),

  // the ways here
  printLink: 'Print the schedule as a sheet',
  printAgain: 'Print this schedule as a sheet',
  typeLink: 'Type in a sheet',
  fromPaper: 'from paper',
  timing: 'From paper: typed in from a sheet, so nothing is known of prompts and of the moment of each mark.',

  // printing
  title: 'The schedule on paper.',
  about: ({ klass, label }: { klass: string; label: string }) => `${klass} · sheet ${label}`,
  note: 'For the day the tablet fails, or for a second observer with a pencil. Written sheets are typed in afterwards and count like any session.',
  size: 'Paper',
  sizeA4: 'A4',
  sizeLetter: 'Letter',
  form: 'Form',
  formRows: 'One row a look',
  formRowsHint: 'In the order of the lesson, a box for each code.',
  formRounds: 'Round sheet',
  formRoundsHint: 'One row a child, one column a round; numbers are written in.',
  print: 'Print it',
  printHint: ({ pages }: { pages: number }, f: F) =>
    `${f.whole(pages)} ${f.plural(pages, { one: 'page', other: 'pages' })}. Print at actual size (100 %).`,
  preview: ({ page, of }: { page: number; of: number }, f: F) => `Page ${f.whole(page)} of ${f.whole(of)}`,
  nothing: 'No visit is prepared, so there is no schedule to print.',
  toReady: 'Back to the checks',
  toSession: 'Back to the session',

  // on the sheet
  sheetTitle: ({ klass }: { klass: string }) => `Record sheet, ${klass}`,
  label: ({ label }: { label: string }) => `Sheet ${label}`,
  pageOf: ({ page, of }: { page: number; of: number }, f: F) => `page ${f.whole(page)} of ${f.whole(of)}`,
  protocolLine: ({ name, version, method }: { name: string; version: number; method: string }, f: F) =>
    `${name}, version ${f.whole(version)}: ${method}`,
  recordPart: ({ observe, record }: { observe: number; record: number }, f: F) =>
    `Watch for ${f.decimal(observe).replace(/\.0$/, '')} s from the time given, then write for ${f.decimal(record).replace(/\.0$/, '')} s.`,
  lookAtTime: 'Look at the time given, from the start; write what you saw at that moment.',
  roundsHow:
    'Go down each column, at the time given, from the start; write the number of what you see at that moment.',
  countAtTime: 'At the time given count the children present, and how many of them are on-task.',
  durationHow: 'Write a line whenever what the child does changes: the time from the start, and the code.',
  watchFrom: 'Watch from the time given, from the start, until the next one.',
  wholeHow: 'Tick a code only when it lasted for the whole time of watching.',
  partialHow: 'Tick every code that occurred, if only for a moment.',
  dateField: 'Date',
  observerField: 'Observer',
  startField: 'Started at (clock)',
  stoppedField: 'Stopped early, after no.',
  stoppedAtField: 'Stopped early, at (min:s)',
  breakField: ({ phase }: { phase: string }) => `Break started, before “${phase}”`,
  firstTaskField: ({ phase }: { phase: string }) => `First task given: “${phase}” starts`,
  alone: 'alone',
  primary: 'first observer',
  second: 'second observer',
  legend: 'What the numbers mean',
  legendLater: ({ page }: { page: number }, f: F) => `What the numbers mean stands on page ${f.whole(page)}.`,
  reasons: ({ list }: { list: readonly string[] }) =>
    `No mark: ${list.join(' · ')}. An empty line counts as missing.`,
  numbered: ({ number, text }: { number: number; text: string }, f: F) => `${f.whole(number)} ${text}`,
  cannotSee: 'cannot see',
  none: 'none of them',
  noneDefinition: 'Watched, and none of the codes occurred.',
  cautions:
    'Pseudonyms only, no names. A worry about a child goes to the designated person, not on this sheet.',
  number: 'no.',
  time: 'time',
  child: 'child',
  round: ({ round }: { round: number }, f: F) => `${f.whole(round)}`,
  roundsOf: ({ phase, part }: { phase: string; part: number }) =>
    part === 0 ? phase : `${phase}, from the first task`,
  everybody: 'all present',
  reason: 'why no mark',
  write: 'number',
  onTask: 'on-task',
  present: 'present',
  line: 'line',
  onset: 'from (min:s)',
  part: ({ phase, part }: { phase: string; part: number }) =>
    part === 0 ? phase : `${phase}: times from the first task given`,
  partDuration: ({
    phase,
    number,
    child,
    length,
    part,
  }: {
    phase: string;
    number: number;
    child: string;
    length: string;
    part: number;
  }) => `No. ${number}, ${phase}: ${child}, for ${length}${part === 0 ? '' : ' from the first task given'}`,
  stopHere: 'End of the schedule.',

  // reserves, on the sheet and typed in
  standInHow: 'If a child leaves, watch the next reserve on its lines, and write it here.',
  standInReserves: ({ reserves, reasons }: { reserves: readonly string[]; reasons: readonly string[] }) =>
    `Reserves, in order: ${reserves.join(', ')}. Why: ${reasons.join(' · ')}.`,
  standInTitle: 'Who stepped in',
  standInNote:
    'One line for each child who left and whom a reserve stood in for. From that line on the record is the reserve’s.',
  standInChild: 'Who was away',
  standInReason: 'Why',
  standInReasonNo: 'Why (number)',
  standInFrom: 'From no.',
  standInBy: 'Who stepped in',
  standInUntil: 'Back from no.',
  standInWhole: 'Who was away, why, from which line, and who stepped in: all four are needed.',
  standInSaid: (
    {
      by,
      child,
      reason,
      from,
      until,
    }: { by: string; child: string; reason: string; from: number; until: number | null },
    f: F,
  ) =>
    `${by} for ${child} (${reason}) from no. ${f.whole(from)} ${until === null ? 'to the end' : `until no. ${f.whole(until)}, where ${child} is back`}`,
  standInRemove: ({ by, from }: { by: string; from: number }, f: F) =>
    `Remove ${by} from no. ${f.whole(from)}`,
  standsFor: ({ by, child }: { by: string; child: string }) => `${by} for ${child}`,

  // choosing what to type in
  chooseTitle: 'Which sheet will you type in?',
  chooseNote:
    'The label stands at the top right of each page. It finds the schedule that the sheet was printed from.',
  findLabel: 'Label of the sheet',
  find: 'Find it',
  prepared: 'The prepared visit',
  printed: 'Printed sheets',
  recorded: 'Visits with a record',
  recordedHint: 'A second observer wrote on paper while the first recorded: the two make a pair.',
  visitLine: ({ klass, label }: { klass: string; label: string }) => `${klass}, sheet ${label}`,
  recordLine: (
    { klass, date, observers }: { klass: string; date: string | null; observers: readonly string[] },
    f: F,
  ) => `${klass}${date === null ? '' : `, ${f.day(date)}`}: recorded by ${f.list(observers)}`,
  typeThis: 'Type it in',
  nothingToType:
    'There is no schedule on this tablet yet. Prepare a visit, or take one over from another tablet.',
  toPrepare: 'Prepare a visit',

  // typing in
  typeTitle: ({ label }: { label: string }) => `Sheet ${label}.`,
  typeAbout: ({ klass, protocol }: { klass: string; protocol: string }) => `${klass} · ${protocol}`,
  progress: ({ done, of }: { done: number; of: number }, f: F) =>
    `${f.whole(done)} of ${f.whole(of)} lines typed`,
  onsetsTyped: ({ n }: { n: number }, f: F) =>
    `${f.whole(n)} ${f.plural(n, { one: 'line', other: 'lines' })} typed`,
  keptSoFar: 'kept as you type',
  keeping: 'keeping …',
  headTitle: 'Head of the sheet',
  observer: 'Observer',
  observerChoose: 'Choose',
  role: 'Role',
  date: 'Date',
  start: 'Started at',
  timeHint: 'By the clock, such as 10:41 or 10:41:30.',
  breakStarted: 'Break started',
  firstTask: ({ phase }: { phase: string }) => `First task given, “${phase}”`,
  firstTaskHint: 'Stays empty when that part was not observed.',
  stopped: 'Stopped early after no.',
  stoppedAt: 'Stopped early at (min:s)',
  addObserver: 'Somebody else …',
  stoppedHint: 'Stays empty when the sheet went on to its end.',
  linesTitle: 'Lines',
  numberField: 'Number on this line',
  keysOne:
    'Type the number of each line: it is marked and the next line comes. Arrows move, Backspace empties.',
  keysSeveral: 'Type each number that is ticked, then Enter. Arrows move, Backspace empties.',
  keysLong: 'Type the number, then Enter. Arrows move, Backspace empties.',
  keysCount: 'Type on-task, Enter, present, Enter. The number present is carried along.',
  keysOnset: 'Type the time, Enter, the number, Enter.',
  now: ({ number, time, child }: { number: number; time: string; child: string }, f: F) =>
    `No. ${f.whole(number)} · ${time} · ${child}`,
  empty: 'empty',
  counts: ({ on, present }: { on: number; present: number }, f: F) => `${f.whole(on)} of ${f.whole(present)}`,
  emptyLine: 'Empty this line',
  back: 'Line before',
  next: 'Next line',
  undo: 'Undo',
  undoNothing: 'nothing to undo yet',
  firstLine: 'This is the first line.',
  emptyAlready: 'This line is empty.',
  onsetTime: 'From (min:s)',
  onsetWhat: 'What began',
  onsetChoose: 'choose',
  onsetPart: 'Part',
  addLine: 'Add the line',
  removeLine: ({ time }: { time: string }) => `Remove the line at ${time}`,
  onsetSaid: ({ time, text }: { time: string; text: string }) => `${time} ${text}`,
  finishTitle: 'Keep it',
  finishText: ({ empty }: { empty: number }, f: F) =>
    empty === 0
      ? 'Every line is typed. Once it is a session, changes are corrections that say why.'
      : `${f.whole(empty)} ${f.plural(empty, { one: 'line is', other: 'lines are' })} empty and will count as missing. Once it is a session, changes are corrections that say why.`,
  finishOnsets: 'Once it is a session, changes are corrections that say why.',
  keep: 'Keep as a session',
  putAway: 'Put the sheet away',
  putAwayDone: ({ label }: { label: string }) => `What was typed of sheet ${label} is put away.`,
} as const;

/** What on a sheet cannot be, and where to look. */
export const paperProblems = {
  'paper.noSchedule': 'This session came from a table, so it has no schedule of its own.',
  'paper.noLabel': (v: { label: string }) =>
    `No schedule on this tablet has the label ${v.label}. Look at it again, or take the visit over from the tablet that printed it.`,
  'paper.nothing': 'Nothing is typed in yet.',
  'paper.noObserver': 'Say who wrote the sheet.',
  'paper.noDate': 'The date is empty. It stands at the head of the sheet.',
  'paper.inFuture': (v: { date: string }, f: F) =>
    `${f.day(v.date)} has not come yet. Look at the date again.`,
  'paper.noStart': 'The time of the start is empty. Give it as the clock said, such as 10:41.',
  'paper.badStart': (v: { found: string }) =>
    `“${v.found}” is no date and time. Give them as 10:41 or 10:41:30.`,
  'paper.badTime': (v: { found: string }) =>
    `“${v.found}” is no time of the clock. Give it as 10:41 or 10:41:30.`,
  'paper.noFirstTask': (v: { phase: string }) =>
    `Lines of “${v.phase}” are typed, but not when its first task was given.`,
  'paper.breakBeforeStart': (v: { breakStarted: string; start: string }) =>
    `The break cannot have started at ${v.breakStarted}: that is before its part began (the sheet starts at ${v.start}).`,
  'paper.firstTaskBeforeBreak': (v: { firstTask: string; breakStarted: string }) =>
    `The first task cannot have been given at ${v.firstTask}, before the break started at ${v.breakStarted}.`,
  'paper.firstTaskBeforeStart': (v: { firstTask: string; start: string }) =>
    `The first task cannot have been given at ${v.firstTask}: that is before the part before it began (the sheet starts at ${v.start}).`,
  'paper.firstTaskTooEarly': (v: { firstTask: string; interval: number }, f: F) =>
    `The first task cannot have been given at ${v.firstTask}: line ${f.whole(v.interval)} of the part before comes later and has a mark.`,
  'paper.markAfterBreak': (v: { breakStarted: string; interval: number }, f: F) =>
    `Line ${f.whole(v.interval)} has a mark, but the break had started at ${v.breakStarted}, before that look.`,
  'paper.stoppedNowhere': (v: { found: number; last: number }, f: F) =>
    `The sheet cannot have stopped after ${f.whole(v.found)}: its lines go from 1 to ${f.whole(v.last)}.`,
  'paper.markAfterStop': (v: { interval: number; stoppedAfter: number }, f: F) =>
    `Line ${f.whole(v.interval)} has a mark, but the sheet stopped after ${f.whole(v.stoppedAfter)}.`,
  'paper.stoppedOutside': (v: { at: number; length: number }) =>
    `The sheet cannot have stopped early at ${clock(v.at)} of its last part, which lasts until ${clock(v.length)}.`,
  'paper.onsetAfterStop': (v: { at: number; stoppedAt: number }) =>
    `A line begins at ${clock(v.at)}, but the sheet stopped at ${clock(v.stoppedAt)}.`,
  'paper.otherMethod': (v: { interval: number }, f: F) =>
    `Line ${f.whole(v.interval)} holds something that this method does not record.`,
  'paper.noCount': (v: { interval: number }, f: F) =>
    `Line ${f.whole(v.interval)} needs two whole numbers: on-task and present.`,
  'paper.tooMany': (v: { interval: number; present: number }, f: F) =>
    `Line ${f.whole(v.interval)} has ${f.whole(v.present)} children present; a class has at most 200.`,
  'paper.onOverPresent': (v: { interval: number; on: number; present: number }, f: F) =>
    `Line ${f.whole(v.interval)} has ${f.whole(v.on)} on-task of ${f.whole(v.present)} present: no more can be on-task than are there.`,
  'paper.noNumber': (v: { found: string }) => `${v.found} means nothing on this sheet.`,
  'paper.pastEnd': (v: { last: number }, f: F) =>
    `The schedule ends with line ${f.whole(v.last)}. Go back to the line that you mean.`,
  'paper.noOnset': (v: { found: string }) => `“${v.found}” is no time from the start. Give it as 3:20.`,
  'paper.onsetOutside': (v: { at: number; length: number }) =>
    `${clock(v.at)} is outside of the part, which lasts until ${clock(v.length)}.`,
  'paper.standInWho': (v: { name: string; reserve: string }) =>
    `${v.reserve} cannot have stepped in for ${v.name}: a reserve of this sheet steps in for a child on it, or for a reserve who stands in.`,
  'paper.standInNowhere': (v: { reserve: string; found: number; last: number }, f: F) =>
    `Line ${f.whole(v.found)} is not on this sheet, whose lines go from 1 to ${f.whole(v.last)}. Look at the absence in which ${v.reserve} stepped in.`,
  'paper.standInBack': (v: { name: string; from: number; until: number }, f: F) =>
    `${v.name} cannot be back at line ${f.whole(v.until)}: it was away from line ${f.whole(v.from)} on. Give a later line, or leave it empty.`,
  'paper.standInAway': (v: { name: string }) =>
    `${v.name} is away twice at the same time. Look at the lines of the first absence.`,
  'paper.standInBusy': (v: { reserve: string }) =>
    `${v.reserve} stands in for two children at the same time. Say at which line the first was back, or choose another reserve.`,
  'paper.onsetTwice': (v: { at: number }) => `Two lines begin at ${clock(v.at)}. Remove one of them.`,
} as const;
