import type { About } from './about.ts';
import { twoSidedZ } from './normalQuantile.ts';
import { requireConfidence, requireThat } from './requireThat.ts';

export interface Interval {
  readonly lower: number;
  readonly upper: number;
}

/** Successes out of n: both finite, 0 ≤ successes ≤ n. */
export function requireSuccesses(successes: number, n: number): void {
  requireThat(Number.isFinite(n) && n >= 0, 'n', 'must be a count');
  requireThat(successes >= 0 && successes <= n, 'successes', 'must lie between 0 and n');
}

/**
 * Wilson's score interval for a share, without continuity correction; both ends lie in 0–1.
 *
 * It treats the looks as independent; looks at one child are not (see effectiveLooks).
 * Undefined (NaN) for n = 0. Relative error 1e-10.
 *
 * Source: Wilson 1927, J Am Stat Assoc 22:209-212.
 *
 * @example wilsonInterval(81, 263).lower // → 0.2553
 * @example wilsonInterval(0, 20).upper // → 0.1611
 */
export function wilsonInterval(successes: number, n: number, confidence = 0.95): Interval {
  requireSuccesses(successes, n);
  requireConfidence(confidence);
  if (n === 0) return { lower: Number.NaN, upper: Number.NaN };
  const z2 = twoSidedZ(confidence) ** 2;
  const failures = n - successes;
  // The lower end of the failures is one minus the upper end of the successes: written so, no end loses digits.
  const upperOf = (x: number): number =>
    (x + z2 / 2 + Math.sqrt(z2 * ((x * (n - x)) / n + z2 / 4))) / (n + z2);
  const lowerOf = (x: number): number => (x === 0 ? 0 : (x * x) / n / (n + z2) / upperOf(x));
  return {
    lower: lowerOf(successes),
    upper: failures === 0 ? 1 : upperOf(successes),
  };
}

export const about: About = {
  name: 'wilsonInterval',
  sentence: 'The range in which the true share plausibly lies, given so many looks.',
  formula: '(p + z²/2n ± z √(p(1−p)/n + z²/4n²)) / (1 + z²/n)',
  source: 'Wilson 1927, J Am Stat Assoc 22:209-212',
  check: {
    input: 'wilsonInterval(81, 263).lower',
    expected: 0.2553,
    source: 'Newcombe 1998, Stat Med 17:857-872, Table I (printed value from memory)',
    tolerance: 5e-5,
  },
  recompute: () => wilsonInterval(81, 263).lower,
};
