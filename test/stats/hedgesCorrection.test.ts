import gammaln from '@stdlib/math-base-special-gammaln';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { hedgesCorrection } from '../../src/stats/hedgesCorrection.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

describe('hedgesCorrection', () => {
  referenceTests<{ before: number[] }>('paired_change', ({ before }) => ({
    J_exact: hedgesCorrection(before.length - 1),
  }));

  referenceTests<{ g1: { before: number[] }; g2: { before: number[] } }>(
    'independent_change',
    ({ g1, g2 }) => ({
      J_exact: hedgesCorrection(g1.before.length + g2.before.length - 2),
    }),
  );

  test.each([
    [2, 0.5642],
    [4, 0.7979],
    [9, 0.9139],
    [10, 0.9228],
  ])('printed values (Hedges & Olkin 1985, table of c(m), from memory): df %i', (df, j) => {
    expect(hedgesCorrection(df)).toBeCloseTo(j, 3);
  });

  test('is the ratio of gamma functions', () => {
    fc.assert(
      fc.property(fc.double({ min: 1.01, max: 300, noNaN: true }), (df) => {
        const direct = Math.exp(gammaln(df / 2) - gammaln((df - 1) / 2)) / Math.sqrt(df / 2);
        expectNear(hedgesCorrection(df), direct);
      }),
    );
  });

  test('rises to 1, close to 1 − 3/(4 df − 1)', () => {
    let last = 0;
    for (let df = 2; df < 3000; df = Math.ceil(df * 1.3)) {
      const j = hedgesCorrection(df);
      expect(j).toBeGreaterThan(last);
      expect(j).toBeLessThan(1);
      expect(Math.abs(j - (1 - 3 / (4 * df - 1)))).toBeLessThan(0.04 / df ** 2);
      last = j;
    }
    expectNear(hedgesCorrection(1e6), 1 - 3 / (4e6 - 1), 1e-13);
    expect(hedgesCorrection(Number.POSITIVE_INFINITY)).toBe(1);
  });

  test('is undefined for one degree of freedom or fewer; negative throws', () => {
    for (const df of [0, 0.5, 1, Number.NaN]) expect(hedgesCorrection(df)).toBeNaN();
    expect(() => hedgesCorrection(-1)).toThrow(RangeError);
    expect(() => hedgesCorrection(-1)).toThrow(/^df/);
  });
});
