import type { About } from './about.ts';
import { betaQuantile } from './distributions.ts';
import { requireConfidence } from './requireThat.ts';
import { type Interval, requireSuccesses } from './wilsonInterval.ts';

/**
 * The exact interval for a share, from the binomial distribution itself: never covers less often than it says, and
 * is for that mostly wider than Wilson's. Each tail gets half of what the confidence leaves over, also at 0 of n and n of n.
 *
 * Undefined (NaN) for n = 0. Relative error 1e-10 (beta quantiles).
 *
 * Source: Clopper & Pearson 1934, Biometrika 26:404-413.
 *
 * @example clopperPearsonInterval(81, 263).lower // → 0.2527
 */
export function clopperPearsonInterval(successes: number, n: number, confidence = 0.95): Interval {
  requireSuccesses(successes, n);
  requireConfidence(confidence);
  if (n === 0) return { lower: Number.NaN, upper: Number.NaN };
  const tail = (1 - confidence) / 2;
  const lowerOf = (x: number): number => (x === 0 ? 0 : betaQuantile(tail, x, n - x + 1));
  return { lower: lowerOf(successes), upper: 1 - lowerOf(n - successes) };
}

export const about: About = {
  name: 'clopperPearsonInterval',
  sentence: 'The exact and cautious range for a share, given so many looks.',
  formula: 'B(α/2; x, n − x + 1) … B(1 − α/2; x + 1, n − x)',
  source: 'Clopper & Pearson 1934, Biometrika 26:404-413',
  check: {
    input: 'clopperPearsonInterval(0, 20).upper',
    expected: 1 - 0.025 ** (1 / 20),
    source: 'closed form at 0 of n: 1 − (α/2)^(1/n); .1684 in Newcombe 1998, Table I',
    tolerance: 1e-9,
  },
  recompute: () => clopperPearsonInterval(0, 20).upper,
};
