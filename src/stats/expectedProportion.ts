import type { About } from './about.ts';
import { requireThat } from './requireThat.ts';

export type SamplingMethod = 'momentary' | 'partial' | 'whole';

export interface BehaviourInBouts {
  /** Mean length of a bout of the behaviour, in seconds (any unit, the same throughout). */
  readonly meanBout: number;
  /** Mean length of a gap between bouts. */
  readonly meanGap: number;
}

export function requireBouts({ meanBout, meanGap }: BehaviourInBouts): void {
  requireThat(meanBout > 0 && Number.isFinite(meanBout), 'meanBout', 'must be positive');
  requireThat(meanGap > 0 && Number.isFinite(meanGap), 'meanGap', 'must be positive');
}

export function requireMethod(method: string): void {
  requireThat(
    method === 'momentary' || method === 'partial' || method === 'whole',
    'method',
    'must be "momentary", "partial" or "whole"',
  );
}

/**
 * The share of intervals that a perfect observer would score, for behaviour with exponential bouts and gaps;
 * `observed` = length of the watched part of each interval (a look needs none). Momentary: the true share of time φ; partial interval
 * is above it, whole interval below. Relative error 1e-12. Never undefined for valid arguments.
 *
 * Sources: Rogosa & Ghandour 1991, J Educ Stat 16:157-252; Pustejovsky & Swan 2015, Multivar Behav Res 50:365-380.
 *
 * @example expectedProportion('partial', { meanBout: 40, meanGap: 10, observed: 10 }) // → 0.926
 * @example expectedProportion('whole', { meanBout: 40, meanGap: 10, observed: 10 }) // → 0.623
 */
export function expectedProportion(
  method: SamplingMethod,
  { meanBout, meanGap, observed }: BehaviourInBouts & { readonly observed?: number },
): number {
  requireMethod(method);
  requireBouts({ meanBout, meanGap });
  const share = meanBout / (meanBout + meanGap);
  if (method === 'momentary' && observed === undefined) return share;
  requireThat(
    observed !== undefined && observed >= 0 && Number.isFinite(observed),
    'observed',
    'must not be negative',
  );
  if (method === 'momentary') return share;
  if (method === 'whole') return share * Math.exp(-observed / meanBout);
  return share - (1 - share) * Math.expm1(-observed / meanGap);
}

export const about: About = {
  name: 'expectedProportion',
  sentence:
    'What momentary, partial-interval and whole-interval recording show for a behaviour of known bouts.',
  formula: 'momentary φ; partial φ + (1 − φ)(1 − e^(−c/λ)); whole φ e^(−c/μ); φ = μ/(μ + λ)',
  source:
    'Rogosa & Ghandour 1991, J Educ Stat 16:157-252; Pustejovsky & Swan 2015, Multivar Behav Res 50:365-380',
  check: {
    input: "expectedProportion('partial', { meanBout: 40, meanGap: 10, observed: 10 })",
    expected: 0.8 + 0.2 * (1 - Math.exp(-1)),
    source: 'by hand: .8 + .2 (1 − 1/e); agrees with simulation',
    tolerance: 1e-12,
  },
  recompute: () => expectedProportion('partial', { meanBout: 40, meanGap: 10, observed: 10 }),
};
