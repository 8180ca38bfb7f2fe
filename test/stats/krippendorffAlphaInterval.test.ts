import { describe, expect, test } from 'vitest';
import { krippendorffAlpha } from '../../src/stats/krippendorffAlpha.ts';
import { krippendorffAlphaInterval } from '../../src/stats/krippendorffAlphaInterval.ts';
import { referenceTests } from './referenceCases.ts';
import { testRandom } from './testRandom.ts';

type Row = (string | number | null)[];

/** Every way to draw the units with replacement, as the bootstrap samples them. */
function allDraws(units: Row[]): number[] {
  const alphas: number[] = [];
  const n = units.length;
  for (let code = 0; code < n ** n; code++) {
    const draw = Array.from({ length: n }, (_, i) => units[Math.floor(code / n ** i) % n] as Row);
    const alpha = krippendorffAlpha(draw);
    if (!Number.isNaN(alpha)) alphas.push(alpha);
  }
  return alphas.sort((a, b) => a - b);
}

describe('krippendorffAlphaInterval', () => {
  referenceTests<{ data: Row[] }>('alpha', ({ data }) => {
    const units = (data[0] as Row).map((_, u) => data.map((observer) => observer[u] ?? null));
    return { alpha: krippendorffAlphaInterval(units, { random: testRandom(1), draws: 10 }).alpha };
  });

  test('many draws come close to the percentiles over all 3125 draws of five units', () => {
    const units: Row[] = [
      ['on', 'on'],
      ['off', 'off'],
      ['on', 'off'],
      ['on', 'on'],
      ['off', 'off'],
    ];
    const exact = allDraws(units);
    const got = krippendorffAlphaInterval(units, { random: testRandom(3), draws: 20000, confidence: 0.5 });
    expect(got.lower).toBeCloseTo(exact[Math.round(0.25 * (exact.length - 1))] as number, 1);
    expect(got.upper).toBeCloseTo(exact[Math.round(0.75 * (exact.length - 1))] as number, 1);
  });

  test('the same generator gives the same interval; more confidence a wider one; alpha usually inside', () => {
    const random = testRandom(5);
    const units: Row[] = Array.from({ length: 120 }, () => {
      const first = random() < 0.6 ? 1 : 0;
      return [first, random() < 0.85 ? first : 1 - first, random() < 0.1 ? null : first];
    });
    const at = (confidence: number) =>
      krippendorffAlphaInterval(units, { random: testRandom(9), draws: 500, confidence });
    expect(at(0.9)).toEqual(at(0.9));
    expect(at(0.99).upper - at(0.99).lower).toBeGreaterThan(at(0.8).upper - at(0.8).lower);
    expect(at(0.95).lower).toBeLessThan(at(0.95).alpha);
    expect(at(0.95).upper).toBeGreaterThan(at(0.95).alpha);
  });

  test('draws with one code only are passed over; without disagreement all bounds are 1', () => {
    const got = krippendorffAlphaInterval(
      [
        ['a', 'a'],
        ['b', 'b'],
      ],
      { random: testRandom(2), draws: 50 },
    );
    expect(got).toEqual({ alpha: 1, lower: 1, upper: 1 });
  });

  test('is undefined where alpha is', () => {
    const got = krippendorffAlphaInterval([['a', 'a']], { random: testRandom(2) });
    expect(got).toEqual({ alpha: Number.NaN, lower: Number.NaN, upper: Number.NaN });
  });

  test('nonsense throws and names the argument', () => {
    const random = testRandom(1);
    expect(() => krippendorffAlphaInterval([[1, 2]], { random, draws: 0 })).toThrow(/^draws/);
    const noRandom = { draws: 9 } as unknown as { random: () => number };
    expect(() => krippendorffAlphaInterval([[1, 2]], noRandom)).toThrow(/^random/);
    expect(() => krippendorffAlphaInterval([[1, 2]], { random, confidence: 1 })).toThrow(/^confidence/);
    expect(() => krippendorffAlphaInterval([[1, 2], [1]], { random })).toThrow(RangeError);
  });
});
