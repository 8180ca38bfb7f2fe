import type { About } from './about.ts';
import { hedgesCorrection } from './hedgesCorrection.ts';
import { mean, sumOfSquares } from './moments.ts';
import { requireFinite } from './requireThat.ts';

export interface HedgesG {
  readonly g: number;
  readonly variance: number;
}

/**
 * Standardized difference of two independent groups (mean a − mean b, in pooled standard deviations), corrected by
 * the exact J with n₁ + n₂ − 2 degrees of freedom; variance 1/n₁ + 1/n₂ + g²/(2(n₁ + n₂)).
 *
 * Undefined (NaN): a group with fewer than two numbers, or neither with any spread. Relative error 1e-10.
 *
 * Source: Hedges 1981, J Educ Stat 6:107-128.
 *
 * @example hedgesG([10, 10, 10], [0, 5, 1]).g // → 3.4119
 */
export function hedgesG(a: ArrayLike<number>, b: ArrayLike<number>): HedgesG {
  requireFinite(a, 'a');
  requireFinite(b, 'b');
  const df = a.length + b.length - 2;
  const pooled = (sumOfSquares(a) + sumOfSquares(b)) / df;
  if (a.length < 2 || b.length < 2 || pooled === 0) return { g: Number.NaN, variance: Number.NaN };
  const g = (hedgesCorrection(df) * (mean(a) - mean(b))) / Math.sqrt(pooled);
  return { g, variance: 1 / a.length + 1 / b.length + g ** 2 / (2 * (a.length + b.length)) };
}

export const about: About = {
  name: 'hedgesG',
  sentence: 'The difference of two groups in standard deviations, so that studies can be compared.',
  formula: 'g = J(n₁ + n₂ − 2) (ā − b̄)/s_pooled',
  source: 'Hedges 1981, J Educ Stat 6:107-128',
  check: {
    input: 'hedgesG([10, 10, 10], [0, 5, 1]).g',
    expected: (Math.sqrt(2 / Math.PI) * 8) / Math.sqrt(3.5),
    source: 'by hand: J(4) = √(2/π), difference 8, pooled variance 3.5',
    tolerance: 1e-12,
  },
  recompute: () => hedgesG([10, 10, 10], [0, 5, 1]).g,
};
