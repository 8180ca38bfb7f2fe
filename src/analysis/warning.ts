import type { Problem } from '../kernel/result.ts';
import type { Method } from '../model/protocol.ts';
import type { SessionRecord } from './sessionRecord.ts';

/** What should be said beside a figure; it never blocks. Sentences: `words/en/why.ts`. */
export type WarningCode =
  | 'fewLooksForChild'
  | 'manyMissing'
  | 'underFortyPercent'
  | 'allOnTask'
  | 'longMomentary'
  | 'longInterval'
  | 'partialOverestimates'
  | 'wholeUnderestimates'
  | 'neverEnded'
  | 'fewPairedIntervals'
  | 'nearlyAlwaysOnTask'
  | 'nearlyNeverOnTask'
  | 'underCriterion'
  | 'oftenOutOfStep';

export type Warning = Problem<WarningCode>;

export function warning(code: WarningCode, values: Warning['values'] = {}): Warning {
  return { code, values };
}

/** Limits of the warnings: defaults of the program (common practice, no source, but for interval lengths: Zakszeski et al. 2017). */
export const limits = {
  looksOfChild: 10,
  missingPercent: 15,
  classLow: 40,
  momentarySeconds: 30,
  observedSeconds: 10,
  pairedIntervals: 50,
  prevalentPercent: 85,
  /** From 1 s on two perfect observers of a lively class cannot reach a kappa over .88 (see `inStep`). */
  outOfStepSeconds: 1,
  doubleCodedPercent: 20,
} as const;

/** Warnings about how a session was recorded, whatever came out. */
export function methodWarnings({ method, facts }: SessionRecord): Warning[] {
  const seconds = (facts.intervalMs ?? 0) / 1000;
  const observed = (facts.observeMs ?? facts.intervalMs ?? 0) / 1000;
  const warnings: Warning[] = [];
  if (method === 'momentary' && seconds > limits.momentarySeconds)
    warnings.push(warning('longMomentary', { seconds }));
  if (method !== 'partial' && method !== 'whole') return warnings;
  warnings.push(warning(method === 'partial' ? 'partialOverestimates' : 'wholeUnderestimates'));
  if (observed > limits.observedSeconds) warnings.push(warning('longInterval', { seconds: observed }));
  return warnings;
}

/** Warnings about a share of looks (0–100) of a whole class. */
export function shareWarnings(share: {
  readonly scored: number | null;
  readonly missing: number | null;
  readonly percentOnTask: number | null;
  readonly method: Method;
}): Warning[] {
  const { scored, missing, percentOnTask, method } = share;
  const warnings: Warning[] = [];
  if (scored !== null && missing !== null && scored + missing > 0) {
    const percent = (100 * missing) / (scored + missing);
    if (percent > limits.missingPercent) warnings.push(warning('manyMissing', { percent, missing }));
  }
  // What is plausible is known of classes; a duration record is of one child.
  if (method === 'duration') return warnings;
  if (percentOnTask !== null && percentOnTask < limits.classLow) {
    warnings.push(warning('underFortyPercent', { percent: percentOnTask }));
  }
  if (percentOnTask === 100) warnings.push(warning('allOnTask'));
  return warnings;
}
