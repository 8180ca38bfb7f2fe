import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { runsTest } from '../../src/stats/runsTest.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

describe('runsTest', () => {
  referenceTests<{ seq: number[] }>('autocorrelation', ({ seq }) => {
    const { runs, expected, z, p } = runsTest(seq);
    return { runs, runs_mean: expected, runs_z: z, runs_p: p };
  });

  test('mean and variance are those of all orders, by exact enumeration', () => {
    for (const [ones, zeros] of [
      [3, 4],
      [2, 6],
      [5, 5],
    ] as const) {
      const n = ones + zeros;
      const counts: number[] = [];
      for (let bits = 0; bits < 2 ** n; bits++) {
        const series = Array.from({ length: n }, (_, i) => (bits >> i) & 1);
        if (series.reduce((x, y) => x + y, 0) === ones) counts.push(runsTest(series).runs);
      }
      const centre = counts.reduce((x, y) => x + y, 0) / counts.length;
      const variance = counts.reduce((sum, x) => sum + (x - centre) ** 2, 0) / counts.length;
      const one = runsTest([...new Array<number>(ones).fill(1), ...new Array<number>(zeros).fill(0)]);
      expectNear(one.expected, centre);
      expectNear(one.z, (2 - centre) / Math.sqrt(variance));
    }
  });

  test('does not change when 0 and 1 change places or time runs backwards', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 1 }), { maxLength: 100 }), (series) => {
        expect(runsTest(series.map((x) => 1 - x))).toEqual(runsTest(series));
        expect(runsTest([...series].reverse())).toEqual(runsTest(series));
      }),
    );
  });

  test('is undefined for a constant series, none, and one of each', () => {
    expect(runsTest([1, 1, 1])).toEqual({ runs: 1, expected: Number.NaN, z: Number.NaN, p: Number.NaN });
    expect(runsTest([])).toEqual({ runs: 0, expected: Number.NaN, z: Number.NaN, p: Number.NaN });
    expect(runsTest([0, 1])).toEqual({ runs: 2, expected: 2, z: Number.NaN, p: Number.NaN });
  });

  test('anything but 0 and 1 throws', () => {
    expect(() => runsTest([0, 2])).toThrow(RangeError);
    expect(() => runsTest([0, 2])).toThrow(/^series/);
  });
});
