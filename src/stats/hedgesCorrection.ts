import type { About } from './about.ts';
import { gammaHalfStep } from './gammaHalfStep.ts';
import { requireThat } from './requireThat.ts';

/**
 * The exact factor J that takes the small-sample bias out of a standardized difference:
 * Γ(df/2) / (√(df/2) Γ((df − 1)/2)); df degrees of freedom of the standard deviation.
 *
 * Undefined (NaN) for df ≤ 1. Relative error 1e-14 for all df (no large logarithms are subtracted).
 *
 * Source: Hedges 1981, J Educ Stat 6:107-128.
 *
 * @example hedgesCorrection(4) // → 0.7979
 */
export function hedgesCorrection(df: number): number {
  if (Number.isNaN(df)) return Number.NaN;
  requireThat(df >= 0, 'df', 'must not be negative');
  if (df <= 1) return Number.NaN;
  if (df === Number.POSITIVE_INFINITY) return 1;
  return gammaHalfStep((df - 1) / 2) * Math.sqrt((df - 1) / df);
}

export const about: About = {
  name: 'hedgesCorrection',
  sentence: 'The factor that keeps a standardized difference from small groups from being too large.',
  formula: 'J = Γ(df/2) / (√(df/2) Γ((df − 1)/2))',
  source: 'Hedges 1981, J Educ Stat 6:107-128',
  check: {
    input: 'hedgesCorrection(4)',
    expected: Math.sqrt(2 / Math.PI),
    source: 'by hand: Γ(2)/(√2 Γ(1.5)) = √(2/π)',
    tolerance: 1e-14,
  },
  recompute: () => hedgesCorrection(4),
};
