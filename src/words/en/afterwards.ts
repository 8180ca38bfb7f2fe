import type { Format } from '../format.ts';
import { upperFirst, wayText } from './ways.ts';

type F = Format;

const n = (f: F, count: number, one: string, other: string): string =>
  `${f.whole(count)} ${f.plural(count, { one, other })}`;

/** What one recorded unit is called, by method. */
type Method = 'momentary' | 'partial' | 'whole' | 'headcount' | 'duration';

interface PhaseFigure {
  readonly phase: string | null;
  readonly percent: number;
  readonly lower: number | null;
  readonly upper: number | null;
}

const range = (f: F, { lower, upper }: Pick<PhaseFigure, 'lower' | 'upper'>): string =>
  lower === null || upper === null ? '' : `, between ${f.whole(lower)} and ${f.percent(upper)}`;

const share = (method: Method): string => {
  switch (method) {
    case 'momentary':
      return 'On-task at';
    case 'partial':
      return 'Some on-task in';
    case 'whole':
      return 'On-task throughout in';
    case 'headcount':
      return 'On-task in the counts:';
    case 'duration':
      return 'On-task for';
  }
};

const unit = (method: Method): string => {
  switch (method) {
    case 'momentary':
      return 'of the looks';
    case 'partial':
    case 'whole':
      return 'of the intervals';
    case 'headcount':
      return 'of the children counted';
    case 'duration':
      return 'of the time';
  }
};

/** Afterwards: the visits, one session's completeness and figures, corrections. */
export const afterwards = {
  // the list of visits
  visitsTitle: ({ visits, latest }: { visits: number; latest: string | null }, f: F) =>
    `${n(f, visits, 'visit', 'visits')}${latest === null ? '' : `, the latest on ${f.day(latest)}`}.`,
  noVisitsTitle: 'No visit has been recorded yet.',
  noVisitsText:
    'What you record in the room appears here by itself. Records of other tablets come in as files.',
  noStudy: 'There is no study on this tablet yet.',
  toStudy: 'Go to The study',
  listAbout: ({ study }: { study: string }) => study,
  ways: 'What the visits say',
  agreement: 'Agreement of the observers',
  agreementHint: 'How often two people who looked at the same child said the same.',
  change: 'Change from before to after',
  changeHint: 'Each class by itself, all classes together, and against a comparison.',
  files: 'Files and hand-over',
  filesHint: 'Study file, interval table, what is kept where.',
  withoutDate: 'Without a date',
  role: ({ role }: { role: 'primary' | 'second' }) => (role === 'primary' ? 'primary' : 'second'),
  complete: 'complete',
  endedEarly: 'ended early',
  neverEnded: 'not ended',
  practice: 'practice',
  fromFile: 'from a file',
  scoredMissing: ({ scored, missing }: { scored: number; missing: number }, f: F) =>
    `${f.whole(scored)} scored, ${f.whole(missing)} missing`.replaceAll(' ', '\u00a0'),
  notHandedOver: 'not handed over',
  openAgreement: ({ records }: { records: number }) => (records === 2 ? 'Compare the two' : 'Compare them'),
  pairing: 'Wrong visit?',
  pairingTitle: ({ observer, klass }: { observer: string; klass: string }) =>
    `Which visit does this record of ${observer} in ${klass} belong to?`,
  pairingText:
    'Records of one class at one time make a visit, and only records of one visit are compared. Usually they find each other by themselves.',
  pairingSelf: 'The visit it found by itself',
  pairingWith: (
    { day, time, observers }: { day: string | null; time: string | null; observers: readonly string[] },
    f: F,
  ) =>
    `${day === null ? 'without a date' : f.day(day)}${time === null || f.time(time) === '' ? '' : `, ${f.time(time)}`}, with ${f.list(observers)}`,
  pairingNone: 'There is no other visit of this class.',
  pairingDone: ({ observer }: { observer: string }) =>
    `The record of ${observer} belongs to another visit now.`,
  undo: 'Take it back',
  moved: 'put here by hand',

  // one session
  toVisits: 'All visits',
  sessionAbout: (
    {
      klass,
      date,
      observer,
      phases,
    }: { klass: string; date: string | null; observer: string; phases: readonly string[] },
    f: F,
  ) =>
    [klass, date === null ? '' : f.day(date), f.list(phases), observer].filter((s) => s !== '').join(' · '),
  noSession: 'This record is not on this tablet.',
  completeTitle: ({ scored, planned, method }: { scored: number; planned: number; method: Method }, f: F) =>
    method === 'momentary'
      ? `${f.whole(scored)} of ${n(f, planned, 'look', 'looks')} ${f.plural(scored, { one: 'is', other: 'are' })} scored.`
      : `${f.whole(scored)} of ${n(f, planned, 'interval', 'intervals')} ${f.plural(scored, { one: 'is', other: 'are' })} scored.`,
  missingBy: ({ reasons }: { reasons: readonly { reason: string; n: number }[] }, f: F) =>
    reasons.length === 0
      ? 'Nothing is missing.'
      : `${f.whole(reasons.reduce((sum, r) => sum + r.n, 0))} missing: ${f.list(reasons.map((r) => `${r.reason} (${f.whole(r.n)})`))}.`,
  missingShare: ({ scored, planned, method }: { scored: number; planned: number; method: Method }, f: F) => {
    const missing = planned - scored;
    if (missing <= 0) return 'Nothing is missing.';
    const things = method === 'momentary' ? 'looks' : method === 'headcount' ? 'scans' : 'intervals';
    return `${f.percent((100 * missing) / planned)} of the ${things} are missing (${f.whole(missing)} of ${f.whole(planned)}).`;
  },
  lateMarks: ({ late }: { late: number }, f: F) =>
    late === 0
      ? 'No mark came late.'
      : `${n(f, late, 'mark', 'marks')} came within the grace after the next prompt and ${f.plural(late, { one: 'counts', other: 'count' })}.`,
  figuresWaitTitle: 'The figures wait',
  figuresWaitText:
    'Whoever knows the result of this lesson looks at the next one with other eyes, and somebody may be standing behind you.',
  showFigures: 'Show the figures',
  hideFigures: 'Cover the figures',
  scoredIn: ({ phase }: { phase: string | null }) => (phase === null ? 'scored' : `scored ${phase}`),
  missingIn: ({ phase }: { phase: string | null }) => (phase === null ? 'missing' : `missing ${phase}`),
  completeness: 'What was recorded, child by child',

  // figures
  onTaskTitle: ({ method, phases }: { method: Method; phases: readonly PhaseFigure[] }, f: F) => {
    const [only] = phases;
    if (only === undefined) return 'Nothing was scored.';
    if (phases.length === 1)
      return `${share(method)} ${f.percent(only.percent)} ${unit(method)}${range(f, only)}.`;
    const each = phases.map(
      (p, k) => `${f.percent(p.percent)}${k === 0 ? ` ${unit(method)}` : ''} ${p.phase ?? ''}${range(f, p)}`,
    );
    return `${share(method)} ${each.join('; ')}.`;
  },
  nothingTitle: 'There is no percent on-task to tell.',
  onTaskNote: ({ method }: { method: Method }) =>
    ({
      momentary:
        'Estimates the share of time on-task. Looks of one child follow one another, so the range is rather too narrow.',
      partial:
        'Counts intervals with some on-task in them: more than the share of time, for behaviour in bouts.',
      whole: 'Counts intervals on-task throughout: less than the share of time, for behaviour in bouts.',
      headcount: 'All counts together; one child is counted many times, so the range is rather too narrow.',
      duration: 'The share of the observed time.',
    })[method],
  roundSheet: 'Round sheet',
  sheetLabel: ({ klass, observers }: { klass: string; observers: readonly string[] }, f: F) =>
    `Round sheet of ${klass}, ${f.list(observers)}: one row a child, one column a look`,
  sheetTable: 'The same as a table',
  sheetCaption: 'Every look, child by child',
  phaseChild: 'child, phase',
  keyMissing: 'missing',
  keyLate: 'marked late',
  keyNone: 'none of the codes',
  cell: (
    {
      codes,
      missing,
      late,
      amended,
    }: { codes: readonly string[] | null; missing: string | null; late: boolean; amended: boolean },
    f: F,
  ) =>
    `${missing ?? (codes === null || codes.length === 0 ? 'none' : f.list(codes))}${late ? ', late' : ''}${amended ? ', corrected' : ''}`,
  cellOfTwo: ({ first, second }: { first: string; second: string }) =>
    first === second ? first : `${first} / ${second}`,
  wholeClass: 'all children',
  perChild: ({ phase }: { phase: string | null }) =>
    phase === null ? 'Child by child' : `Child by child, ${phase}`,
  perPart: ({ phase }: { phase: string | null }) =>
    phase === null ? 'Parts of the lesson' : `Parts of the lesson, ${phase}`,
  noPart: 'not said',
  lessonPart: 'part of the lesson',
  child: 'child',
  scored: 'scored',
  missing: 'missing',
  why: 'reasons',
  percentOnTask: 'on-task',
  between: 'likely between',
  betweenFigures: ({ lower, upper }: { lower: number; upper: number }, f: F) =>
    `${f.whole(lower)} and ${f.percent(upper)}`,
  worth: 'effective looks',
  classMean: ({ percent }: { percent: number }, f: F) =>
    `Mean of the children: ${f.percentFine(percent)} (all looks together weigh children with more looks more).`,
  reasonsShort: ({ reasons }: { reasons: readonly { reason: string; n: number }[] }, f: F) =>
    reasons.map((r) => `${r.reason} (${f.whole(r.n)})`).join(', '),
  makeUp: ({ phase }: { phase: string | null }) =>
    phase === null ? 'What off-task was made of' : `What off-task was made of, ${phase}`,
  makeUpShare: ({ code, count, of }: { code: string; count: number; of: number }, f: F) =>
    `${code}: ${f.whole(count)} of ${f.whole(of)}`,
  worthHint:
    'Effective looks: what the looks are worth as independent ones (Bayley and Hammersley 1946); blank where a child’s looks are too few or all the same.',
  makeUpNone: 'Nothing was scored off-task.',
  undefinedHere: 'not defined',
  how: (
    {
      method,
      seconds,
      observed,
      lookAt,
      codeSet,
      children,
    }: {
      method: Method;
      seconds: number | null;
      observed: number | null;
      lookAt: 'end' | 'start' | null;
      codeSet: string | null;
      children: number;
    },
    f: F,
  ) => {
    const name = upperFirst(wayText({ method, lookAt }), f);
    const every =
      seconds === null || method === 'duration'
        ? ''
        : `, every ${f.fixed(seconds, Number.isInteger(seconds) ? 0 : 1)} s`;
    const part =
      observed === null || seconds === null || observed === seconds || method === 'duration'
        ? ''
        : ` (${f.fixed(observed, Number.isInteger(observed) ? 0 : 1)} s observed)`;
    const whom = children === 0 ? '' : `, ${n(f, children, 'child', 'children')}`;
    return `${name}${every}${part}${whom}${codeSet === null ? '' : `; codes: ${codeSet}`}. Missing looks are left out, never counted as off-task.`;
  },
  caution: 'The figures describe a lesson and a group. They say nothing about any one child.',
  print: 'Print this page',

  // long work
  working: 'Working it out …',
  workingShare: ({ share: done }: { share: number }, f: F) => `Working it out, ${f.percent(100 * done)} …`,
  stop: 'Stop',
  stopped: 'Stopped.',
  again: 'Work it out again',
} as const;
