import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { clopperPearsonInterval } from '../../src/stats/clopperPearsonInterval.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

/** P(X ≤ x) of the binomial distribution, summed term by term: the definition the interval inverts. */
function binomialBelow(x: number, n: number, p: number): number {
  let term = (1 - p) ** n;
  let sum = term;
  for (let i = 1; i <= x; i++) {
    term *= ((n - i + 1) / i) * (p / (1 - p));
    sum += term;
  }
  return sum;
}

describe('clopperPearsonInterval', () => {
  referenceTests<{ x: number; n: number; conf: number }>('proportion', ({ x, n, conf }) => {
    const { lower, upper } = clopperPearsonInterval(x, n, conf);
    return { cp_lo: lower, cp_hi: upper };
  });

  test.each([
    [81, 263, 0.2527, 0.3676],
    [15, 148, 0.0578, 0.1617],
    [0, 20, 0, 0.1684],
    [1, 29, 0.0009, 0.1776],
  ])('Newcombe 1998, Table I (from memory): %i of %i', (x, n, lower, upper) => {
    const interval = clopperPearsonInterval(x, n);
    expect(interval.lower).toBeCloseTo(lower, 4);
    expect(interval.upper).toBeCloseTo(upper, 4);
  });

  test('at each end, the binomial tail is exactly half of what the confidence leaves over', () => {
    fc.assert(
      fc.property(
        fc
          .integer({ min: 2, max: 60 })
          .chain((n) => fc.tuple(fc.integer({ min: 1, max: n - 1 }), fc.constant(n))),
        fc.constantFrom(0.8, 0.9, 0.95, 0.99),
        ([x, n], confidence) => {
          const { lower, upper } = clopperPearsonInterval(x, n, confidence);
          expectNear(1 - binomialBelow(x - 1, n, lower), (1 - confidence) / 2, 1e-8);
          expectNear(binomialBelow(x, n, upper), (1 - confidence) / 2, 1e-8);
        },
      ),
    );
  });

  test('lies in 0–1, holds the share, mirrors the failures', () => {
    fc.assert(
      fc.property(
        fc
          .integer({ min: 1, max: 2000 })
          .chain((n) => fc.tuple(fc.integer({ min: 0, max: n }), fc.constant(n))),
        ([x, n]) => {
          const { lower, upper } = clopperPearsonInterval(x, n);
          expect(lower).toBeGreaterThanOrEqual(0);
          expect(upper).toBeLessThanOrEqual(1);
          expect(lower).toBeLessThanOrEqual(x / n);
          expect(upper).toBeGreaterThanOrEqual(x / n);
          expect(clopperPearsonInterval(n - x, n).lower).toBeCloseTo(1 - upper, 12);
        },
      ),
    );
  });

  test('is undefined without looks; nonsense throws', () => {
    expect(clopperPearsonInterval(0, 0)).toEqual({ lower: Number.NaN, upper: Number.NaN });
    expect(() => clopperPearsonInterval(3, 2)).toThrow(/^successes/);
    expect(() => clopperPearsonInterval(1, 2, 0)).toThrow(RangeError);
  });
});
