import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { logOddsRatio } from '../../src/stats/logOddsRatio.ts';
import { twoSidedZ } from '../../src/stats/normalQuantile.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

describe('logOddsRatio', () => {
  referenceTests<{ x1: number; n1: number; x2: number; n2: number; conf: number }>(
    'odds',
    ({ x1, n1, x2, n2, conf }) => {
      const { estimate, variance } = logOddsRatio([
        [x1, n1 - x1],
        [x2, n2 - x2],
      ]);
      const half = twoSidedZ(conf) * Math.sqrt(variance);
      return {
        log_or: estimate,
        log_or_var: variance,
        log_or_ci_lo: estimate - half,
        log_or_ci_hi: estimate + half,
      };
    },
  );

  test('the doctors’ trial of aspirin, 189/11034 against 104/11037: odds ratio 1.832, interval 1.440 to 2.331 (Agresti, from memory)', () => {
    const { estimate, variance } = logOddsRatio([
      [189, 10845],
      [104, 10933],
    ]);
    expect(Math.exp(estimate)).toBeCloseTo(1.832, 3);
    expect(Math.exp(estimate - 1.96 * Math.sqrt(variance))).toBeCloseTo(1.44, 2);
    expect(Math.exp(estimate + 1.96 * Math.sqrt(variance))).toBeCloseTo(2.331, 2);
  });

  test('turns its sign when rows or columns change places, also with empty cells', () => {
    const count = fc.integer({ min: 0, max: 200 });
    fc.assert(
      fc.property(count, count, count, count, (a, b, c, d) => {
        if (a + b === 0 || c + d === 0) return;
        const { estimate, variance } = logOddsRatio([
          [a, b],
          [c, d],
        ]);
        expect(Number.isFinite(estimate)).toBe(true);
        expectNear(
          logOddsRatio([
            [c, d],
            [a, b],
          ]).estimate,
          -estimate,
        );
        expectNear(
          logOddsRatio([
            [b, a],
            [d, c],
          ]).estimate,
          -estimate,
        );
        expectNear(
          logOddsRatio([
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
      logOddsRatio([
        [0, 0],
        [3, 4],
      ]),
    ).toEqual({ estimate: Number.NaN, variance: Number.NaN });
    expect(() =>
      logOddsRatio([
        [1, 2],
        [3, -4],
      ]),
    ).toThrow(/^table2x2/);
    expect(() =>
      logOddsRatio([
        [1, 2, 3],
        [1, 2, 3],
        [1, 2, 3],
      ]),
    ).toThrow(RangeError);
  });
});
