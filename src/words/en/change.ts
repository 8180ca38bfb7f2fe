import type { Format } from '../format.ts';
import { upperFirst, type Way, waysText } from './ways.ts';

type F = Format;

const size = (f: F, points: number): string =>
  `${f.whole(Math.abs(points))} ${f.plural(Math.round(Math.abs(points)), { one: 'point', other: 'points' })}`;
const direction = (points: number): string => (points < 0 ? 'less' : 'more');

/** Minutes and half minutes in words, for a stretch of so many minutes. */
const inMinutes = (f: F, points: number, of: number): string => {
  const minutes = (Math.abs(points) / 100) * of;
  const halves = Math.round(minutes * 2);
  if (halves === 0) return `less than half a minute in ${f.whole(of)}`;
  const whole = Math.floor(halves / 2);
  const half = halves % 2 === 1;
  if (whole === 0) return `about half a minute in ${f.whole(of)}`;
  if (whole === 1) return `about a minute${half ? ' and a half' : ''} in ${f.whole(of)}`;
  return `about ${f.whole(whole)}${half ? ' and a half' : ''} minutes in ${f.whole(of)}`;
};

/** Under half a point is no change that a whole number can say. */
const level = (points: number): boolean => Math.abs(points) < 0.5;

/** The words “before” and “after” stand by themselves; any other phase is named. */
const inPhase = (phase: string): string =>
  ['before', 'after'].includes(phase.toLowerCase()) ? phase.toLowerCase() : `in “${phase}”`;

/** Change from one phase to another. */
export const change = {
  about: ({ klass, before, after }: { klass: string | null; before: string; after: string }) =>
    `${klass ?? 'All classes'} · ${before} → ${after}`,
  allClasses: 'all classes',
  withoutName: 'class without a name',
  describesOnly: (
    {
      class: klass,
      change: points,
      of,
      before,
      after,
    }: { class: string; change: number; of: number; before: string; after: string },
    f: F,
  ) =>
    level(points)
      ? `${klass} was on-task as much ${inPhase(after)} as ${inPhase(before)}.`
      : `${klass} was on-task ${size(f, points)} ${direction(points)} ${inPhase(after)} than ${inPhase(before)}: ${inMinutes(f, points, of)}.`,
  classesTogether: (
    { points, of, before, after }: { points: number; of: number; before: string; after: string },
    f: F,
  ) =>
    level(points)
      ? `The classes were on-task as much ${inPhase(after)} as ${inPhase(before)}.`
      : `The classes were on-task ${size(f, points)} ${direction(points)} ${inPhase(after)} than ${inPhase(before)}: ${inMinutes(f, points, of)}.`,
  classesDescribe: (
    { classes, up, before, after }: { classes: number; up: number; before: string; after: string },
    f: F,
  ) =>
    `${f.whole(up)} of ${f.whole(classes)} ${f.plural(classes, { one: 'class', other: 'classes' })} ${f.plural(up, { one: 'was', other: 'were' })} on-task more ${inPhase(after)} than ${inPhase(before)}.`,
  classesCompared: (
    { condition, control, difference }: { condition: string; control: string; difference: number },
    f: F,
  ) =>
    level(difference)
      ? `Classes with “${condition}” changed as much as classes with “${control}”.`
      : `On-task changed ${size(f, difference)} ${difference < 0 ? 'less' : 'more'} in the classes with “${condition}” than in those with “${control}”.`,
  classAndBreakInseparable: (
    { condition, control, difference }: { condition: string; control: string; difference: number },
    f: F,
  ) =>
    level(difference)
      ? `On-task changed as much with “${condition}” as with “${control}”.`
      : `On-task changed ${size(f, difference)} ${difference < 0 ? 'less' : 'more'} with “${condition}” than with “${control}”.`,
  changeUndefined: 'There is no change to tell yet.',
  undefinedText: 'A change needs children who were scored in both phases.',
  noteRange: ({ lower, upper }: { lower: number; upper: number }, f: F) =>
    `Likely between ${signed(f, lower)} and ${signed(f, upper)} points.`,
  noteNoRange: 'How sure this is cannot be told from so few.',
  noteRangeTooWide:
    'How sure this is cannot be told from so few: the range would go beyond any change that there can be.',
  noteOneClass:
    'This describes one class on these days; without a comparison, the clock, the task or the break may have done it.',
  noteClasses: 'There is no comparison, so the clock, the task or the break may have done it.',
  noteCompared: 'Unless chance decided which classes had which, they may differ in other ways too.',
  noteInseparable:
    'With a single class in a condition, the class and what it was given cannot be told apart; children of one class are not independent.',
  notRandom: ({ reason }: { reason: string }) => `No comparison of conditions: ${reason}.`,
  choices: 'What is compared',
  before: 'Before',
  after: 'After',
  control: 'Comparison',
  controlNone: 'as the study says',
  asRecorded: 'as recorded',
  klass: 'Class',
  phasesToChoose: 'Choose which phase comes before and which after.',
  tooFewPhases: 'Change needs two phases, and the visits have only one so far.',
  noVisits: 'No visit has been recorded yet.',
  eachChild: ({ klass }: { klass: string }) => `${klass}, each child`,
  linesLabel: ({ klass, before, after }: { klass: string; before: string; after: string }) =>
    `${klass}: percent on-task of each child, ${before} and ${after}, with the class mean`,
  percent: ({ percent }: { percent: number }, f: F) => f.percent(percent),
  mean: 'class',
  noLines: 'No child was scored in both phases.',
  leftOut: ({ n }: { n: number }, f: F) =>
    n === 0
      ? ''
      : `${f.whole(n)} ${f.plural(n, { one: 'child was', other: 'children were' })} scored in one phase only and ${f.plural(n, { one: 'is', other: 'are' })} left out.`,
  forest: 'Each class, change in points',
  forestLabel: 'Change of each class in points with its interval, and of the classes together',
  axis: 'change in points',
  tick: ({ points }: { points: number }, f: F) => signed(f, points),
  forestFigures: (
    { change: points, lower, upper }: { change: number; lower: number | null; upper: number | null },
    f: F,
  ) =>
    lower === null || upper === null
      ? f.points(points)
      : `${f.points(points)} (${f.points(lower)} to ${f.points(upper)})`,
  together: ({ classes }: { classes: number }, f: F) =>
    classes === 2 ? 'both together' : `all ${f.whole(classes)} together`,
  pooledHow: 'Random effects (REML, Knapp–Hartung).',
  prediction: (
    { lower, upper, condition }: { lower: number; upper: number; condition: string | null },
    f: F,
  ) =>
    `${condition === null ? 'The next class' : `The next class with “${condition}”`} would lie between ${signed(f, lower)} and ${signed(f, upper)}.`,
  predictionUnknown: 'Where the next class would lie cannot be told from so few.',
  tableTitle: 'The figures',
  tableCaption: 'Means of the children and change, class by class',
  condition: 'condition',
  children: 'children',
  meanBefore: ({ phase }: { phase: string }) => `mean ${phase}`,
  meanAfter: ({ phase }: { phase: string }) => `mean ${phase}`,
  changeColumn: 'change',
  between: 'between',
  betweenFigures: ({ lower, upper }: { lower: number; upper: number }, f: F) =>
    `${f.points(lower)} and ${f.points(upper)}`,
  g: 'standardized (g)',
  gVariance: 'variance of g',
  sd: 'SD of changes',
  standardError: 'standard error',
  t: 't',
  df: 'df',
  p: 'p',
  notDefined: 'not defined',
  because: ({ klass, figure, reason }: { klass: string; figure: string; reason: string }) =>
    `${klass}, ${figure}: ${reason}.`,
  child: 'child',
  looks: ({ phase }: { phase: string }) => `looks ${phase}`,
  linesCaption: 'Percent on-task of each child',
  analystCaption: 'Errors and paired t of each class',
  analyst: 'For the analyst',
  analystHint: 'Errors, tests and variances.',
  pooledCaption: 'The classes of one condition together',
  tau2: 'tau²',
  i2: 'I²',
  classes: 'classes',
  comparisonTitle: 'The conditions compared',
  comparison: (
    {
      condition,
      control,
      difference,
      lower,
      upper,
      unit,
    }: {
      condition: string;
      control: string;
      difference: number;
      lower: number | null;
      upper: number | null;
      unit: 'class' | 'child';
    },
    f: F,
  ) =>
    `Change with “${condition}” minus change with “${control}”: ${f.points(difference)} points${
      lower === null || upper === null ? '' : `, between ${f.points(lower)} and ${f.points(upper)}`
    }. ${unit === 'class' ? 'The classes are the units (Welch 1947).' : 'The children are the units here, as if they were independent (Welch 1947).'}`,
  comparisonAnalyst: (
    {
      df,
      p,
      standardError,
      g,
      gVariance,
    }: {
      df: number | null;
      p: number | null;
      standardError: number | null;
      g: number | null;
      gVariance: number | null;
    },
    f: F,
  ) =>
    [
      standardError === null ? '' : `Standard error ${f.fixed(standardError, 2)}`,
      df === null ? '' : `df ${f.fixed(df, 1)}`,
      p === null ? '' : `p ${f.p(p)}`,
      g === null ? '' : `pretest–posttest–control effect ${f.fixed(g, 2)} (Morris 2008)`,
      gVariance === null ? '' : `variance ${f.fixed(gVariance, 3)}`,
    ]
      .filter((s) => s !== '')
      .join('; '),
  how: ({ before, after, ways }: { before: string; after: string; ways: readonly Way[] }, f: F) =>
    ways.length > 0 && ways.every(({ method }) => method === 'headcount')
      ? `${upperFirst(waysText(ways), f)}. A headcount knows no children: the figures are shares of all that were counted in “${before}” and in “${after}”; one record a visit, the primary observer’s.`
      : `${ways.length === 0 ? '' : `${upperFirst(waysText(ways), f)}. `}The unit is the child’s percentage: its sessions of “${before}” joined, and those of “${after}”; one record a visit, the primary observer’s. Paired t interval on the children’s changes; g is the mean change in standard deviations before, small-sample corrected (Becker 1988).`,
  caution: 'The figures describe lessons and groups. They say nothing about any one child.',
} as const;

function signed(f: F, points: number): string {
  const whole = f.whole(Math.round(points) === 0 ? 0 : points);
  return Math.round(points) > 0 ? `+${whole}` : whole;
}
