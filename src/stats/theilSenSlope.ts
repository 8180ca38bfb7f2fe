import type { About } from './about.ts';
import { type PhaseScores, present } from './phaseScores.ts';

/**
 * Robust slope of a series, per step of time: the median of the slopes between all pairs of scores. A `null` keeps
 * its place in time. Time and memory grow with the square of the number of scores.
 *
 * Undefined (NaN): fewer than two scores.
 *
 * Sources: Theil 1950, Proc K Ned Akad Wet 53:386-392; Sen 1968, J Am Stat Assoc 63:1379-1389.
 *
 * @example theilSenSlope([20, 20, 26, 25, 22, 23]) // → 0.6
 */
export function theilSenSlope(series: PhaseScores): number {
  present(series, 'series');
  const times: number[] = [];
  const scores: number[] = [];
  for (let t = 0; t < series.length; t++) {
    const score = series[t];
    if (score === null || score === undefined) continue;
    times.push(t);
    scores.push(score);
  }
  const n = scores.length;
  if (n < 2) return Number.NaN;
  const slopes = new Float64Array((n * (n - 1)) / 2);
  let filled = 0;
  for (let j = 1; j < n; j++) {
    for (let i = 0; i < j; i++) {
      slopes[filled++] =
        ((scores[j] as number) - (scores[i] as number)) / ((times[j] as number) - (times[i] as number));
    }
  }
  slopes.sort();
  const middle = (slopes.length - 1) / 2;
  return ((slopes[Math.floor(middle)] as number) + (slopes[Math.ceil(middle)] as number)) / 2;
}

export const about: About = {
  name: 'theilSenSlope',
  sentence: 'How much a series rises or falls from one session to the next, undisturbed by odd sessions.',
  formula: 'median of (y_j − y_i)/(j − i) over all pairs i < j',
  source: 'Theil 1950, Proc K Ned Akad Wet 53:386-392; Sen 1968, J Am Stat Assoc 63:1379-1389',
  check: {
    input: 'theilSenSlope([1, 2, 4])',
    expected: 1.5,
    source: 'by hand: the median of 1, 1.5 and 2',
    tolerance: 1e-12,
  },
  recompute: () => theilSenSlope([1, 2, 4]),
};
