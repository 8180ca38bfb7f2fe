import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { effectiveLooks } from '../../src/stats/effectiveLooks.ts';
import { referenceTests } from './referenceCases.ts';

describe('effectiveLooks', () => {
  referenceTests<{ seq: number[] }>('autocorrelation', ({ seq }, { r1 }) => ({
    n_eff_simple: effectiveLooks(seq.length, (r1 as number | null) ?? Number.NaN),
  }));

  test('is at most n for r ≥ 0, falls with r, and 0 when every look repeats the last', () => {
    const share = fc.double({ min: 0, max: 0.999, noNaN: true });
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 1000 }), share, share, (n, r, s) => {
        expect(effectiveLooks(n, r)).toBeLessThanOrEqual(n);
        expect(effectiveLooks(n, Math.max(r, s))).toBeLessThanOrEqual(effectiveLooks(n, Math.min(r, s)));
      }),
    );
    expect(effectiveLooks(60, 0)).toBe(60);
    expect(effectiveLooks(60, 1)).toBe(0);
  });

  test('is undefined without r, and for looks that alternate without end', () => {
    expect(effectiveLooks(60, Number.NaN)).toBeNaN();
    expect(effectiveLooks(60, -1)).toBeNaN();
  });

  test('nonsense throws and names the argument', () => {
    expect(() => effectiveLooks(-1, 0)).toThrow(/^n:/);
    expect(() => effectiveLooks(60, 1.1)).toThrow(/^r:/);
    expect(() => effectiveLooks(60, -1.1)).toThrow(RangeError);
  });
});
