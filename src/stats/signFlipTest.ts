import type { About } from './about.ts';
import { largestAbsolute } from './moments.ts';
import { requireFinite, requireThat } from './requireThat.ts';

export interface SamplingOptions {
  /** Numbers in [0, 1), one after the other. */
  readonly random: () => number;
  readonly draws: number;
}

/** Up to so many differences, all arrangements of signs are counted. */
export const signFlipLimit = 20;

/**
 * Two-sided p of the mean difference when the sign of every difference might as well have been the other:
 * the share of all 2^n arrangements whose sum is at least as far from 0. Exact for up to 20 differences; beyond,
 * `{ random, draws }` is needed, and p = (as extreme + 1)/(draws + 1) over arrangements drawn. Equal sums are told
 * with a tolerance of 1e-9 of the largest difference.
 *
 * Undefined (NaN) for no difference. All differences 0: 1. The smallest possible p is 2/2^n.
 *
 * Sources: Fisher 1935, The design of experiments, chapter 3; Pitman 1937, J R Stat Soc Suppl 4:119-130.
 *
 * @example signFlipTest([20, 10, 20, 11.1, 31.9, -10]) // → 0.09375
 */
export function signFlipTest(differences: ArrayLike<number>, sampling?: SamplingOptions): number {
  requireFinite(differences, 'differences');
  const n = differences.length;
  if (n === 0) return Number.NaN;
  let sum = 0;
  for (let i = 0; i < n; i++) sum += differences[i] as number;
  const bar = Math.abs(sum) - 1e-9 * largestAbsolute(differences);
  if (n <= signFlipLimit) return exactShare(differences, bar);
  requireThat(
    sampling !== undefined,
    'sampling',
    `is needed beyond ${signFlipLimit} differences: { random, draws }`,
  );
  const { random, draws } = sampling;
  requireThat(typeof random === 'function', 'random', 'must be a generator of numbers in [0, 1)');
  requireThat(Number.isInteger(draws) && draws > 0, 'draws', 'must be a whole number above 0');
  let asExtreme = 0;
  for (let d = 0; d < draws; d++) {
    let drawn = 0;
    for (let i = 0; i < n; i++)
      drawn += random() < 0.5 ? (differences[i] as number) : -(differences[i] as number);
    if (Math.abs(drawn) >= bar) asExtreme++;
  }
  return (asExtreme + 1) / (draws + 1);
}

function exactShare(differences: ArrayLike<number>, bar: number): number {
  // The first sign stays: turning all signs changes no distance from 0.
  const sums = new Float64Array(2 ** (differences.length - 1));
  sums[0] = differences[0] as number;
  let filled = 1;
  for (let i = 1; i < differences.length; i++) {
    const difference = differences[i] as number;
    for (let s = 0; s < filled; s++) {
      const sum = sums[s] as number;
      sums[s] = sum + difference;
      sums[filled + s] = sum - difference;
    }
    filled *= 2;
  }
  let asExtreme = 0;
  for (const sum of sums) if (Math.abs(sum) >= bar) asExtreme++;
  return asExtreme / sums.length;
}

export const about: About = {
  name: 'signFlipTest',
  sentence: 'How often chance alone, by turning signs, would give a change at least this large.',
  formula: 'p = #{|Σ ±d| ≥ |Σ d|} / 2ⁿ',
  source: 'Fisher 1935, The design of experiments; Pitman 1937, J R Stat Soc Suppl 4:119-130',
  check: {
    input: 'signFlipTest([5, 5, 5])',
    expected: 0.25,
    source: 'by hand: 2 of 8 arrangements',
    tolerance: 0,
  },
  recompute: () => signFlipTest([5, 5, 5]),
};
