import type { About } from './about.ts';
import type { BehaviourInBouts } from './expectedProportion.ts';
import { requireThat } from './requireThat.ts';

/**
 * Mean bout and mean gap from the prevalence (share of time, 0–1) and the incidence (bouts begun per unit of time):
 * μ = φ/ζ, λ = (1 − φ)/ζ, in the unit of time of the incidence.
 *
 * Undefined (NaN): incidence 0 (no bout ever begins). Relative error 1e-12.
 *
 * Source: by definition; Rogosa & Ghandour 1991, J Educ Stat 16:157-252.
 *
 * @example boutsFromSummary(0.8, 0.02).meanBout // → 40
 */
export function boutsFromSummary(prevalence: number, incidence: number): BehaviourInBouts {
  requireThat(prevalence >= 0 && prevalence <= 1, 'prevalence', 'must lie between 0 and 1');
  requireThat(incidence >= 0 && Number.isFinite(incidence), 'incidence', 'must not be negative');
  if (incidence === 0) return { meanBout: Number.NaN, meanGap: Number.NaN };
  return { meanBout: prevalence / incidence, meanGap: (1 - prevalence) / incidence };
}

export const about: About = {
  name: 'boutsFromSummary',
  sentence: 'How long bouts and gaps last on average, from the share of time and how often bouts begin.',
  formula: 'μ = φ/ζ, λ = (1 − φ)/ζ',
  source: 'by definition; Rogosa & Ghandour 1991, J Educ Stat 16:157-252',
  check: {
    input: 'boutsFromSummary(0.8, 0.02).meanGap',
    expected: 10,
    source: 'by hand: .2/.02',
    tolerance: 1e-12,
  },
  recompute: () => boutsFromSummary(0.8, 0.02).meanGap,
};
