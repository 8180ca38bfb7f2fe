import type { About } from './about.ts';
import { correlation, mean, sumOfSquares } from './moments.ts';
import { differencesOf } from './pairedChange.ts';
import type { Effect } from './standardizedMeanChange.ts';

/**
 * Difference in changes between a treated and a control group, in pooled standard deviations of the scores before
 * (d_ppc2): g = c · (mean change treated − mean change control) / s_before, c = 1 − 3/(4(N − 2) − 1),
 * N = n_T + n_C. Variance 2c²(1 − ρ)k (N − 2)/(N − 4) (1 + g²/(2(1 − ρ)k)) − g², k = 1/n_T + 1/n_C, ρ the arms'
 * correlations of before and after averaged with weights n − 1.
 *
 * Undefined (NaN): a group with fewer than two pairs; no spread before; the variance for N ≤ 4 and where a
 * correlation is undefined. Relative error 1e-10.
 *
 * Source: Morris 2008, Organ Res Methods 11:364-386.
 *
 * @example pretestPosttestControl([10, 20, 30], [20, 30, 40], [15, 25, 40], [15, 30, 41]).estimate // → 0.5631
 */
export function pretestPosttestControl(
  tBefore: ArrayLike<number>,
  tAfter: ArrayLike<number>,
  cBefore: ArrayLike<number>,
  cAfter: ArrayLike<number>,
): Effect {
  const treated = differencesOf(tBefore, tAfter);
  const control = differencesOf(cBefore, cAfter);
  const nT = treated.length;
  const nC = control.length;
  const df = nT + nC - 2;
  const pooled = (sumOfSquares(tBefore) + sumOfSquares(cBefore)) / df;
  if (nT < 2 || nC < 2 || pooled === 0) return { estimate: Number.NaN, variance: Number.NaN };
  const factor = 1 - 3 / (4 * df - 1);
  const estimate = (factor * (mean(treated) - mean(control))) / Math.sqrt(pooled);
  const rho = ((nT - 1) * correlation(tBefore, tAfter) + (nC - 1) * correlation(cBefore, cAfter)) / df;
  const base = 2 * (1 - rho) * (1 / nT + 1 / nC);
  // 2(1 − ρ)k (1 + g²/(2(1 − ρ)k)) multiplied out, so that a correlation of 1 does not divide by 0.
  const variance = (factor ** 2 * df * (base + estimate ** 2)) / (df - 2) - estimate ** 2;
  return { estimate, variance: df > 2 ? variance : Number.NaN };
}

export const about: About = {
  name: 'pretestPosttestControl',
  sentence: 'How much more the treated group changed than the control group, in standard deviations before.',
  formula: 'c (Δ_T − Δ_C) / s_before, c = 1 − 3/(4(N − 2) − 1)',
  source: 'Morris 2008, Organ Res Methods 11:364-386 (d_ppc2)',
  check: {
    input: 'pretestPosttestControl([10, 20, 30], [20, 30, 40], [15, 25, 40], [15, 30, 41]).estimate',
    expected: 0.5631249216819967,
    source: 'independent computation in Python and R from the formula',
    tolerance: 1e-10,
  },
  recompute: () => pretestPosttestControl([10, 20, 30], [20, 30, 40], [15, 25, 40], [15, 30, 41]).estimate,
};
