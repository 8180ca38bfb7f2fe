import type { About } from './about.ts';
import { dominance, type PhaseScores, present } from './phaseScores.ts';

/**
 * Tau of two phases: pairs in which b is higher less those in which it is lower, as a share of all pairs (−1…1);
 * 2 NAP − 1. Ties count 0. Where less is better, turn the signs of both.
 *
 * Undefined (NaN): a phase without scores.
 *
 * Source: Parker, Vannest, Davis & Sauber 2011, Behav Ther 42:284-299.
 *
 * @example tauAB([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]) // → 0.96
 */
export function tauAB(a: PhaseScores, b: PhaseScores): number {
  const before = present(a, 'a');
  const after = present(b, 'b');
  return dominance(before, after) / (before.length * after.length);
}

export const about: About = {
  name: 'tauAB',
  sentence:
    'How much more often sessions after the change are better than worse, over all pairs of sessions.',
  formula: 'τ = (pairs with b > a − pairs with b < a) / (n_a n_b)',
  source: 'Parker, Vannest, Davis & Sauber 2011, Behav Ther 42:284-299',
  check: {
    input: 'tauAB([62, 70, 66, 64, 68], [74, 78, 70, 80, 76])',
    expected: 0.96,
    source: 'by hand: 24 of 25 pairs higher, one tie',
    tolerance: 1e-12,
  },
  recompute: () => tauAB([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]),
};
