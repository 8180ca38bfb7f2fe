import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { twoSidedZ } from '../../src/stats/normalQuantile.ts';
import { riskDifference } from '../../src/stats/riskDifference.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

describe('riskDifference', () => {
  referenceTests<{ x1: number; n1: number; x2: number; n2: number; conf: number }>(
    'odds',
    ({ x1, n1, x2, n2, conf }) => {
      const { estimate, variance } = riskDifference([
        [x1, n1 - x1],
        [x2, n2 - x2],
      ]);
      const half = twoSidedZ(conf) * Math.sqrt(variance);
      return { rd: estimate, rd_var: variance, rd_ci_lo: estimate - half, rd_ci_hi: estimate + half };
    },
  );

  test('the doctors’ trial of aspirin: .0077, interval .0047 to .0107 (Agresti, from memory)', () => {
    const { estimate, variance } = riskDifference([
      [189, 10845],
      [104, 10933],
    ]);
    expect(estimate).toBeCloseTo(0.0077, 4);
    expect(estimate - 1.96 * Math.sqrt(variance)).toBeCloseTo(0.0047, 4);
    expect(estimate + 1.96 * Math.sqrt(variance)).toBeCloseTo(0.0107, 4);
  });

  test('turns its sign when rows or columns change places and lies in −1…1', () => {
    const count = fc.integer({ min: 0, max: 200 });
    fc.assert(
      fc.property(count, count, count, count, (a, b, c, d) => {
        if (a + b === 0 || c + d === 0) return;
        const { estimate, variance } = riskDifference([
          [a, b],
          [c, d],
        ]);
        expect(Math.abs(estimate)).toBeLessThanOrEqual(1);
        expectNear(
          riskDifference([
            [c, d],
            [a, b],
          ]).estimate,
          -estimate,
        );
        expectNear(
          riskDifference([
            [b, a],
            [d, c],
          ]).estimate,
          -estimate,
        );
        expectNear(
          riskDifference([
            [b, a],
            [d, c],
          ]).variance,
          variance,
        );
      }),
    );
  });

  test('an empty group is undefined; nonsense throws', () => {
    expect(
      riskDifference([
        [0, 0],
        [3, 4],
      ]),
    ).toEqual({ estimate: Number.NaN, variance: Number.NaN });
    expect(
      riskDifference([
        [5, 0],
        [0, 7],
      ]),
    ).toEqual({ estimate: 1, variance: 0 });
    expect(() => riskDifference([[1, 2]])).toThrow(/^table2x2/);
    expect(() =>
      riskDifference([
        [1, 2],
        [3, Number.NaN],
      ]),
    ).toThrow(RangeError);
  });
});
