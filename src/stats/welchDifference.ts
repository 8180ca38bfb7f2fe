import type { About } from './about.ts';
import { tTwoSided, twoSidedT } from './distributions.ts';
import { mean, sampleVariance } from './moments.ts';
import { requireConfidence, requireFinite } from './requireThat.ts';

export interface WelchDifference {
  /** Mean of a − mean of b. */
  readonly difference: number;
  readonly standardError: number;
  readonly t: number;
  readonly df: number;
  /** Two-sided. */
  readonly p: number;
  readonly lower: number;
  readonly upper: number;
}

/**
 * Difference of two independent groups' means (a − b) without assuming equal spread, with Welch's t interval and test.
 * Given the changes of two classes, this is the difference in changes.
 *
 * Undefined (NaN): all but the difference when a group has fewer than two numbers or neither group has any spread.
 * Relative error 1e-10.
 *
 * Source: Welch 1947, Biometrika 34:28-35; degrees of freedom: Satterthwaite 1946, Biometrics Bull 2:110-114.
 *
 * @example welchDifference([10, 10, 10], [0, 5, 1]).difference // → 8
 */
export function welchDifference(
  a: ArrayLike<number>,
  b: ArrayLike<number>,
  confidence = 0.95,
): WelchDifference {
  requireConfidence(confidence);
  requireFinite(a, 'a');
  requireFinite(b, 'b');
  const difference = mean(a) - mean(b);
  const partA = sampleVariance(a) / a.length;
  const partB = sampleVariance(b) / b.length;
  const variance = partA + partB;
  const standardError = variance > 0 ? Math.sqrt(variance) : Number.NaN;
  const df =
    variance > 0
      ? 1 / ((partA / variance) ** 2 / (a.length - 1) + (partB / variance) ** 2 / (b.length - 1))
      : Number.NaN;
  const t = difference / standardError;
  const half = twoSidedT(confidence, df) * standardError;
  return {
    difference,
    standardError,
    t,
    df,
    p: Number.isNaN(t) ? Number.NaN : tTwoSided(t, df),
    lower: difference - half,
    upper: difference + half,
  };
}

export const about: About = {
  name: 'welchDifference',
  sentence: 'The difference of two groups’ averages, with the range in which the true one plausibly lies.',
  formula: 'ā − b̄ ± t(ν) √(s_a²/n_a + s_b²/n_b)',
  source: 'Welch 1947, Biometrika 34:28-35',
  check: {
    input: 'welchDifference([10, 10, 10], [0, 5, 1]).standardError',
    expected: Math.sqrt(7 / 3),
    source: 'by hand: variances 0 and 7, three numbers each',
    tolerance: 1e-12,
  },
  recompute: () => welchDifference([10, 10, 10], [0, 5, 1]).standardError,
};
