import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { gwetAC1 } from '../../src/stats/gwetAC1.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';
import { relabelled, tableAndOrder, transposed } from './tables.ts';

describe('gwetAC1', () => {
  referenceTests<{ table: number[][]; conf: number }>('ac1', ({ table, conf }) => {
    const got = gwetAC1(table, conf);
    return {
      pa: got.observedAgreement,
      pe: got.chanceAgreement,
      ac1: got.ac1,
      se_gwet2008: got.standardError,
      ci_z_lo: got.lower,
      ci_z_hi: got.upper,
    };
  });

  test.each([
    [[40, 9, 6, 45], 0.7007],
    [[80, 10, 5, 5], 0.808],
    [[50, 5, 5, 40], 0.802],
    [[96, 6, 6, 12], 0.8658],
    [[90, 5, 5, 0], 0.8895],
    [[57, 3, 0, 0], 0.9474],
    [[60, 0, 0, 0], 1],
  ])('by hand from the formula: %j', ([a, b, c, d], ac1) => {
    const table = [
      [a as number, b as number],
      [c as number, d as number],
    ];
    // .9474 is cut, not rounded (.94742…), so four places are compared loosely.
    expect(Math.abs(gwetAC1(table).ac1 - ac1)).toBeLessThan(1e-4);
  });

  test('does not change when codes are relabelled or observers change places; a listed unused code changes it', () => {
    fc.assert(
      fc.property(tableAndOrder, ([table, order]) => {
        const { ac1, standardError } = gwetAC1(table);
        for (const other of [relabelled(table, order), transposed(table)]) {
          expectNear(gwetAC1(other).ac1, ac1);
          expect(gwetAC1(other).standardError).toBeCloseTo(standardError, 7);
        }
      }),
    );
    const wider = [
      [10, 2, 0],
      [3, 15, 0],
      [0, 0, 0],
    ];
    expect(gwetAC1(wider).ac1).toBeGreaterThan(
      gwetAC1([
        [10, 2],
        [3, 15],
      ]).ac1,
    );
  });

  test('is 1 for identical records, also with one code only', () => {
    expect(
      gwetAC1([
        [4, 0],
        [0, 5],
      ]),
    ).toMatchObject({ ac1: 1, standardError: 0 });
    expect(
      gwetAC1([
        [4, 0],
        [0, 0],
      ]),
    ).toMatchObject({ ac1: 1, standardError: 0, chanceAgreement: 0 });
  });

  test('no look or fewer than two codes listed is undefined; nonsense throws', () => {
    expect(
      gwetAC1([
        [0, 0],
        [0, 0],
      ]).ac1,
    ).toBeNaN();
    expect(gwetAC1([[5]]).ac1).toBeNaN();
    expect(gwetAC1([]).ac1).toBeNaN();
    expect(() => gwetAC1([[1, 2]])).toThrow(/^table/);
    expect(() =>
      gwetAC1(
        [
          [1, 2],
          [3, 4],
        ],
        -1,
      ),
    ).toThrow(/^confidence/);
  });
});
