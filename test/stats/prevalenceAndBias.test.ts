import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cohenKappa } from '../../src/stats/cohenKappa.ts';
import { prevalenceAndBias } from '../../src/stats/prevalenceAndBias.ts';
import { referenceTests } from './referenceCases.ts';

describe('prevalenceAndBias', () => {
  referenceTests<{ table: number[][] }>(
    'kappa',
    ({ table }) => {
      const { prevalenceIndex, biasIndex, pabak } = prevalenceAndBias(table);
      return { prevalence_index: prevalenceIndex, bias_index: biasIndex, pabak };
    },
    { only: ({ table }) => (table as number[][]).length === 2 },
  );

  test('kappa = (PABAK − PI² + BI²)/(1 − PI² + BI²): Byrt, Bishop & Carlin 1993 (identity from memory)', () => {
    const count = fc.integer({ min: 0, max: 500 });
    fc.assert(
      fc.property(count, count, count, count, (a, b, c, d) => {
        const table = [
          [a, b],
          [c, d],
        ];
        const { kappa } = cohenKappa(table);
        if (Number.isNaN(kappa)) return;
        const { prevalenceIndex: pi, biasIndex: bi, pabak } = prevalenceAndBias(table);
        expect((pabak - pi ** 2 + bi ** 2) / (1 - pi ** 2 + bi ** 2)).toBeCloseTo(kappa, 9);
      }),
    );
  });

  test('empty is undefined, other sizes throw', () => {
    expect(
      prevalenceAndBias([
        [0, 0],
        [0, 0],
      ]).pabak,
    ).toBeNaN();
    expect(() =>
      prevalenceAndBias([
        [1, 2, 3],
        [1, 2, 3],
        [1, 2, 3],
      ]),
    ).toThrow(/^table2x2/);
    expect(() =>
      prevalenceAndBias([
        [1, 2],
        [3, -4],
      ]),
    ).toThrow(RangeError);
  });
});
