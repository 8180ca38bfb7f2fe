import type { Format } from '../format.ts';
import { type Way, waysText } from './ways.ts';

/** What the command line says. */
export const batch = {
  help: `Lookbell, the figures without a screen.

  npm run --silent batch -- COMMAND FILE… [options]

Commands
  ontask       percent on-task of every session and phase
  agreement    agreement of every two observers of a visit
  change       change of every class from one phase to another
  check        read and bring together only; say what is there

FILE is a study file, an interval table (.csv), or a folder; of a folder its
.csv, .json and .gz files are read, not those in folders within it.

Options
  --json                 one JSON document instead of tables
  --practice             take practice sessions too
  --with-familiarisation take familiarisation visits too
  --on LABEL,LABEL       labels of a table that count as on-task
  --off LABEL,LABEL      labels of a table that count as off-task
  --before PHASE         (change) the phase to start from
  --after PHASE          (change) the phase to compare it with
  --control CONDITION    (change) the condition that the other is compared with
  --observer NAME        (change) whose record counts where several observed
  --help                 this text

Problems are told on standard error as FILE:LINE: sentence. A file with a
problem contributes nothing; the others are reported.
Exit status: 0 done, 1 a file has problems, 2 wrong usage.
`,
  noCommand: 'Say what to do: ontask, agreement, change or check (--help tells more).',
  unknownCommand: ({ command }: { command: string }) =>
    `There is no command "${command}"; expected ontask, agreement, change or check.`,
  notYet: 'The command package is not there yet.',
  noFiles: 'Name at least one file or folder to read.',
  unknownOption: ({ option }: { option: string }) => `There is no option ${option} (--help lists them).`,
  optionNeedsValue: ({ option }: { option: string }) => `${option} needs a value after it.`,
  optionTakesNone: ({ option }: { option: string }) => `${option} takes no value.`,
  optionTwice: ({ option }: { option: string }) => `${option} was given twice.`,
  optionElsewhere: ({ option, command }: { option: string; command: string }) =>
    `${option} belongs to the command change, not to ${command}.`,
  labelTwice: ({ label }: { label: string }) =>
    `The label "${label}" is in --on and in --off; expected in one of them.`,
  phaseNotFound: ({ phase, phases }: { phase: string; phases: string }) =>
    `There is no phase "${phase}" in the files; there are: ${phases === '' ? 'none' : phases}.`,
  phasesToChoose: ({ phases }: { phases: string }) =>
    `Choose two different phases with --before and --after; the files have: ${phases}.`,
  tooFewPhases: ({ phases }: { phases: string }) =>
    `change needs two phases, found ${phases === '' ? 'none' : `only ${phases}`}`,
  controlNotFound: ({ control, conditions }: { control: string; conditions: string }) =>
    `There is no condition "${control}" in the files; there are: ${conditions === '' ? 'none' : conditions}.`,
  observerNotFound: ({ observer, observers }: { observer: string; observers: string }) =>
    `There is no observer "${observer}" in the files; there are: ${observers}.`,
  noSuchFile: 'there is no such file or folder; expected a study file, an interval table or a folder of them',
  unreadable: 'could not be read; expected a file that may be opened',
  contradicted: ({ session, files }: { session: string; files: string }) =>
    `session ${session} stands with different contents in ${files}, and is left out; expected the same contents, or another name of the session`,
  emptyFolder: 'the folder holds no .csv, .json or .gz file',
  visitFile: 'is a visit file, which holds nobody’s marks; nothing to report from it',
  wentWrong: ({ what }: { what: string }) =>
    `lookbell: something in the program itself went wrong (${what}). Please tell those who make it.`,
  atLine: ({ file, line, sentence }: { file: string; line: number; sentence: string }) =>
    `${file}:${String(line)}: ${sentence}`,
  atPath: ({ file, path, sentence }: { file: string; path: string; sentence: string }) =>
    `${file}: ${path}: ${sentence}`,
  atFile: ({ file, sentence }: { file: string; sentence: string }) => `${file}: ${sentence}`,
  general: ({ sentence }: { sentence: string }) => `lookbell: ${sentence}`,

  undefinedMark: '–',
  class: 'class',
  condition: 'condition',
  phase: 'phase',
  visit: 'visit',
  observer: 'observer',
  observers: 'observers',
  session: 'session',
  method: 'method',
  methodCell: ({ method, lookAt }: { method: string; lookAt: 'end' | 'start' | null }) =>
    lookAt === null ? method : `${method}, look at ${lookAt}`,
  recordedBy: ({ ways }: { ways: readonly Way[] }) => `Recorded by ${waysText(ways)}.`,
  child: 'child',
  scored: 'scored',
  missing: 'missing',
  onTask: 'on-task',
  percentOnTask: 'on-task %',
  someOnTask:
    'Partial and whole interval: on-task % is the share of intervals with some on-task code, not of time.',
  limits: '95 %',
  children: 'children',
  classPercent: 'mean of children',
  compared: 'compared',
  excluded: 'excluded',
  agreement: 'agreement %',
  chance: 'chance %',
  kappa: 'kappa',
  ac1: 'AC1',
  occurrence: 'occurrence %',
  nonOccurrence: 'non-occ. %',
  before: 'before',
  after: 'after',
  change: 'change',
  p: 'p',
  g: 'g',
  tau2: 'tau²',
  i2: 'I² %',
  classes: 'classes',
  file: 'file',
  form: 'form',
  sessions: 'sessions',
  visits: 'visits',
  forms: 'study file',
  ofPhases: ({ before, after }: { before: string; after: string }) => `From ${before} to ${after}`,
  sessionsTitle: 'Sessions',
  childrenTitle: 'Children (limits treat looks as independent, so they are too narrow for one child)',
  pairsTitle: 'Pairs of observers',
  codesTitle: 'Code by code',
  code: 'code',
  overallTitle: 'Over all pairs',
  pooledTitle: 'Classes of a condition together (random effects, REML, Knapp–Hartung)',
  comparisonTitle: 'Difference in changes',
  filesTitle: 'Files',
  nothingToReport: 'Nothing to report.',
  noPairs: 'No visit has two observers.',
  overall: (
    v: {
      pairs: number;
      compared: number;
      doubleCoded: number;
      visits: number;
      agreement: string;
      kappa: string;
      alpha: string;
      share: string;
    },
    f: Pick<Format, 'whole' | 'plural'>,
  ) =>
    `${f.whole(v.pairs)} ${f.plural(v.pairs, { one: 'pair', other: 'pairs' })}, ${f.whole(v.compared)} intervals compared: agreement ${v.agreement} %, pooled kappa ${v.kappa}, alpha ${v.alpha}.
${f.whole(v.doubleCoded)} of ${f.whole(v.visits)} visits double-coded (${v.share} %).`,
  comparison: (v: {
    condition: string;
    control: string;
    unit: 'class' | 'child';
    difference: string;
    lower: string;
    upper: string;
    p: string;
    g: string;
  }) =>
    `${v.condition} minus ${v.control}: ${v.difference} points (95 % ${v.lower} to ${v.upper}, p ${v.p}, g ${v.g}); unit: ${v.unit === 'class' ? 'the class' : 'the child, treated as independent of the class'}.`,
  noComparison: ({ reason }: { reason: string }) => `No comparison: ${reason}.`,
  caution:
    'One class before and after, without a comparison, describes; it does not show what caused the change.',
  found: (
    v: {
      sessions: number;
      visits: number;
      classes: string;
      observers: string;
      phases: string;
      conditions: string;
    },
    f: Pick<Format, 'whole' | 'plural'>,
  ) =>
    `${f.whole(v.sessions)} ${f.plural(v.sessions, { one: 'session', other: 'sessions' })} in ${f.whole(v.visits)} ${f.plural(v.visits, { one: 'visit', other: 'visits' })}.
Classes: ${v.classes}. Observers: ${v.observers}. Phases: ${v.phases}. Conditions: ${v.conditions}.`,
  refused: 'refused',
} as const;
