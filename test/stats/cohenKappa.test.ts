import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cohenKappa } from '../../src/stats/cohenKappa.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';
import { relabelled, squareTable, tableAndOrder, transposed } from './tables.ts';

describe('cohenKappa', () => {
  referenceTests<{ table: number[][]; conf: number }>('kappa', ({ table, conf }) => {
    const got = cohenKappa(table, conf);
    return {
      n: got.n,
      po: got.observedAgreement,
      pe: got.chanceAgreement,
      kappa: got.kappa,
      se_fce: got.standardError,
      se_null: got.nullStandardError,
      ci_lo: got.lower,
      ci_hi: got.upper,
      kappa_max: got.maximumKappa,
    };
  });

  test.each([
    [[40, 9, 6, 45], 0.6995, 0.56, 0.839, 0.94],
    [[80, 10, 5, 5], 0.3182, 0.057, 0.58, 0.773],
    [[50, 5, 5, 40], 0.798, 0.679, 0.917, 1],
    [[96, 6, 6, 12], 0.6078, 0.406, 0.809, 1],
  ])(
    'by hand; first two tables of Feinstein & Cicchetti 1990 (.70 and .32): %j',
    ([a, b, c, d], kappa, lower, upper, highest) => {
      const got = cohenKappa([
        [a as number, b as number],
        [c as number, d as number],
      ]);
      expect(got.kappa).toBeCloseTo(kappa, 4);
      expect(got.lower).toBeCloseTo(lower, 3);
      expect(got.upper).toBeCloseTo(upper, 3);
      expect(got.maximumKappa).toBeCloseTo(highest, 3);
    },
  );

  test('Fleiss, Cohen & Everitt 1969: kappa .429, errors .0537 and .0555 (printed values from memory)', () => {
    const got = cohenKappa([
      [106, 10, 4],
      [22, 28, 10],
      [2, 12, 6],
    ]);
    expect(got.kappa).toBeCloseTo(0.429, 3);
    expect(got.standardError).toBeCloseTo(0.0537, 4);
    expect(got.nullStandardError).toBeCloseTo(0.0555, 4);
  });

  test('an observer who uses one code while the other does not: exactly 0, also in large tables', () => {
    for (const table of [
      [
        [57, 3],
        [0, 0],
      ],
      [
        [999_983, 123_457],
        [0, 0],
      ],
      [
        [7, 0, 0],
        [11, 0, 0],
        [13, 0, 0],
      ],
    ]) {
      const got = cohenKappa(table);
      expect([got.kappa, got.standardError, got.nullStandardError, got.lower, got.upper]).toEqual([
        0, 0, 0, 0, 0,
      ]);
    }
  });

  test('one code only, or no look: undefined, but the agreement is told where there is one', () => {
    const oneCode = cohenKappa([
      [60, 0],
      [0, 0],
    ]);
    expect(oneCode).toMatchObject({ n: 60, observedAgreement: 1, chanceAgreement: 1 });
    for (const figure of [
      'kappa',
      'standardError',
      'nullStandardError',
      'lower',
      'upper',
      'maximumKappa',
    ] as const) {
      expect(oneCode[figure]).toBeNaN();
    }
    for (const table of [
      [
        [0, 0],
        [0, 0],
      ],
      [],
    ]) {
      const empty = cohenKappa(table);
      expect(empty.n).toBe(0);
      expect(empty.observedAgreement).toBeNaN();
      expect(empty.kappa).toBeNaN();
    }
  });

  test('does not change when codes are relabelled, observers change places or unused codes are listed', () => {
    fc.assert(
      fc.property(tableAndOrder, ([table, order]) => {
        const { kappa, standardError, maximumKappa } = cohenKappa(table);
        const wider = [...table.map((row) => [...row, 0]), new Array<number>(table.length + 1).fill(0)];
        for (const other of [relabelled(table, order), transposed(table), wider]) {
          const got = cohenKappa(other);
          if (Number.isNaN(kappa)) expect(got.kappa).toBeNaN();
          else {
            expectNear(got.kappa, kappa);
            expectNear(got.maximumKappa, maximumKappa);
            if (other !== wider) expect(got.standardError).toBeCloseTo(standardError, 8);
          }
        }
      }),
    );
  });

  test('is never above its maximum, and exactly 1 for identical records with two codes or more', () => {
    fc.assert(
      fc.property(squareTable, (table) => {
        const { kappa, maximumKappa } = cohenKappa(table);
        if (!Number.isNaN(kappa)) expect(kappa).toBeLessThanOrEqual(maximumKappa);
        const identical = table.map((row, i) => row.map((count, j) => (i === j ? count + 1 : 0)));
        expect(cohenKappa(identical)).toMatchObject({
          kappa: 1,
          standardError: 0,
          lower: 1,
          upper: 1,
          maximumKappa: 1,
        });
      }),
    );
  });

  test('nonsense throws and names the argument', () => {
    expect(() => cohenKappa([[1, 2]])).toThrow(/^table/);
    expect(() => cohenKappa([[1, 2], [3]])).toThrow(RangeError);
    expect(() =>
      cohenKappa([
        [1, -2],
        [3, 4],
      ]),
    ).toThrow(/^table/);
    expect(() =>
      cohenKappa([
        [1, Number.NaN],
        [3, 4],
      ]),
    ).toThrow(/^table/);
    expect(() =>
      cohenKappa(
        [
          [1, 2],
          [3, 4],
        ],
        1,
      ),
    ).toThrow(/^confidence/);
  });
});
