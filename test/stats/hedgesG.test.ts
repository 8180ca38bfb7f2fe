import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { hedgesG } from '../../src/stats/hedgesG.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

interface Arm {
  before: number[];
  after: number[];
}

const gains = ({ before, after }: Arm): number[] => after.map((score, i) => score - (before[i] as number));

describe('hedgesG', () => {
  referenceTests<{ g1: Arm; g2: Arm }>('independent_change', ({ g1, g2 }) => {
    const ofGains = hedgesG(gains(g1), gains(g2));
    const post = hedgesG(g1.after, g2.after);
    return { g_exact: ofGains.g, vi_LS: ofGains.variance, post_g_exact: post.g, post_vi_LS: post.variance };
  });

  test('Borenstein et al. 2009, Introduction to meta-analysis, chapter 4: means 103 and 100, SDs 5.5 and 4.5, 50 each: g .5924 (from memory; the book’s variance is another form)', () => {
    // Numbers with exactly these means and standard deviations.
    const group = (mean: number, sd: number): number[] =>
      Array.from({ length: 50 }, (_, i) => mean + (i % 2 === 0 ? 1 : -1) * sd * Math.sqrt(49 / 50));
    const { g } = hedgesG(group(103, 5.5), group(100, 4.5));
    expect(g).toBeCloseTo(0.5924, 4);
  });

  test('turns its sign when the groups change places; keeps with unit and origin of the scores', () => {
    const group = fc.array(fc.integer({ min: 0, max: 50 }), { minLength: 2, maxLength: 20 });
    fc.assert(
      fc.property(group, group, (a, b) => {
        const { g, variance } = hedgesG(a, b);
        if (Number.isNaN(g)) return;
        expectNear(hedgesG(b, a).g, -g);
        expectNear(hedgesG(b, a).variance, variance);
        expectNear(
          hedgesG(
            a.map((x) => 4 * x + 8),
            b.map((x) => 4 * x + 8),
          ).g,
          g,
        );
      }),
    );
  });

  test('is undefined with a lone number or without any spread; nonsense throws', () => {
    for (const [a, b] of [
      [[1], [2, 3]],
      [
        [1, 1],
        [2, 2],
      ],
      [[], []],
    ] as const) {
      expect(hedgesG(a, b)).toEqual({ g: Number.NaN, variance: Number.NaN });
    }
    expect(() => hedgesG([Number.NaN], [1])).toThrow(/^a:/);
    expect(() => hedgesG([1], [Number.NaN])).toThrow(RangeError);
  });
});
