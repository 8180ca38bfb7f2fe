import type { About } from './about.ts';
import { type BehaviourInBouts, requireBouts } from './expectedProportion.ts';
import { requireThat } from './requireThat.ts';

/**
 * Variance of one child's share of momentary looks in one session, for a behaviour with exponential bouts and gaps
 * whose prevalence is `phi`: `looks` looks, `spacing` apart (same unit as the bouts).
 * φ(1 − φ)/K · [1 + 2 Σ (1 − j/K) r^j], r = e^(−Δ(1/μ + 1/λ)). Its root is the standard error.
 *
 * Undefined (NaN) for no look. Relative error 1e-10. Linear in the looks at most.
 *
 * Source: Rogosa & Ghandour 1991, J Educ Stat 16:157-252.
 *
 * @example Math.sqrt(momentaryVariance(0.8, 60, 15, { meanBout: 40, meanGap: 10 })) // → 0.060
 */
export function momentaryVariance(
  phi: number,
  looks: number,
  spacing: number,
  { meanBout, meanGap }: BehaviourInBouts,
): number {
  requireThat(phi >= 0 && phi <= 1, 'phi', 'must lie between 0 and 1');
  requireThat(Number.isInteger(looks) && looks >= 0, 'looks', 'must be a whole number');
  requireThat(spacing >= 0 && Number.isFinite(spacing), 'spacing', 'must not be negative');
  requireBouts({ meanBout, meanGap });
  if (looks === 0) return Number.NaN;
  const r = Math.exp(-spacing * (1 / meanBout + 1 / meanGap));
  let sum = 0;
  let power = r;
  // Further powers add nothing that a double could hold.
  for (let j = 1; j < looks && power > 1e-18; j++) {
    sum += (1 - j / looks) * power;
    power *= r;
  }
  return ((phi * (1 - phi)) / looks) * (1 + 2 * sum);
}

export const about: About = {
  name: 'momentaryVariance',
  sentence: 'How far one child’s share from one session of looks may be off, given how long bouts last.',
  formula: 'φ(1 − φ)/K · [1 + 2 Σ (1 − j/K) rʲ], r = e^(−Δ(1/μ + 1/λ))',
  source: 'Rogosa & Ghandour 1991, J Educ Stat 16:157-252',
  check: {
    input: 'momentaryVariance(0.5, 2, 10, { meanBout: 20, meanGap: 20 })',
    expected: 0.125 * (1 + Math.exp(-1)),
    source: 'by hand: .25/2 · [1 + 2 · ½ · 1/e]',
    tolerance: 1e-12,
  },
  recompute: () => momentaryVariance(0.5, 2, 10, { meanBout: 20, meanGap: 20 }),
};
