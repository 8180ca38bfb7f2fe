import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { lagOneAutocorrelation } from '../../src/stats/lagOneAutocorrelation.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

describe('lagOneAutocorrelation', () => {
  referenceTests<{ seq: number[] }>('autocorrelation', ({ seq }) => ({ r1: lagOneAutocorrelation(seq) }));

  test('the first chemical yields of Box & Jenkins 1970, series F: r1 = −.39 (from memory)', () => {
    const yields = [
      47, 64, 23, 71, 38, 64, 55, 41, 59, 48, 71, 35, 57, 40, 58, 44, 80, 55, 37, 74, 51, 57, 50, 60, 45, 57,
      50, 45, 25, 59, 50, 71, 56, 74, 50, 58, 45, 54, 36, 54, 48, 55, 45, 57, 50, 62, 44, 64, 43, 52, 38, 59,
      55, 41, 53, 49, 34, 35, 54, 45, 68, 38, 50, 60, 39, 59, 40, 57, 54, 23,
    ];
    expect(lagOneAutocorrelation(yields)).toBeCloseTo(-0.39, 2);
  });

  test('on and off may change places, time may run backwards, and it lies in −1…1', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 1 }), { minLength: 2, maxLength: 200 }), (series) => {
        const r = lagOneAutocorrelation(series);
        const turned = lagOneAutocorrelation(series.map((x) => 1 - x));
        const back = lagOneAutocorrelation([...series].reverse());
        if (Number.isNaN(r)) {
          expect(turned).toBeNaN();
          return;
        }
        expectNear(turned, r);
        expectNear(back, r);
        expect(Math.abs(r)).toBeLessThanOrEqual(1);
      }),
    );
  });

  test('is undefined for a constant series, one look, none; text-like nonsense throws', () => {
    for (const series of [[1, 1, 1], [0], [], [0.1, 0.1, 0.1]])
      expect(lagOneAutocorrelation(series)).toBeNaN();
    expect(() => lagOneAutocorrelation([1, Number.NaN])).toThrow(RangeError);
    expect(() => lagOneAutocorrelation([1, Number.NaN])).toThrow(/^series/);
  });
});
