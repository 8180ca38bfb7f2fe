import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { logResponseRatio } from '../../src/stats/logResponseRatio.ts';
import { expectNear } from './near.ts';
import { handA, handB, type Phases } from './nonoverlapCases.ts';
import { referenceTests } from './referenceCases.ts';

describe('logResponseRatio', () => {
  // The file gives it unturned also where less is better.
  referenceTests<Phases>('nonoverlap', ({ A, B }) => {
    const { estimate, standardError } = logResponseRatio(A, B);
    return { lrr_r2: estimate, lrr_se: standardError };
  });

  test('by hand: means 66 and 75.6, ln ratio .1358, corrected .13583, error .03126', () => {
    const { estimate, standardError } = logResponseRatio(handA, handB);
    expect(estimate).toBeCloseTo(0.13583, 5);
    expect(standardError).toBeCloseTo(0.03126, 5);
  });

  test('turns its sign when the phases change places and keeps with the unit of the scores', () => {
    const scores = fc.array(fc.integer({ min: 1, max: 100 }), { minLength: 2, maxLength: 12 });
    fc.assert(
      fc.property(scores, scores, (a, b) => {
        const { estimate, standardError } = logResponseRatio(a, b);
        expectNear(logResponseRatio(b, a).estimate, -estimate);
        expectNear(logResponseRatio(b, a).standardError, standardError);
        const tenths = logResponseRatio(
          a.map((x) => x / 10),
          b.map((x) => x / 10),
        );
        expectNear(tenths.estimate, estimate);
      }),
    );
  });

  test('is undefined for a mean of 0 or below and fewer than two scores; nonsense throws', () => {
    const none = { estimate: Number.NaN, standardError: Number.NaN };
    expect(logResponseRatio([0, 0], [10, 20])).toEqual(none);
    expect(logResponseRatio([-5, 1], [10, 20])).toEqual(none);
    expect(logResponseRatio([5], [10, 20])).toEqual(none);
    expect(logResponseRatio([], [10, 20])).toEqual(none);
    expect(() => logResponseRatio([Number.NaN], [1])).toThrow(/^a:/);
    expect(() => logResponseRatio([1], [Number.NaN])).toThrow(RangeError);
  });
});
