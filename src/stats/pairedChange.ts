import type { About } from './about.ts';
import { tTwoSided, twoSidedT } from './distributions.ts';
import { largestAbsolute, mean, sampleVariance } from './moments.ts';
import { requireConfidence, requireFinite, requireSameLength } from './requireThat.ts';

export interface PairedChange {
  readonly n: number;
  readonly meanBefore: number;
  readonly meanAfter: number;
  /** Mean of after − before. */
  readonly change: number;
  /** Standard deviation of the changes (n − 1). */
  readonly sdChange: number;
  readonly standardError: number;
  readonly t: number;
  readonly df: number;
  /** Two-sided. */
  readonly p: number;
  readonly lower: number;
  readonly upper: number;
}

/** Pair by pair, after − before. */
export function differencesOf(before: ArrayLike<number>, after: ArrayLike<number>): number[] {
  requireSameLength(before, after, 'before, after');
  requireFinite(before, 'before');
  requireFinite(after, 'after');
  return Array.from({ length: before.length }, (_, i) => (after[i] as number) - (before[i] as number));
}

/**
 * The mean change (after − before) of paired scores with Student's t interval and test. Same units as the scores.
 * A pair is one independent unit: a child, or a class when whole classes had the break.
 *
 * Undefined (NaN): all for no pair; all that needs a spread for one pair; t and p when every change is the same,
 * where both limits equal the change. Relative error 1e-10.
 *
 * Source: Student 1908, Biometrika 6:1-25.
 *
 * @example pairedChange([62, 70, 66], [74, 78, 70]).change // → 8
 */
export function pairedChange(
  before: ArrayLike<number>,
  after: ArrayLike<number>,
  confidence = 0.95,
): PairedChange {
  requireConfidence(confidence);
  const differences = differencesOf(before, after);
  const n = differences.length;
  const change = mean(differences);
  const sdChange = Math.sqrt(sampleVariance(differences, largestAbsolute(before, after)));
  const standardError = sdChange / Math.sqrt(n);
  const df = n > 0 ? n - 1 : Number.NaN;
  const t = standardError > 0 ? change / standardError : Number.NaN;
  const half = standardError === 0 ? 0 : twoSidedT(confidence, df) * standardError;
  return {
    n,
    meanBefore: mean(before),
    meanAfter: mean(after),
    change,
    sdChange,
    standardError,
    t,
    df,
    p: Number.isNaN(t) ? Number.NaN : tTwoSided(t, df),
    lower: change - half,
    upper: change + half,
  };
}

const first = [0.7, -1.6, -0.2, -1.2, -0.1, 3.4, 3.7, 0.8, 0, 2];
const second = [1.9, 0.8, 1.1, 0.1, -0.1, 4.4, 5.5, 1.6, 4.6, 3.4];

export const about: About = {
  name: 'pairedChange',
  sentence: 'The average change from before to after, with the range in which the true one plausibly lies.',
  formula: 'd̄ ± t(n − 1) s_d/√n',
  source: 'Student 1908, Biometrika 6:1-25',
  check: {
    input: "pairedChange of Student's ten sleepers: t",
    expected: 4.0621,
    source: 'Student 1908, sleep data (t 4.0621, df 9, p .002833)',
    tolerance: 2e-5,
  },
  recompute: () => pairedChange(first, second).t,
};
