import { type Problem, problem, type Result } from '../kernel/result.ts';
import { type ClassData, classData } from './childChanges.ts';
import { choosePhases, type PhaseProblem } from './choosePhases.ts';
import { type ClassChange, classChange } from './classChange.ts';
import { type Comparison, compareConditions } from './compareConditions.ts';
import { byText } from './order.ts';
import { type PooledChange, pooledChanges } from './pooledChange.ts';
import { primaryRecord } from './primaryRecord.ts';
import type { Analysed, Remark } from './remark.ts';
import type { Visit } from './visits.ts';
import type { Why } from './why.ts';

export interface ChangeReport {
  readonly classes: readonly ClassChange[];
  readonly pooled: readonly PooledChange[];
  readonly comparison: Comparison | null;
  readonly why: Why<'comparison'>;
}

export interface ChangeOptions {
  readonly before?: string | undefined;
  readonly after?: string | undefined;
  /** The condition that the other is compared with; asked for (must be in the data), … */
  readonly control?: string | undefined;
  /** … or the study's own, taken where it is in the data. */
  readonly studyControl?: string | null | undefined;
  /** Whose record counts at visits of several observers. */
  readonly observer?: string | undefined;
}

export type ChangeProblem = PhaseProblem | Problem<'controlNotFound' | 'observerNotFound'>;

/** The report with what it was made of, for screens. */
export interface ChangeAnalysis extends Analysed<ChangeReport> {
  readonly before: string;
  readonly after: string;
  readonly data: readonly ClassData[];
}

/** What `change` says when there is nothing to say it of. */
export const emptyChange: ChangeReport = {
  classes: [],
  pooled: [],
  comparison: null,
  why: { comparison: 'phasesUnknown' },
};

/**
 * The change of every class, pooled over classes, and compared between two conditions: the document of `change`
 * (points of 0–100). One record a visit counts: see `primaryRecord`.
 */
export function changeReport(
  visits: readonly Visit[],
  options: ChangeOptions = {},
): Result<ChangeAnalysis, ChangeProblem> {
  const all = visits.flatMap(({ records }) => records);
  const phases = choosePhases(all, options);
  if (!phases.ok) return phases;
  const { before, after } = phases.value;
  const conditions = [...new Set(all.flatMap(({ condition }) => condition ?? []))].sort(byText);
  const { control, studyControl = null, observer } = options;
  if (control !== undefined && !conditions.includes(control)) {
    return problem('controlNotFound', { control, conditions: conditions.join(', ') });
  }
  const observers = [...new Set(all.map((record) => record.observer))].sort(byText);
  if (observer !== undefined && !observers.includes(observer)) {
    return problem('observerNotFound', { observer, observers: observers.join(', ') });
  }
  const relevant = visits.filter(({ phase }) => phase === before || phase === after);
  const choices = relevant.map((visit) => primaryRecord(visit, observer ?? null));
  const data = classData(
    choices.flatMap(({ record }) => record ?? []),
    { before, after },
  );
  const classes = data.map((one) => classChange(one, { before, after }));
  const { pooled, notices } = pooledChanges(classes);
  const known = studyControl !== null && conditions.includes(studyControl) ? studyControl : null;
  const { comparison, why } = compareConditions(classes, data, control ?? known);
  return {
    ok: true,
    value: {
      before,
      after,
      data,
      report: { classes, pooled, comparison, why: why === null ? {} : { comparison: why } },
      problems: choices.flatMap((choice) => choice.problem ?? []),
      notices: [
        ...phases.value.notices,
        ...choices.flatMap((choice) => choice.notice ?? []),
        ...methodsJoined(data),
        ...notices,
      ],
    },
  };
}

function methodsJoined(data: readonly ClassData[]): Remark[] {
  return data
    .filter(({ methods }) => methods.length > 1)
    .map(({ className, methods, sessions }) => ({
      code: 'methodsJoined',
      values: { class: className ?? '', methods: methods.join(', ') },
      sessions,
    }));
}
