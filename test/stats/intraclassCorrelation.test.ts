import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type IccForm, intraclassCorrelation } from '../../src/stats/intraclassCorrelation.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

const forms: IccForm[] = ['1,1', '2,1', '3,1', '1,k', '2,k', '3,k'];

const someScores = fc.tuple(fc.integer({ min: 2, max: 8 }), fc.integer({ min: 2, max: 5 })).chain(([n, k]) =>
  fc.array(fc.array(fc.integer({ min: 0, max: 20 }), { minLength: k, maxLength: k }), {
    minLength: n,
    maxLength: n,
  }),
);

function same(got: number, want: number): void {
  if (Number.isNaN(want)) expect(got).toBeNaN();
  else expectNear(got, want, 1e-7);
}

describe('intraclassCorrelation', () => {
  referenceTests<{ ratings: number[][]; conf: number }>('icc', ({ ratings, conf }) => {
    const figures: Record<string, number> = {};
    for (const form of forms) {
      const { icc, lower, upper, f, df1, df2 } = intraclassCorrelation(ratings, form, conf);
      const key = `icc${form.replace(',', '_')}`;
      Object.assign(figures, {
        [`${key}.value`]: icc,
        [`${key}.lo`]: lower,
        [`${key}.hi`]: upper,
        [`${key}.F`]: f,
        [`${key}.df1`]: df1,
        [`${key}.df2`]: df2,
      });
    }
    return figures;
  });

  test('Shrout & Fleiss 1979, Tables 2 and 4: .17 .29 .71 .44 .62 .91', () => {
    const scores = [
      [9, 2, 5, 8],
      [6, 1, 3, 2],
      [8, 4, 6, 8],
      [7, 1, 2, 6],
      [10, 5, 6, 9],
      [6, 2, 4, 7],
    ];
    expect(forms.map((form) => Number(intraclassCorrelation(scores, form).icc.toFixed(2)))).toEqual([
      0.17, 0.29, 0.71, 0.44, 0.62, 0.91,
    ]);
  });

  test('does not change when targets or observers are permuted, nor with unit and origin of the scores', () => {
    fc.assert(
      fc.property(someScores, (scores) => {
        for (const form of forms) {
          const { icc } = intraclassCorrelation(scores, form);
          same(intraclassCorrelation([...scores].reverse(), form).icc, icc);
          same(
            intraclassCorrelation(
              scores.map((row) => [...row].reverse()),
              form,
            ).icc,
            icc,
          );
          if (Math.abs(icc) < 1e3) {
            same(
              intraclassCorrelation(
                scores.map((row) => row.map((x) => 3 * x + 7)),
                form,
              ).icc,
              icc,
            );
          }
        }
      }),
    );
  });

  test('is at most 1 for single observers, and between its bounds where both are defined', () => {
    fc.assert(
      fc.property(someScores, (scores) => {
        for (const form of ['1,1', '3,1'] as const) {
          const { icc, lower, upper } = intraclassCorrelation(scores, form);
          if (Number.isNaN(icc)) continue;
          expect(icc).toBeLessThanOrEqual(1);
          expect(icc).toBeGreaterThanOrEqual(-1 / ((scores[0] as number[]).length - 1) - 1e-12);
          if (Number.isNaN(lower)) continue;
          expect(lower).toBeLessThanOrEqual(icc + 1e-12);
          expect(upper).toBeGreaterThanOrEqual(icc - 1e-12);
        }
      }),
    );
  });

  test('identical records give exactly 1; decimals leave no noise behind', () => {
    for (const form of forms) {
      const got = intraclassCorrelation(
        [
          [0.1, 0.1, 0.1],
          [0.7, 0.7, 0.7],
          [0.3, 0.3, 0.3],
        ],
        form,
      );
      expect(got.icc).toBe(1);
      expect(got.f).toBeNaN();
      expect(got.lower).toBeNaN();
    }
  });

  test('no spread between targets: −1/(k − 1) for single observers, averages undefined', () => {
    const scores = [
      [0.1, 0.7, 0.4],
      [0.7, 0.1, 0.4],
      [0.4, 0.4, 0.4],
    ];
    expectNear(intraclassCorrelation(scores, '1,1').icc, -0.5);
    expectNear(intraclassCorrelation(scores, '3,1').icc, -0.5);
    for (const form of ['1,k', '3,k'] as const) {
      const got = intraclassCorrelation(scores, form);
      expect(got.icc).toBeNaN();
      expect(got.lower).toBeNaN();
      expect(got.f).toBe(0);
    }
  });

  test('is undefined for equal scores, one target, one observer, none', () => {
    for (const scores of [
      [
        [0.1, 0.1],
        [0.1, 0.1],
      ],
      [[1, 2, 3]],
      [[1], [2]],
      [],
    ]) {
      for (const form of forms) {
        const got = intraclassCorrelation(scores, form);
        for (const figure of ['icc', 'lower', 'upper'] as const) expect(got[figure], form).toBeNaN();
      }
    }
  });

  test('nonsense throws and names the argument', () => {
    expect(() => intraclassCorrelation([[1, 2], [3]], '1,1')).toThrow(/^scores/);
    expect(() =>
      intraclassCorrelation(
        [
          [1, Number.NaN],
          [3, 4],
        ],
        '1,1',
      ),
    ).toThrow(/^scores/);
    expect(() =>
      intraclassCorrelation(
        [
          [1, 2],
          [3, 5],
        ],
        '4,1' as '1,1',
      ),
    ).toThrow(/^form/);
    expect(() =>
      intraclassCorrelation(
        [
          [1, 2],
          [3, 5],
        ],
        '1,1',
        0,
      ),
    ).toThrow(RangeError);
  });
});
