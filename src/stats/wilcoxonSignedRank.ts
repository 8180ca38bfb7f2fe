import type { About } from './about.ts';
import { normalTwoSided } from './distributions.ts';
import { largestAbsolute } from './moments.ts';
import { requireFinite } from './requireThat.ts';

export interface WilcoxonSignedRank {
  /** Sum of the mid-ranks of the positive differences. */
  readonly statistic: number;
  /** Two-sided. */
  readonly p: number;
}

/** Up to so many differences other than 0, the distribution is exact. */
export const wilcoxonLimit = 50;

/**
 * Wilcoxon's signed-rank test of paired differences. Differences of 0 are dropped before ranking (Pratt 1959 would
 * rank them too, which can turn the answer); equal sizes share their mid-rank, told with a tolerance of 1e-9 of the
 * largest. Two-sided p from the permutation distribution of the ranks at hand, exact for up to 50 differences;
 * beyond, by the normal approximation with the variance of these ranks and no continuity correction.
 *
 * Undefined (NaN): no difference other than 0.
 *
 * Sources: Wilcoxon 1945, Biometrics Bull 1:80-83; on zeros Pratt 1959, J Am Stat Assoc 54:655-667.
 *
 * @example wilcoxonSignedRank([0, 5, 0, 10, 15]).p // → 0.25
 */
export function wilcoxonSignedRank(differences: ArrayLike<number>): WilcoxonSignedRank {
  requireFinite(differences, 'differences');
  const tolerance = 1e-9 * largestAbsolute(differences);
  const kept = Array.from(differences)
    .filter((difference) => Math.abs(difference) > tolerance)
    .sort((a, b) => Math.abs(a) - Math.abs(b));
  if (kept.length === 0) return { statistic: Number.NaN, p: Number.NaN };
  const doubled = doubledMidRanks(kept, tolerance);
  const total = doubled.reduce((sum, rank) => sum + rank, 0);
  const positive = doubled.reduce((sum, rank, i) => ((kept[i] as number) > 0 ? sum + rank : sum), 0);
  // In doubled ranks, the distance from the centre is |2 V − total| / 2; both sides are whole.
  const distance = Math.abs(2 * positive - total);
  const p =
    kept.length <= wilcoxonLimit
      ? exactP(doubled, total, distance)
      : normalTwoSided(distance / Math.sqrt(doubled.reduce((sum, rank) => sum + rank * rank, 0)));
  return { statistic: positive / 2, p };
}

/** Twice the mid-rank of each, which is whole. Neighbours within the tolerance are tied. */
function doubledMidRanks(sorted: readonly number[], tolerance: number): number[] {
  const ranks: number[] = [];
  for (let from = 0; from < sorted.length; ) {
    let to = from + 1;
    while (
      to < sorted.length &&
      Math.abs(sorted[to] as number) - Math.abs(sorted[to - 1] as number) <= tolerance
    )
      to++;
    for (let i = from; i < to; i++) ranks.push(from + 1 + to);
    from = to;
  }
  return ranks;
}

/** Counts the sign arrangements by their sum; 2^50 and every count below it are exact in a double. */
function exactP(doubled: readonly number[], total: number, distance: number): number {
  const ways = new Float64Array(total + 1);
  ways[0] = 1;
  let reached = 0;
  for (const rank of doubled) {
    for (let sum = reached; sum >= 0; sum--) {
      ways[sum + rank] = (ways[sum + rank] as number) + (ways[sum] as number);
    }
    reached += rank;
  }
  let asExtreme = 0;
  for (let sum = 0; sum <= total; sum++)
    if (Math.abs(2 * sum - total) >= distance) asExtreme += ways[sum] as number;
  return asExtreme / 2 ** doubled.length;
}

export const about: About = {
  name: 'wilcoxonSignedRank',
  sentence: 'Whether changes go up more, and further, than down, by their ranks alone.',
  formula: 'V = Σ ranks of positive differences; p = #{|V* − E| ≥ |V − E|} / 2ᵐ',
  source: 'Wilcoxon 1945, Biometrics Bull 1:80-83; Pratt 1959, J Am Stat Assoc 54:655-667 on zeros',
  check: {
    input: 'wilcoxonSignedRank([1, 2, 3, 4, 5, 6]).p',
    expected: 2 / 64,
    source: 'by hand: 2 of 64 arrangements',
    tolerance: 0,
  },
  recompute: () => wilcoxonSignedRank([1, 2, 3, 4, 5, 6]).p,
};
