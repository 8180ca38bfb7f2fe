import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { krippendorffAlpha } from '../../src/stats/krippendorffAlpha.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

type Row = (string | number | null)[];

const someUnits = fc.integer({ min: 2, max: 4 }).chain((observers) =>
  fc.array(
    fc.array(fc.option(fc.integer({ min: 0, max: 3 }), { nil: null, freq: 6 }), {
      minLength: observers,
      maxLength: observers,
    }),
    { maxLength: 30 },
  ),
);

/** Second formula: the mean squared-difference form over all ordered pairs, straight from the definition. */
function alphaByPairs(units: Row[]): number {
  const pairable = units
    .map((unit) => unit.filter((code) => code !== null))
    .filter((unit) => unit.length > 1);
  const all = pairable.flat();
  let observed = 0;
  for (const unit of pairable) {
    for (let i = 0; i < unit.length; i++) {
      for (let j = 0; j < unit.length; j++)
        if (i !== j && unit[i] !== unit[j]) observed += 1 / (unit.length - 1);
    }
  }
  let expected = 0;
  for (let i = 0; i < all.length; i++) {
    for (let j = 0; j < all.length; j++) if (i !== j && all[i] !== all[j]) expected += 1 / (all.length - 1);
  }
  return expected === 0 ? Number.NaN : 1 - observed / expected;
}

function same(got: number, want: number): void {
  if (Number.isNaN(want)) expect(got).toBeNaN();
  else expectNear(got, want);
}

describe('krippendorffAlpha', () => {
  referenceTests<{ data: Row[] }>('alpha', ({ data }) => {
    const units = (data[0] as Row).map((_, u) => data.map((observer) => observer[u] ?? null));
    return { alpha: krippendorffAlpha(units) };
  });

  test('agrees with the form over all pairs of values', () => {
    fc.assert(fc.property(someUnits, (units) => same(krippendorffAlpha(units), alphaByPairs(units))));
  });

  test('does not change when units, observers or codes are permuted, nor by lone values', () => {
    fc.assert(
      fc.property(someUnits, (units) => {
        const alpha = krippendorffAlpha(units);
        same(krippendorffAlpha([...units].reverse()), alpha);
        same(krippendorffAlpha(units.map((unit) => [...unit].reverse())), alpha);
        same(
          krippendorffAlpha(units.map((unit) => unit.map((code) => (code === null ? null : `c${3 - code}`)))),
          alpha,
        );
        const lone = units.map((unit) => unit.map((_, i) => (i === 0 ? 9 : null)));
        same(krippendorffAlpha([...units, ...lone]), alpha);
      }),
    );
  });

  test('is exactly 1 for identical records with two codes', () => {
    expect(
      krippendorffAlpha([
        [1, 1, 1],
        [2, 2, null],
        [1, 1, 1],
      ]),
    ).toBe(1);
  });

  test('is undefined for one code, nothing pairable, nothing at all', () => {
    expect(
      krippendorffAlpha([
        ['on', 'on'],
        ['on', 'on'],
      ]),
    ).toBeNaN();
    expect(
      krippendorffAlpha([
        [1, null],
        [null, 2],
      ]),
    ).toBeNaN();
    expect(krippendorffAlpha([[null, null]])).toBeNaN();
    expect(krippendorffAlpha([])).toBeNaN();
  });

  test('ragged units throw', () => {
    expect(() => krippendorffAlpha([[1, 2], [1]])).toThrow(/^units/);
    expect(() => krippendorffAlpha([[1, 2], [1]])).toThrow(RangeError);
  });
});
