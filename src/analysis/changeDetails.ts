import type { Problem } from '../kernel/result.ts';
import type { ChangeAnalysis } from './changeReport.ts';
import type { ChildLine } from './childChanges.ts';
import type { ClassChange } from './classChange.ts';
import { type Prediction, predictions } from './predictions.ts';
import { type Way, waysOf } from './waysOf.ts';

/**
 * What the design allows to be said. `describesOnly`: one class, no comparison; `classesDescribe`: several classes, no
 * comparison; `classesCompared`: two or more classes in each condition; `classAndBreakInseparable`: a comparison in
 * which a condition has only one class; `changeUndefined`: no change to speak of.
 */
export type ChangeSentenceCode =
  | 'describesOnly'
  | 'classesDescribe'
  | 'classesCompared'
  | 'classAndBreakInseparable'
  | 'changeUndefined';

export type ChangeSentence = Problem<ChangeSentenceCode>;

/** One class for a picture: each child's line and the class's means. */
export interface ClassChangeDetails {
  readonly row: ClassChange;
  readonly lines: readonly ChildLine[];
  readonly sentence: ChangeSentence;
  /** The change in minutes on-task in a stretch of `stretchMinutes`. */
  readonly minutes: number | null;
}

export interface ChangeDetails {
  readonly before: string;
  readonly after: string;
  /** How all these records were made, each way once. */
  readonly ways: readonly Way[];
  readonly stretchMinutes: number;
  readonly classes: readonly ClassChangeDetails[];
  readonly report: ChangeAnalysis['report'];
  readonly predictions: readonly Prediction[];
  /** What may be said of all classes together. */
  readonly sentence: ChangeSentence;
  readonly problems: ChangeAnalysis['problems'];
  readonly notices: ChangeAnalysis['notices'];
}

/** Ten points are 1.5 minutes of fifteen. */
const stretchMinutes = 15;

/** A change analysis prepared for screens, with sentences that say no more than the design allows. */
export function changeDetails(analysis: ChangeAnalysis): ChangeDetails {
  const { before, after, data, report, problems, notices } = analysis;
  const classes = report.classes.map((row, i): ClassChangeDetails => {
    const lines = data[i]?.lines ?? [];
    return { row, lines, sentence: classSentence(row), minutes: minutesOf(row.change) };
  });
  return {
    before,
    after,
    ways: waysOf(data.flatMap(({ ways }) => ways.map((facts) => ({ facts })))),
    stretchMinutes,
    classes,
    report,
    predictions: predictions(report.classes),
    sentence: wholeSentence(analysis),
    problems,
    notices,
  };
}

const minutesOf = (points: number | null): number | null =>
  points === null ? null : (points / 100) * stretchMinutes;

/** Of one class alone nothing but a description can be said, whoever it is compared with elsewhere. */
function classSentence(row: ClassChange): ChangeSentence {
  const { change, meanBefore, meanAfter } = row;
  if (change === null || meanBefore === null || meanAfter === null)
    return { code: 'changeUndefined', values: {} };
  return {
    code: 'describesOnly',
    values: {
      class: row.class ?? '',
      before: meanBefore,
      after: meanAfter,
      change,
      children: row.children,
      minutes: minutesOf(change) ?? 0,
      of: stretchMinutes,
    },
  };
}

function wholeSentence({ report }: ChangeAnalysis): ChangeSentence {
  const { classes, comparison } = report;
  const defined = classes.filter((row) => row.change !== null);
  const first = defined[0];
  if (first === undefined) return { code: 'changeUndefined', values: {} };
  if (comparison !== null && comparison.difference !== null) {
    const { condition, control, difference, lower, upper } = comparison;
    const limitsKnown = lower !== null && upper !== null;
    return {
      code: comparison.unit === 'class' ? 'classesCompared' : 'classAndBreakInseparable',
      values: { condition, control, difference, ...(limitsKnown && { lower, upper }) },
    };
  }
  if (defined.length === 1) return classSentence(first);
  const up = defined.filter((row) => (row.change ?? 0) > 0).length;
  return { code: 'classesDescribe', values: { classes: defined.length, up } };
}
