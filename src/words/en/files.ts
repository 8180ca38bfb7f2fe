import type { Format } from '../format.ts';

type F = Format;
const n = (f: F, count: number, one: string, other: string): string =>
  `${f.whole(count)} ${f.plural(count, { one, other })}`;

interface Counts {
  readonly new: number;
  readonly known: number;
  readonly changed: number;
}

const counted = (f: F, counts: Counts, one: string, other: string): string => {
  const said = [
    counts.new > 0 ? `${f.whole(counts.new)} new ${f.plural(counts.new, { one, other })}` : '',
    counts.changed > 0 ? `${f.whole(counts.changed)} with something new` : '',
    counts.known > 0 ? `${f.whole(counts.known)} already here` : '',
  ].filter((s) => s !== '');
  if (counts.new === 0 && said.length > 0)
    return `${f.plural(counts.changed + counts.known, { one, other })}: ${said.join(', ')}`;
  return said.join(', ');
};

/** Files in and out. */
export const files = {
  title: ({ waiting }: { waiting: number }, f: F) =>
    waiting === 0
      ? 'Everything recorded here has been handed over.'
      : `${n(f, waiting, 'record is', 'records are')} only on this tablet.`,
  emptyTitle: 'Nothing has been recorded on this tablet yet.',
  note: 'A tablet can be lost or break. What is handed over is in two places.',
  noStudy: 'There is no study to hand over yet.',
  lastBackup: ({ wall }: { wall: string }, f: F) =>
    `The study file last left this tablet on ${f.day(wall)} at ${f.time(wall)}.`,
  neverBackedUp: 'The study file has never left this tablet.',
  out: 'Hand over',
  studyFile: 'Study file',
  studyFileText:
    'Everything, with every journal; nothing is lost. Another tablet or the team’s computer takes it in, as often as you like.',
  studyFileMake: 'Make the study file',
  tableFile: 'Interval table',
  tableFileText:
    'One row an interval, for a spreadsheet or a statistics program. It leaves out the journals, so it does not count as handed over.',
  tableFileMake: 'Make the interval table',
  making: 'Making the file …',
  stop: 'Stop',
  ready: ({ name, bytes }: { name: string; bytes: number }, f: F) =>
    `${name}, ${bytes < 100_000 ? `${f.whole(Math.max(1, bytes / 1000))} kB` : `${f.fixed(bytes / 1_000_000, 1)} MB`}`,
  give: 'Share or save it',
  againTap: 'The browser asks for one more tap.',
  shared: 'The file was shared.',
  saved: 'The file was saved to the downloads.',
  cancelled: 'Nothing has left the tablet.',
  handOver: 'Hand over now',
  in: 'Bring in',
  inText:
    'Study files of other tablets and interval tables, as many as you like. You see what they hold before anything is kept; nothing is doubled.',
  choose: 'Choose files',
  reading: ({ count }: { count: number }, f: F) => `Reading ${n(f, count, 'file', 'files')} …`,
  previewTitle: 'What these files would bring',
  form: ({ form }: { form: 'study' | 'visit' | 'table' | null }) =>
    form === null ? '' : { study: 'study file', visit: 'visit file', table: 'interval table' }[form],
  ofStudies: ({ names }: { names: readonly string[] }, f: F) =>
    `of ${f.list(names.map((name) => `“${name}”`))}`,
  sessions: ({ counts }: { counts: Counts }, f: F) => counted(f, counts, 'session', 'sessions'),
  classes: ({ counts }: { counts: Counts }, f: F) => counted(f, counts, 'class', 'classes'),
  nothingNew: 'Nothing that is not here already.',
  cannot: 'cannot be taken in',
  can: 'can be taken in',
  waits: 'waits for an answer',
  line: ({ line, sentence }: { line: number; sentence: string }, f: F) =>
    `Line ${f.whole(line)}: ${sentence}`,
  others: ({ count }: { count: number }, f: F) => `And ${n(f, count, 'more problem', 'more problems')}.`,
  revive: ({ name }: { name: string }) => `“${name}” was removed here. Bring it back`,
  rolesTitle: 'What do these codes count as?',
  rolesText:
    'The table does not say it. A code that counts as neither is kept and left out of percent on-task.',
  on: 'on-task',
  off: 'off-task',
  neither: 'neither',
  rolesDone: 'Read the table again',
  intoStudy: 'The sessions of tables go to',
  thisStudy: 'the study that is open',
  newStudy: 'a study of their own',
  take: ({ count }: { count: number }, f: F) =>
    f.plural(count, { one: 'Take in the file', other: `Take in ${f.whole(count)} files` }),
  taking: 'Taking it in …',
  taken: 'Taken in.',
  leave: 'Leave them',
  visitIn: 'A visit file of another tablet',
  visitInText: 'The second observer takes over the schedule and records under their own name.',
  visitTake: 'Take a visit file',
  visitTaken: ({ klass }: { klass: string }) => `The visit of ${klass} is prepared on this tablet.`,
  visitGo: 'Go on to the checks',
  kept: 'What is kept where',
  keptHere:
    'Classes, children’s pseudonyms, protocols and every journal are kept in this browser on this tablet. Nothing is sent anywhere.',
  keptClear: 'Clearing the browser’s data for this address removes them. Hand over first.',
  keptNames: 'Names are not kept, unless a team writes them into its key list.',
  roomFree: ({ free }: { free: number }, f: F) => `Free on the disk: ${f.fixed(free / 1e9, 1)} GB.`,
  roomKept: 'The browser has promised to keep the data.',
  roomNotKept: 'The browser may clear the data when the disk is full. Installing the program helps.',
} as const;
