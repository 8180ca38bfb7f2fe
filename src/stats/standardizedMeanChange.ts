import type { About } from './about.ts';
import { hedgesCorrection } from './hedgesCorrection.ts';
import { correlation, largestAbsolute, mean, sampleVariance } from './moments.ts';
import { differencesOf } from './pairedChange.ts';
import { requireThat } from './requireThat.ts';

export interface Effect {
  readonly estimate: number;
  readonly variance: number;
}

export type ChangeKind = 'raw-score' | 'change-score';

/**
 * The mean change of paired scores in standard deviations, corrected by the exact J with n − 1 degrees of freedom.
 *
 * - `"raw-score"` (SMCR): in standard deviations of the scores before; variance 2(1 − r)/n + g²/(2n), r the
 *   correlation of before and after.
 * - `"change-score"` (SMCC): in standard deviations of the changes; variance 1/n + g²/(2n). The two kinds are not comparable.
 *
 * Undefined (NaN): fewer than three pairs; no spread in what it divides by; the variance of the first kind when the
 * scores after are all the same. Relative error 1e-10.
 *
 * Sources: Becker 1988, Br J Math Stat Psychol 41:257-278; Morris 2008, Organ Res Methods 11:364-386; Gibbons,
 * Hedeker & Davis 1993, J Educ Stat 18:271-279.
 *
 * @example standardizedMeanChange([40, 50, 60, 70, 30], [40, 55, 60, 80, 45], 'raw-score').estimate // → 0.3028
 */
export function standardizedMeanChange(
  before: ArrayLike<number>,
  after: ArrayLike<number>,
  kind: ChangeKind,
): Effect {
  requireThat(
    kind === 'raw-score' || kind === 'change-score',
    'kind',
    'must be "raw-score" or "change-score"',
  );
  const differences = differencesOf(before, after);
  const n = differences.length;
  const spread =
    kind === 'raw-score'
      ? sampleVariance(before)
      : sampleVariance(differences, largestAbsolute(before, after));
  if (n < 3 || spread === 0) return { estimate: Number.NaN, variance: Number.NaN };
  const estimate = (hedgesCorrection(n - 1) * mean(differences)) / Math.sqrt(spread);
  const ofNoChange = kind === 'raw-score' ? 2 * (1 - correlation(before, after)) : 1;
  return { estimate, variance: (ofNoChange + estimate ** 2 / 2) / n };
}

export const about: About = {
  name: 'standardizedMeanChange',
  sentence:
    'The average change in standard deviations, so that studies with different scales can be compared.',
  formula: 'J(n − 1) · d̄ / s, s = SD before (raw-score) or SD of the changes (change-score)',
  source:
    'Becker 1988, Br J Math Stat Psychol 41:257-278; Gibbons, Hedeker & Davis 1993, J Educ Stat 18:271-279',
  check: {
    input: "standardizedMeanChange([40, 50, 60, 70, 30], [40, 55, 60, 80, 45], 'raw-score').estimate",
    expected: Math.sqrt(2 / Math.PI) * (6 / Math.sqrt(250)),
    source: 'by hand: J(4) = √(2/π), mean change 6, SD before √250',
    tolerance: 1e-12,
  },
  recompute: () => standardizedMeanChange([40, 50, 60, 70, 30], [40, 55, 60, 80, 45], 'raw-score').estimate,
};
