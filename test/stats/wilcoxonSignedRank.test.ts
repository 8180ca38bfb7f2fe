import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { wilcoxonSignedRank } from '../../src/stats/wilcoxonSignedRank.ts';
import { referenceTests } from './referenceCases.ts';

interface Input {
  before: number[];
  after: number[];
}

const differences = ({ before, after }: Input): number[] =>
  after.map((score, i) => score - (before[i] as number));

/** Ranks by counting, and all sign arrangements one by one. */
function byEnumeration(values: number[]): { statistic: number; p: number } {
  const kept = values.filter((value) => value !== 0);
  const sizes = kept.map(Math.abs);
  const ranks = sizes.map(
    (size) =>
      sizes.filter((other) => other < size).length + (sizes.filter((other) => other === size).length + 1) / 2,
  );
  const centre = ranks.reduce((x, y) => x + y, 0) / 2;
  const statistic = ranks.reduce((sum, rank, i) => ((kept[i] as number) > 0 ? sum + rank : sum), 0);
  let count = 0;
  for (let bits = 0; bits < 2 ** kept.length; bits++) {
    const drawn = ranks.reduce((sum, rank, i) => ((bits >> i) & 1 ? sum + rank : sum), 0);
    if (Math.abs(drawn - centre) >= Math.abs(statistic - centre)) count++;
  }
  return { statistic, p: count / 2 ** kept.length };
}

describe('wilcoxonSignedRank', () => {
  referenceTests<Input>('paired_change', (input) => {
    const { statistic, p } = wilcoxonSignedRank(differences(input));
    return { wilcoxon_V: statistic, wilcoxon_p_exact: p };
  });

  test("Darwin's fifteen pairs of plants: V = 96, p = .0413 (from memory, the usual textbook run)", () => {
    const got = wilcoxonSignedRank([49, -67, 8, 16, 6, 23, 28, 41, 14, 29, 56, 24, 75, 60, -48]);
    expect(got.statistic).toBe(96);
    expect(got.p).toBeCloseTo(0.0413, 4);
  });

  test('critical values of the printed tables: n = 10, V = 8 gives .0488 and V = 9 gives .0645 (from memory)', () => {
    const withNegatives = (negative: number[]): number[] =>
      Array.from({ length: 10 }, (_, i) => (negative.includes(i + 1) ? -(i + 1) : i + 1));
    expect(wilcoxonSignedRank(withNegatives([8])).p).toBeCloseTo(0.0488, 4);
    expect(wilcoxonSignedRank(withNegatives([9])).p).toBeCloseTo(0.0645, 4);
  });

  test('is the share counted by exact enumeration, with zeros and ties, also in tenths', () => {
    fc.assert(
      fc.property(
        fc
          .array(fc.integer({ min: -5, max: 5 }), { minLength: 1, maxLength: 10 })
          .filter((values) => values.some((value) => value !== 0)),
        (values) => {
          const want = byEnumeration(values);
          expect(wilcoxonSignedRank(values)).toEqual(want);
          expect(wilcoxonSignedRank(values.map((value) => value / 10 + 0.3 - 0.3))).toEqual(want);
          expect(wilcoxonSignedRank(values.map((value) => -value)).p).toBe(want.p);
        },
      ),
    );
  });

  test('exact at 50; beyond, the normal approximation follows on without a jump', () => {
    const values = (n: number): number[] =>
      Array.from({ length: n }, (_, i) => (i % 3 === 0 ? -(i + 1) : i + 1));
    const exact = wilcoxonSignedRank(values(50)).p;
    const approximate = wilcoxonSignedRank(values(51)).p;
    expect(exact).toBeGreaterThan(0);
    expect(Math.abs(exact - approximate)).toBeLessThan(0.02);
    expect(wilcoxonSignedRank(Array.from({ length: 50 }, (_, i) => i + 1)).p).toBe(2 / 2 ** 50);
  });

  test('no difference other than 0 is undefined; nonsense throws', () => {
    for (const values of [[], [0, 0]]) {
      expect(wilcoxonSignedRank(values)).toEqual({ statistic: Number.NaN, p: Number.NaN });
    }
    expect(() => wilcoxonSignedRank([1, Number.NaN])).toThrow(/^differences/);
    expect(() => wilcoxonSignedRank([Number.POSITIVE_INFINITY])).toThrow(RangeError);
  });
});
