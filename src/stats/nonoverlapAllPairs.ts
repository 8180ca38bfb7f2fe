import type { About } from './about.ts';
import { dominance, type PhaseScores, present } from './phaseScores.ts';

/**
 * Nonoverlap of all pairs (NAP): the share of pairs, one score of phase a with one of phase b, in which b is higher;
 * ties count half. 0.5 = no difference, 1 = every b above every a. Where less is better, turn the signs of both.
 *
 * Undefined (NaN): a phase without scores. Exact but for one division. Blind to how far, and to trends.
 *
 * Source: Parker & Vannest 2009, Behav Ther 40:357-367.
 *
 * @example nonoverlapAllPairs([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]) // → 0.98
 */
export function nonoverlapAllPairs(a: PhaseScores, b: PhaseScores): number {
  const before = present(a, 'a');
  const after = present(b, 'b');
  const pairs = before.length * after.length;
  return (dominance(before, after) + pairs) / (2 * pairs);
}

export const about: About = {
  name: 'nonoverlapAllPairs',
  sentence: 'How often a session after the change is better than one before, over all pairs of sessions.',
  formula: 'NAP = (pairs with b > a + ½ ties) / (n_a n_b)',
  source: 'Parker & Vannest 2009, Behav Ther 40:357-367',
  check: {
    input: 'nonoverlapAllPairs([20, 20, 26, 25, 22, 23], [28, 25, 24, 27, 30, 30, 29])',
    expected: 0.9166667,
    source: 'vignette of the SingleCaseES package (Swan, Pustejovsky, Grekov): .9166667',
    tolerance: 1e-7,
  },
  recompute: () => nonoverlapAllPairs([20, 20, 26, 25, 22, 23], [28, 25, 24, 27, 30, 30, 29]),
};
