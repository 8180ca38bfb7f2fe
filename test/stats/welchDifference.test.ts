import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { welchDifference } from '../../src/stats/welchDifference.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

interface Arm {
  before: number[];
  after: number[];
}

const gains = ({ before, after }: Arm): number[] => after.map((score, i) => score - (before[i] as number));

describe('welchDifference', () => {
  referenceTests<{ g1: Arm; g2: Arm; conf: number }>('independent_change', ({ g1, g2, conf }) => {
    const did = welchDifference(gains(g1), gains(g2), conf);
    const post = welchDifference(g1.after, g2.after, conf);
    return {
      did: did.difference,
      welch_se: did.standardError,
      welch_t: did.t,
      welch_df: did.df,
      welch_p: did.p,
      welch_ci_lo: did.lower,
      welch_ci_hi: did.upper,
      post_mean_difference: post.difference,
      post_welch_se: post.standardError,
      post_welch_t: post.t,
      post_welch_df: post.df,
      post_welch_p: post.p,
      post_welch_ci_lo: post.lower,
      post_welch_ci_hi: post.upper,
    };
  });

  test("Student's sleepers as two independent groups: t −1.8608, df 17.776, p .07939 (from memory, the usual textbook run)", () => {
    const got = welchDifference(
      [0.7, -1.6, -0.2, -1.2, -0.1, 3.4, 3.7, 0.8, 0, 2],
      [1.9, 0.8, 1.1, 0.1, -0.1, 4.4, 5.5, 1.6, 4.6, 3.4],
    );
    expect(got.t).toBeCloseTo(-1.8608, 4);
    expect(got.df).toBeCloseTo(17.776, 3);
    expect(got.p).toBeCloseTo(0.07939, 5);
  });

  test('turns its sign when the groups change places; a shift of one group moves it by that much', () => {
    const group = fc.array(fc.integer({ min: -50, max: 50 }), { minLength: 2, maxLength: 20 });
    fc.assert(
      fc.property(group, group, fc.integer({ min: -9, max: 9 }), (a, b, shift) => {
        const there = welchDifference(a, b);
        const back = welchDifference(b, a);
        expectNear(back.difference, -there.difference);
        const moved = welchDifference(
          a.map((x) => x + shift),
          b,
        );
        expectNear(moved.difference, there.difference + shift);
        if (Number.isNaN(there.df)) return;
        expectNear(back.df, there.df);
        expectNear(back.lower, -there.upper, 1e-9);
        expect(there.df).toBeGreaterThanOrEqual(Math.min(a.length, b.length) - 1 - 1e-9);
        expect(there.df).toBeLessThanOrEqual(a.length + b.length - 2 + 1e-9);
      }),
    );
  });

  test('without any spread, or with a lone number, only the difference is defined', () => {
    for (const [a, b] of [
      [
        [5, 5],
        [3, 3, 3],
      ],
      [[5], [3, 4]],
      [[5], [3]],
    ] as const) {
      const got = welchDifference(a, b);
      expect(got.difference).toBeGreaterThan(0);
      for (const figure of ['standardError', 't', 'df', 'p', 'lower', 'upper'] as const)
        expect(got[figure]).toBeNaN();
    }
    expect(welchDifference([], [1]).difference).toBeNaN();
  });

  test('nonsense throws and names the argument', () => {
    expect(() => welchDifference([Number.NaN], [1])).toThrow(/^a:/);
    expect(() => welchDifference([1], [Number.POSITIVE_INFINITY])).toThrow(/^b:/);
    expect(() => welchDifference([1, 2], [1, 3], 2)).toThrow(RangeError);
  });
});
