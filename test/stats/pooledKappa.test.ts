import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cohenKappa } from '../../src/stats/cohenKappa.ts';
import { pooledKappa } from '../../src/stats/pooledKappa.ts';
import { expectNear } from './near.ts';
import { squareTable } from './tables.ts';

describe('pooledKappa', () => {
  test('by hand after De Vries et al. 2008: agreements are averaged, not kappas', () => {
    const got = pooledKappa([
      [
        [40, 9],
        [6, 45],
      ],
      [
        [80, 10],
        [5, 5],
      ],
    ]);
    expectNear(got.observedAgreement, 0.85);
    expectNear(got.chanceAgreement, 0.6404);
    expectNear(got.kappa, 0.2096 / 0.3596);
  });

  test('of one table, or copies of it, is its kappa; between the smallest and the largest of several', () => {
    fc.assert(
      fc.property(fc.array(squareTable, { minLength: 1, maxLength: 5 }), (tables) => {
        const kappas = tables.map((table) => cohenKappa(table).kappa).filter((kappa) => !Number.isNaN(kappa));
        const pooled = pooledKappa(tables).kappa;
        if (kappas.length === 0) expect(pooled).toBeNaN();
        else {
          expect(pooled).toBeGreaterThanOrEqual(Math.min(...kappas) - 1e-12);
          expect(pooled).toBeLessThanOrEqual(Math.max(...kappas) + 1e-12);
        }
        const [first] = tables as [number[][]];
        if (!Number.isNaN(cohenKappa(first).kappa)) {
          expectNear(pooledKappa([first, first]).kappa, cohenKappa(first).kappa);
        }
      }),
    );
  });

  test('a session with one code only still counts towards chance; an empty one counts for nothing', () => {
    const mixed: number[][] = [
      [40, 9],
      [6, 45],
    ];
    const withOneCode = pooledKappa([
      mixed,
      [
        [60, 0],
        [0, 0],
      ],
    ]);
    expectNear(withOneCode.kappa, (0.925 - 0.7504) / (1 - 0.7504));
    expect(
      pooledKappa([
        mixed,
        [
          [0, 0],
          [0, 0],
        ],
      ]),
    ).toEqual(pooledKappa([mixed]));
  });

  test('nothing to pool is undefined; a ragged table throws', () => {
    expect(pooledKappa([]).kappa).toBeNaN();
    expect(pooledKappa([]).observedAgreement).toBeNaN();
    expect(
      pooledKappa([
        [
          [9, 0],
          [0, 0],
        ],
      ]).kappa,
    ).toBeNaN();
    expect(() => pooledKappa([[[1, 2], [3]]])).toThrow(/^tables/);
  });
});
