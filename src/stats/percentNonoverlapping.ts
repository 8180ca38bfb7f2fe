import type { About } from './about.ts';
import { type PhaseScores, present } from './phaseScores.ts';

/**
 * Share (0–1) of the scores of phase b above the highest of phase a. It hangs on that one score of a. Where less is
 * better, turn the signs of both.
 *
 * Undefined (NaN): a phase without scores.
 *
 * Source: Scruggs, Mastropieri & Casto 1987, Remedial Spec Educ 8:24-33.
 *
 * @example percentNonoverlapping([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]) // → 0.8
 */
export function percentNonoverlapping(a: PhaseScores, b: PhaseScores): number {
  const before = present(a, 'a');
  const after = present(b, 'b');
  if (before.length === 0) return Number.NaN;
  const highest = before.reduce((top, score) => Math.max(top, score), Number.NEGATIVE_INFINITY);
  return after.filter((score) => score > highest).length / after.length;
}

export const about: About = {
  name: 'percentNonoverlapping',
  sentence: 'The share of sessions after the change that are better than the best one before.',
  formula: '#{b > max(a)} / n_b',
  source: 'Scruggs, Mastropieri & Casto 1987, Remedial Spec Educ 8:24-33',
  check: {
    input: 'percentNonoverlapping([62, 70, 66, 64, 68], [74, 78, 70, 80, 76])',
    expected: 0.8,
    source: 'by hand: 4 of 5 above 70',
    tolerance: 1e-12,
  },
  recompute: () => percentNonoverlapping([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]),
};
