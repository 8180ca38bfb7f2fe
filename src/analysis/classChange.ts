import { pairedChange, standardizedMeanChange } from '../stats/index.ts';
import { type ClassData, pairedScores } from './childChanges.ts';
import type { PhasePair } from './choosePhases.ts';
import { percentOf } from './tally.ts';
import { type Settled, settle, type Why, type WhyCode } from './why.ts';

type Field =
  | 'meanBefore'
  | 'meanAfter'
  | 'change'
  | 'sdChange'
  | 'standardError'
  | 't'
  | 'df'
  | 'p'
  | 'lower'
  | 'upper'
  | 'g'
  | 'gVariance';

/** The change of one class: points of 0–100, the children with both phases being the units. g in SDs before (SMCR). */
export interface ClassChange extends Settled<Record<Field, number>> {
  readonly class: string | null;
  readonly condition: string | null;
  readonly before: string;
  readonly after: string;
  readonly children: number;
  readonly why: Why<Field>;
}

/**
 * A headcount knows no children: its means are the shares of all child looks, and all that needs a spread is null.
 */
export function classChange(data: ClassData, phases: Pick<PhasePair, 'before' | 'after'>): ClassChange {
  const scores = pairedScores(data.lines);
  const children = scores.before.length;
  const paired = pairedChange(scores.before, scores.after);
  const effect = standardizedMeanChange(scores.before, scores.after, 'raw-score');
  const countsOnly = data.methods.every((method) => method === 'headcount');
  const means = countsOnly ? [percentOf(data.together.before), percentOf(data.together.after)] : null;
  const [meanBefore, meanAfter] = means ?? [paired.meanBefore, paired.meanAfter];
  const { figures, why } = settle(
    {
      meanBefore: meanBefore as number,
      meanAfter: meanAfter as number,
      change: means === null ? paired.change : (meanAfter as number) - (meanBefore as number),
      sdChange: paired.sdChange,
      standardError: paired.standardError,
      t: paired.t,
      df: paired.df,
      p: paired.p,
      lower: paired.lower,
      upper: paired.upper,
      g: effect.estimate,
      gVariance: effect.variance,
    } satisfies Record<Field, number>,
    (field): WhyCode => {
      if (countsOnly) {
        const isMean = field === 'meanBefore' || field === 'meanAfter' || field === 'change';
        return isMean ? 'nothingScored' : 'headcountHasNoChildren';
      }
      if (children === 0) return 'noChildInBoth';
      if (children === 1) return 'oneChild';
      if (field === 't' || field === 'p') return 'sameChange';
      if (children < 3) return 'underThreeChildren';
      return field === 'gVariance' && Number.isFinite(effect.estimate) ? 'noSpreadAfter' : 'noSpreadBefore';
    },
  );
  return {
    class: data.className,
    condition: data.condition,
    before: phases.before,
    after: phases.after,
    children,
    ...figures,
    why,
  };
}
