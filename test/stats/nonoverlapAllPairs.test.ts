import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { nonoverlapAllPairs } from '../../src/stats/nonoverlapAllPairs.ts';
import { expectNear } from './near.ts';
import { handA, handB, improving, type Phases, phase, present } from './nonoverlapCases.ts';
import { referenceTests } from './referenceCases.ts';

describe('nonoverlapAllPairs', () => {
  referenceTests<Phases>('nonoverlap', (input) => ({ nap: nonoverlapAllPairs(...improving(input)) }));

  test('by hand: .98', () => {
    expectNear(nonoverlapAllPairs(handA, handB), 0.98);
  });

  test('vignette of the SingleCaseES package (Swan, Pustejovsky, Grekov): .9166667', () => {
    const nap = nonoverlapAllPairs([20, 20, 26, 25, 22, 23], [28, 25, 24, 27, 30, 30, 29]);
    expect(nap).toBeCloseTo(0.9166667, 7);
  });

  test('NAP(a, b) + NAP(b, a) = 1; in 0–1; the order of sessions and missing ones do not matter', () => {
    fc.assert(
      fc.property(phase, phase, (a, b) => {
        const nap = nonoverlapAllPairs(a, b);
        if (present(a).length === 0 || present(b).length === 0) {
          expect(nap).toBeNaN();
          return;
        }
        expectNear(nap + nonoverlapAllPairs(b, a), 1);
        expect(nap).toBeGreaterThanOrEqual(0);
        expect(nap).toBeLessThanOrEqual(1);
        expect(nonoverlapAllPairs([...a].reverse(), present(b))).toBe(nap);
      }),
    );
  });

  test('an empty phase is undefined; nonsense throws', () => {
    expect(nonoverlapAllPairs([], [1])).toBeNaN();
    expect(nonoverlapAllPairs([1], [null])).toBeNaN();
    expect(() => nonoverlapAllPairs([Number.NaN], [1])).toThrow(/^a:/);
    expect(() => nonoverlapAllPairs([1], [Number.POSITIVE_INFINITY])).toThrow(RangeError);
  });
});
