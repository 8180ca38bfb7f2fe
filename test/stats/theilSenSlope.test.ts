import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { theilSenSlope } from '../../src/stats/theilSenSlope.ts';
import { expectNear } from './near.ts';
import { handA, handB, type Phases } from './nonoverlapCases.ts';
import { referenceTests } from './referenceCases.ts';

describe('theilSenSlope', () => {
  referenceTests<Phases>('nonoverlap', ({ A }) => ({ theil_sen_slope_A: theilSenSlope(A) }), {
    only: ({ A }) => !(A as (number | null)[]).includes(null),
  });

  test('by hand: .833 and .75', () => {
    expect(theilSenSlope(handA)).toBeCloseTo(0.8333, 4);
    expectNear(theilSenSlope(handB), 0.75);
  });

  test('finds the slope of a line with up to a quarter of odd sessions, and a null keeps its place in time', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -9, max: 9 }),
        fc.integer({ min: 8, max: 40 }),
        fc.integer({ min: 0, max: 7 }),
        (slope, n, odd) => {
          const series = Array.from({ length: n }, (_, i): number | null => slope * i + 3);
          series[odd] = null;
          expectNear(theilSenSlope(series), slope);
          series[odd] = 1000;
          expectNear(theilSenSlope(series), slope);
        },
      ),
    );
    expect(theilSenSlope([0, null, null, 6])).toBe(2);
  });

  test('turns its sign when time runs backwards; adds to a line that is added', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 100 }), { minLength: 2, maxLength: 20 }), (series) => {
        const slope = theilSenSlope(series);
        expectNear(theilSenSlope([...series].reverse()), -slope);
        expectNear(theilSenSlope(series.map((y, i) => y + 2 * i)), slope + 2);
      }),
    );
  });

  test('fewer than two scores are undefined; nonsense throws', () => {
    for (const series of [[], [5], [null, 5, null]]) expect(theilSenSlope(series)).toBeNaN();
    expect(() => theilSenSlope([1, Number.NaN])).toThrow(/^series/);
    expect(() => theilSenSlope([1, Number.NaN])).toThrow(RangeError);
  });
});
