import type { About } from './about.ts';
import { dominance, type PhaseScores, present } from './phaseScores.ts';

/**
 * Tau-U with the trend of phase a taken out: (S_AB − S_A)/(n_a n_b), S_A = pairs within a that rise less those that
 * fall. With this denominator it is not bounded by 1, and it mixes level with trend: show it beside Tau and a slope.
 * Where less is better, turn the signs of both.
 *
 * Undefined (NaN): a phase without scores.
 *
 * Source: Parker, Vannest, Davis & Sauber 2011, Behav Ther 42:284-299.
 *
 * @example tauU([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]) // → 0.88
 */
export function tauU(a: PhaseScores, b: PhaseScores): number {
  const before = present(a, 'a');
  const after = present(b, 'b');
  if (after.length === 0) return Number.NaN;
  let trend = 0;
  before.forEach((later, j) => {
    for (let i = 0; i < j; i++) trend += Math.sign(later - (before[i] as number));
  });
  return (dominance(before, after) - trend) / (before.length * after.length);
}

export const about: About = {
  name: 'tauU',
  sentence: 'Like Tau, less the trend that was there before the change; it can exceed 1.',
  formula: '(S_AB − S_A) / (n_a n_b)',
  source: 'Parker, Vannest, Davis & Sauber 2011, Behav Ther 42:284-299',
  check: {
    input: 'tauU([62, 70, 66, 64, 68], [74, 78, 70, 80, 76])',
    expected: 0.88,
    source: 'by hand: S_AB 24, S_A 2, 25 pairs',
    tolerance: 1e-12,
  },
  recompute: () => tauU([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]),
};
