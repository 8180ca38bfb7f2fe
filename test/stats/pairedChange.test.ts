import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { pairedChange } from '../../src/stats/pairedChange.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

describe('pairedChange', () => {
  referenceTests<{ before: number[]; after: number[]; conf: number }>(
    'paired_change',
    ({ before, after, conf }) => {
      const got = pairedChange(before, after, conf);
      return {
        n: got.n,
        mean_before: got.meanBefore,
        mean_after: got.meanAfter,
        mean_diff: got.change,
        sd_diff: got.sdChange,
        se: got.standardError,
        df: got.df,
        t: got.t,
        p: got.p,
        ci_lo: got.lower,
        ci_hi: got.upper,
      };
    },
  );

  test('Student 1908: t 4.0621, df 9, p .002833, interval 0.700 to 2.460', () => {
    const got = pairedChange(
      [0.7, -1.6, -0.2, -1.2, -0.1, 3.4, 3.7, 0.8, 0, 2],
      [1.9, 0.8, 1.1, 0.1, -0.1, 4.4, 5.5, 1.6, 4.6, 3.4],
    );
    expect(got.t).toBeCloseTo(4.0621, 4);
    expect(got.df).toBe(9);
    expect(got.p).toBeCloseTo(0.002833, 6);
    expect(got.lower).toBeCloseTo(0.7, 3);
    expect(got.upper).toBeCloseTo(2.46, 3);
  });

  test('six children by hand: 74.0741 → 87.9167, SD 14.1011, t(5) = 2.4046, p .0613, −0.956 to 28.641', () => {
    const got = pairedChange([70, 80, 50, 800 / 9, 500 / 9, 100], [90, 90, 70, 100, 87.5, 90]);
    expect(got.meanBefore).toBeCloseTo(74.0741, 4);
    expect(got.meanAfter).toBeCloseTo(87.9167, 4);
    expect(got.change).toBeCloseTo(13.8426, 4);
    expect(got.sdChange).toBeCloseTo(14.1011, 4);
    expect(got.t).toBeCloseTo(2.4046, 4);
    expect(got.p).toBeCloseTo(0.0613, 4);
    expect(got.lower).toBeCloseTo(-0.956, 3);
    expect(got.upper).toBeCloseTo(28.641, 3);
  });

  test('turns its sign when before and after change places', () => {
    const pair = fc.tuple(fc.integer({ min: 0, max: 1000 }), fc.integer({ min: 0, max: 1000 }));
    fc.assert(
      fc.property(fc.array(pair, { minLength: 2, maxLength: 40 }), (pairs) => {
        const before = pairs.map(([x]) => x / 10);
        const after = pairs.map(([, y]) => y / 10);
        const there = pairedChange(before, after);
        const back = pairedChange(after, before);
        expectNear(back.change, -there.change);
        expectNear(back.lower, -there.upper, 1e-9);
        expectNear(back.sdChange, there.sdChange);
        if (Number.isNaN(there.t)) expect(back.t).toBeNaN();
        else expectNear(back.p, there.p, 1e-9);
      }),
    );
  });

  test('equal changes written as decimals have no spread: t and p undefined, limits at the change', () => {
    const got = pairedChange([0.1, 0.2, 0.7], [0.2, 0.3, 0.8]);
    expect(got.sdChange).toBe(0);
    expect(got.t).toBeNaN();
    expect(got.p).toBeNaN();
    expect(got.lower).toBe(got.change);
    expect(got.upper).toBe(got.change);
  });

  test('one pair has a change and no spread; no pair has nothing', () => {
    const one = pairedChange([50], [60]);
    expect(one).toMatchObject({ n: 1, change: 10, df: 0 });
    for (const figure of ['sdChange', 'standardError', 't', 'p', 'lower', 'upper'] as const)
      expect(one[figure]).toBeNaN();
    const none = pairedChange([], []);
    expect(none.n).toBe(0);
    expect(none.change).toBeNaN();
    expect(none.df).toBeNaN();
  });

  test('nonsense throws and names the argument', () => {
    expect(() => pairedChange([1], [1, 2])).toThrow(/^before, after/);
    expect(() => pairedChange([Number.NaN], [1])).toThrow(/^before/);
    expect(() => pairedChange([1], [Number.POSITIVE_INFINITY])).toThrow(/^after/);
    expect(() => pairedChange([1, 2], [1, 2], 1.5)).toThrow(RangeError);
  });
});
