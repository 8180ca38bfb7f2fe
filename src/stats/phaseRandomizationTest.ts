import type { About } from './about.ts';
import { type PhaseScores, present } from './phaseScores.ts';
import { requireThat } from './requireThat.ts';

export interface PhaseRandomizationOptions {
  /** Least number of sessions before and after the change among which its place was drawn. */
  readonly minBefore: number;
  readonly minAfter: number;
  readonly alternative: 'increase' | 'decrease' | 'two-sided';
}

export interface PhaseRandomization {
  /** Mean after − mean before, at the start that was drawn. */
  readonly statistic: number;
  readonly p: number;
  /** How many starts could have been drawn; 1 over it is the smallest possible p. */
  readonly arrangements: number;
}

/**
 * Exact test of a change between two phases whose start was drawn at random beforehand among the admissible ones
 * (minBefore … n − minAfter): the share of starts with a difference of means at least as large. `start` is the
 * number of points before, the index of the first point after. A `null` keeps its place and leaves the means.
 * `two-sided` compares sizes. Equal differences are told with a tolerance of 1e-9 of the largest score.
 *
 * Valid only if the start was really drawn. Undefined (NaN): statistic and p where a phase has no score; starts that
 * would leave a phase without any score are not counted. A start that is not admissible throws. Linear in the series.
 *
 * Source: Edgington 1975, J Psychol 90:57-68.
 *
 * @example phaseRandomizationTest([50, 50, 50, 50, 70, 70, 70, 70], 4, { minBefore: 3, minAfter: 3, alternative: 'increase' }).p // → 0.3333
 */
export function phaseRandomizationTest(
  series: PhaseScores,
  start: number,
  { minBefore, minAfter, alternative }: PhaseRandomizationOptions,
): PhaseRandomization {
  const n = series.length;
  const scores = present(series, 'series');
  requireThat(Number.isInteger(minBefore) && minBefore >= 1, 'minBefore', 'must be a whole number above 0');
  requireThat(Number.isInteger(minAfter) && minAfter >= 1, 'minAfter', 'must be a whole number above 0');
  requireThat(
    Number.isInteger(start) && start >= minBefore && start <= n - minAfter,
    'start',
    'must be one of the admissible starts',
  );
  requireThat(
    alternative === 'increase' || alternative === 'decrease' || alternative === 'two-sided',
    'alternative',
    'must be "increase", "decrease" or "two-sided"',
  );
  const side = alternative === 'decrease' ? -1 : 1;
  const size = (difference: number): number =>
    alternative === 'two-sided' ? Math.abs(difference) : side * difference;
  const differences = meanDifferences(series);
  const statistic = differences[start] as number;
  const tolerance = 1e-9 * scores.reduce((largest, score) => Math.max(largest, Math.abs(score)), 0);
  let arrangements = 0;
  let asExtreme = 0;
  for (let s = minBefore; s <= n - minAfter; s++) {
    const difference = differences[s] as number;
    if (Number.isNaN(difference)) continue;
    arrangements++;
    if (size(difference) >= size(statistic) - tolerance) asExtreme++;
  }
  return { statistic, p: Number.isNaN(statistic) ? Number.NaN : asExtreme / arrangements, arrangements };
}

/** For every start: mean from it on less mean before it. */
function meanDifferences(series: PhaseScores): number[] {
  let after = 0;
  let countAfter = 0;
  for (let i = 0; i < series.length; i++) {
    const score = series[i];
    if (score === null || score === undefined) continue;
    after += score;
    countAfter++;
  }
  let before = 0;
  let countBefore = 0;
  const differences: number[] = [];
  for (let i = 0; i <= series.length; i++) {
    // Rounding may leave a speck of a sum behind, which over 0 scores would be infinite.
    differences.push(countAfter && countBefore ? after / countAfter - before / countBefore : Number.NaN);
    const score = series[i];
    if (score === null || score === undefined) continue;
    before += score;
    countBefore++;
    after -= score;
    countAfter--;
  }
  return differences;
}

export const about: About = {
  name: 'phaseRandomizationTest',
  sentence: 'How many of the starts that might have been drawn would show a change at least this large.',
  formula: 'p = #{starts with T ≥ T observed} / #{admissible starts}, T = mean after − mean before',
  source: 'Edgington 1975, J Psychol 90:57-68',
  check: {
    input:
      "phaseRandomizationTest([62, 70, 66, 64, 68, 74, 78, 70, 80, 76], 5, { minBefore: 3, minAfter: 3, alternative: 'increase' }).p",
    expected: 0.2,
    source: 'by hand: the largest of five differences',
    tolerance: 1e-12,
  },
  recompute: () =>
    phaseRandomizationTest([62, 70, 66, 64, 68, 74, 78, 70, 80, 76], 5, {
      minBefore: 3,
      minAfter: 3,
      alternative: 'increase',
    }).p,
};
