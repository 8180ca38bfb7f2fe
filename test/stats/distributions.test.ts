import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import * as d from '../../src/stats/distributions.ts';
import { normalQuantile, twoSidedZ } from '../../src/stats/normalQuantile.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

interface Input {
  fn: 'quantile' | 'cdf';
  dist: string;
  params: [number, number];
  p: number;
  x: number;
}

const quantiles: Record<string, (p: number, a: number, b: number) => number> = {
  norm: normalQuantile,
  t: d.tQuantile,
  chisq: d.chiSquareQuantile,
  f: d.fQuantile,
  beta: d.betaQuantile,
};
const lowerTails: Record<string, (x: number, a: number, b: number) => number> = {
  norm: d.normalCdf,
  t: d.tCdf,
  chisq: d.chiSquareCdf,
  f: d.fCdf,
  beta: d.betaCdf,
};
const upperTails: Record<string, (x: number, a: number, b: number) => number> = {
  norm: (x) => d.normalCdf(-x),
  t: (x, df) => d.tCdf(-x, df),
  chisq: d.chiSquareUpper,
  f: d.fUpper,
  beta: (x, a, b) => d.betaCdf(1 - x, b, a),
};

describe('distributions', () => {
  referenceTests<Input>('quantiles', ({ fn, dist, params: [a, b], p, x }): Record<string, number> => {
    if (fn === 'quantile') return { value: quantiles[dist]?.(p, a, b) ?? Number.NaN };
    return {
      value: lowerTails[dist]?.(x, a, b) ?? Number.NaN,
      upper: upperTails[dist]?.(x, a, b) ?? Number.NaN,
    };
  });

  test.each([
    [0.25, -0.6744897501960817],
    [0.001, -3.090232306167814],
    [1e-20, -9.262340089798408],
  ])('Wichura 1988, his own check values (from memory): normal quantile at %d', (p, z) => {
    expectNear(normalQuantile(p), z, 1e-15);
  });

  test('the normal quantile is undone by the tail, down to 1e-300', () => {
    fc.assert(
      fc.property(fc.double({ min: -300, max: -0.31, noNaN: true }), (exponent) => {
        const p = 10 ** exponent;
        // One step of z changes the tail by about z²·1e-16.
        expectNear(d.normalCdf(normalQuantile(p)), p, 1e-12);
      }),
    );
    expect(normalQuantile(0)).toBe(Number.NEGATIVE_INFINITY);
    expect(normalQuantile(1)).toBe(Number.POSITIVE_INFINITY);
    expect(normalQuantile(0.5)).toBe(0);
    expect(twoSidedZ(0.95)).toBeCloseTo(1.959963984540054, 14);
    expect(() => normalQuantile(1.1)).toThrow(/^p:/);
  });

  test('t with one degree of freedom is Cauchy, with two it has a closed form; both near the middle and far out', () => {
    for (const p of [1e-300, 1e-20, 1e-5, 0.2, 0.4, 0.4999, 0.499999, 0.500001, 0.6, 0.99, 1 - 1e-10]) {
      const tail = Math.min(p, 1 - p);
      const cauchy = tail < 0.25 ? 1 / Math.tan(Math.PI * tail) : Math.tan(Math.PI * Math.abs(p - 0.5));
      expectNear(d.tQuantile(p, 1), Math.sign(p - 0.5) * cauchy);
      expectNear(d.tQuantile(p, 2), (2 * (p - 0.5)) / Math.sqrt(2 * tail * (1 - tail)), 1e-9);
    }
  });

  test('near the middle, t of a million degrees of freedom is nearly normal', () => {
    for (const p of [0.499999, 0.49999, 0.41, 0.500001]) {
      const z = normalQuantile(p);
      expectNear(d.tQuantile(p, 1e6), z * (1 + (z * z + 1) / 4e6), 1e-11);
    }
  });

  test('quantiles undo the tails for many degrees of freedom', () => {
    const df = fc.double({ min: 0.6, max: 3000, noNaN: true });
    fc.assert(
      fc.property(fc.double({ min: -12, max: -0.302, noNaN: true }), df, df, (exponent, a, b) => {
        const p = 10 ** exponent;
        expectNear(d.chiSquareCdf(d.chiSquareQuantile(p, a), a), p, 1e-9);
        expectNear(d.chiSquareUpper(d.chiSquareQuantile(1 - p, a), a), 1 - (1 - p), 1e-9);
        expectNear(d.fCdf(d.fQuantile(p, a, b), a, b), p, 1e-9);
        expectNear(d.betaCdf(d.betaQuantile(p, a, b), a, b), p, 1e-9);
        expectNear(d.tCdf(d.tQuantile(p, a), a), p, 1e-9);
      }),
    );
  });

  test('chi-square with two degrees of freedom is exponential, in both tails', () => {
    for (const x of [1e-12, 0.1, 1, 5, 40, 700, 1400]) {
      expectNear(d.chiSquareCdf(x, 2), -Math.expm1(-x / 2), 1e-13);
      expectNear(d.chiSquareUpper(x, 2), Math.exp(-x / 2), 1e-12);
    }
    expect(d.chiSquareUpper(0, 3)).toBe(1);
    expect(d.chiSquareCdf(Number.POSITIVE_INFINITY, 3)).toBe(1);
  });

  test('chi-square of a million degrees of freedom at its lower 1e-10 point (summed to 40 digits)', () => {
    expectNear(d.chiSquareCdf(991029.9997743246, 1e6), 1.0000000001902345e-10, 1e-11);
  });

  test('parameters that are not positive are undefined', () => {
    expect(d.tQuantile(0.9, 0)).toBeNaN();
    expect(d.twoSidedT(0.95, 0)).toBeNaN();
    expect(d.chiSquareUpper(3, 0)).toBeNaN();
    expect(d.fQuantile(0.9, -1, 2)).toBeNaN();
    expect(d.normalTwoSided(Number.NaN)).toBeNaN();
  });
});
