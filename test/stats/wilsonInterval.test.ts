import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { wilsonInterval } from '../../src/stats/wilsonInterval.ts';
import { referenceTests } from './referenceCases.ts';

describe('wilsonInterval', () => {
  referenceTests<{ x: number; n: number; conf: number }>('proportion', ({ x, n, conf }) => {
    const { lower, upper } = wilsonInterval(x, n, conf);
    return { wilson_lo: lower, wilson_hi: upper };
  });

  test.each([
    [81, 263, 0.2553, 0.3662],
    [15, 148, 0.0624, 0.1605],
    [0, 20, 0, 0.1611],
    [1, 29, 0.0061, 0.1718],
  ])('Newcombe 1998, Table I (from memory): %i of %i', (x, n, lower, upper) => {
    const interval = wilsonInterval(x, n);
    expect(interval.lower).toBeCloseTo(lower, 4);
    expect(interval.upper).toBeCloseTo(upper, 4);
  });

  test.each([
    [16, 20, 0.584, 0.919],
    [24, 30, 0.627, 0.905],
    [48, 60, 0.682, 0.882],
    [96, 120, 0.72, 0.862],
    [10, 10, 0.722, 1],
    [0, 10, 0, 0.278],
  ])('derived from the formula by hand: %i of %i', (x, n, lower, upper) => {
    const interval = wilsonInterval(x, n);
    expect(interval.lower).toBeCloseTo(lower, 3);
    expect(interval.upper).toBeCloseTo(upper, 3);
  });

  test('lies in 0–1, holds the share, mirrors the failures', () => {
    fc.assert(
      fc.property(
        fc
          .integer({ min: 1, max: 100000 })
          .chain((n) => fc.tuple(fc.integer({ min: 0, max: n }), fc.constant(n))),
        fc.double({ min: 0.01, max: 0.999, noNaN: true }),
        ([x, n], confidence) => {
          const { lower, upper } = wilsonInterval(x, n, confidence);
          expect(lower).toBeGreaterThanOrEqual(0);
          expect(upper).toBeLessThanOrEqual(1);
          expect(lower).toBeLessThanOrEqual(x / n + 1e-15);
          expect(upper).toBeGreaterThanOrEqual(x / n - 1e-15);
          const mirrored = wilsonInterval(n - x, n, confidence);
          expect(mirrored.lower).toBeCloseTo(1 - upper, 12);
        },
      ),
    );
  });

  test('is undefined without looks', () => {
    expect(wilsonInterval(0, 0)).toEqual({ lower: Number.NaN, upper: Number.NaN });
  });

  test('nonsense throws and names the argument', () => {
    expect(() => wilsonInterval(-1, 5)).toThrow(/^successes/);
    expect(() => wilsonInterval(6, 5)).toThrow(RangeError);
    expect(() => wilsonInterval(1, -5)).toThrow(/^n:/);
    expect(() => wilsonInterval(1, 5, 0)).toThrow(/^confidence/);
    expect(() => wilsonInterval(1, 5, 95)).toThrow(/^confidence/);
    expect(() => wilsonInterval(Number.NaN, 5)).toThrow(/^successes/);
  });
});
