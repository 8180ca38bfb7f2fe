import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { proportionChart } from '../../src/stats/proportionChart.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

describe('proportionChart', () => {
  referenceTests<{ x: number[]; n: number[] }>('control_chart', ({ x, n }) => {
    const { centre, points } = proportionChart(x, n);
    const figures: Record<string, number> = { center: centre };
    points.forEach(({ lower, upper, outside }, i) => {
      figures[`lcl.${i}`] = lower;
      figures[`ucl.${i}`] = upper;
      figures[`out.${i}`] = Number(outside);
    });
    return figures;
  });

  test('the orange-juice cans of Montgomery, 30 samples of 50: centre .2313, limits .0524 and .4102, samples 15 and 23 outside (from memory)', () => {
    const bad = [
      12, 15, 8, 10, 4, 7, 16, 9, 14, 10, 5, 6, 17, 12, 22, 8, 10, 5, 13, 11, 20, 18, 24, 15, 9, 12, 7, 13, 9,
      6,
    ];
    const { centre, points } = proportionChart(
      bad,
      bad.map(() => 50),
    );
    expect(centre).toBeCloseTo(0.2313, 4);
    expect(points[0]?.lower).toBeCloseTo(0.0524, 4);
    expect(points[0]?.upper).toBeCloseTo(0.4102, 4);
    expect(points.flatMap(({ outside }, i) => (outside ? [i + 1] : []))).toEqual([15, 23]);
  });

  test('limits hold the centre, lie in 0–1 and mirror when failures are counted', () => {
    const session = fc
      .integer({ min: 1, max: 200 })
      .chain((n) => fc.tuple(fc.integer({ min: 0, max: n }), fc.constant(n)));
    fc.assert(
      fc.property(fc.array(session, { minLength: 1, maxLength: 20 }), (sessions) => {
        const ns = sessions.map(([, n]) => n);
        const chart = proportionChart(
          sessions.map(([x]) => x),
          ns,
        );
        const mirrored = proportionChart(
          sessions.map(([x, n]) => n - x),
          ns,
        );
        chart.points.forEach(({ lower, upper, outside }, i) => {
          expect(lower).toBeGreaterThanOrEqual(0);
          expect(upper).toBeLessThanOrEqual(1);
          expect(lower).toBeLessThanOrEqual(chart.centre);
          expect(upper).toBeGreaterThanOrEqual(chart.centre);
          expectNear(mirrored.points[i]?.lower as number, 1 - upper, 1e-9);
          expect(mirrored.points[i]?.outside).toBe(outside);
        });
      }),
    );
  });

  test('a session without looks is undefined and leaves the others alone', () => {
    const { centre, points } = proportionChart([5, 0, 8], [10, 0, 10]);
    expect(centre).toBeCloseTo(0.65, 12);
    expect(points[1]).toEqual({ p: Number.NaN, lower: Number.NaN, upper: Number.NaN, outside: false });
    expect(proportionChart([], [])).toEqual({ centre: Number.NaN, points: [] });
    expect(proportionChart([0], [0]).centre).toBeNaN();
  });

  test('nonsense throws and names the argument', () => {
    expect(() => proportionChart([1], [1, 2])).toThrow(/^counts, ns/);
    expect(() => proportionChart([3], [2])).toThrow(/^counts/);
    expect(() => proportionChart([0], [-1])).toThrow(/^ns/);
    expect(() => proportionChart([-1], [2])).toThrow(RangeError);
  });
});
