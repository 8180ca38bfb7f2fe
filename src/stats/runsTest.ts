import type { About } from './about.ts';
import { normalTwoSided } from './distributions.ts';
import { requireThat } from './requireThat.ts';

export interface RunsTest {
  /** Unbroken stretches of the same value. */
  readonly runs: number;
  /** How many chance order would give on average. */
  readonly expected: number;
  /** Below 0: fewer runs than by chance, the looks cling together. No continuity correction. */
  readonly z: number;
  /** Two-sided, by the normal approximation. */
  readonly p: number;
}

/**
 * Whether a series of 0 and 1 (looks at one child) changes less or more often than it would in random order.
 *
 * Undefined (NaN): all but the runs for a constant or empty series; z and p where order cannot vary (one of each).
 * Relative error 1e-10.
 *
 * Source: Wald & Wolfowitz 1940, Ann Math Stat 11:147-162.
 *
 * @example runsTest([1, 1, 1, 0, 0, 1]).runs // → 3
 */
export function runsTest(series: ArrayLike<number>): RunsTest {
  const n = series.length;
  let ones = 0;
  let runs = 0;
  for (let i = 0; i < n; i++) {
    const value = series[i];
    requireThat(value === 0 || value === 1, 'series', 'must hold 0 and 1 only');
    ones += value;
    if (i === 0 || value !== series[i - 1]) runs++;
  }
  const zeros = n - ones;
  if (ones === 0 || zeros === 0) return { runs, expected: Number.NaN, z: Number.NaN, p: Number.NaN };
  const twice = 2 * ones * zeros;
  const expected = twice / n + 1;
  const variance = (twice * (twice - n)) / (n * n * (n - 1));
  const z = variance > 0 ? (runs - expected) / Math.sqrt(variance) : Number.NaN;
  return { runs, expected, z, p: normalTwoSided(z) };
}

export const about: About = {
  name: 'runsTest',
  sentence: 'Whether on-task and off-task looks cling together more than chance order would.',
  formula: 'z = (R − 2n₁n₀/n − 1) / √(2n₁n₀(2n₁n₀ − n)/(n²(n − 1)))',
  source: 'Wald & Wolfowitz 1940, Ann Math Stat 11:147-162',
  check: {
    input: 'runsTest([1, 0, 1, 0, 1, 0, 1, 0, 1, 0, 1, 0, 1, 0, 1, 0]).z',
    expected: 7 / Math.sqrt((128 * 112) / (256 * 15)),
    source: 'by hand: 16 runs, 9 expected, variance 128 · 112/(256 · 15)',
    tolerance: 1e-12,
  },
  recompute: () => runsTest([1, 0, 1, 0, 1, 0, 1, 0, 1, 0, 1, 0, 1, 0, 1, 0]).z,
};
