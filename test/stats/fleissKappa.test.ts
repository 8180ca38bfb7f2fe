import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { fleissKappa } from '../../src/stats/fleissKappa.ts';
import { expectNear } from './near.ts';
import { casesOf, referenceTests } from './referenceCases.ts';

const someCounts = fc
  .tuple(fc.integer({ min: 2, max: 5 }), fc.integer({ min: 2, max: 4 }))
  .chain(([observers, codes]) =>
    fc
      .array(
        fc.array(fc.integer({ min: 0, max: codes - 1 }), { minLength: observers, maxLength: observers }),
        {
          minLength: 1,
          maxLength: 30,
        },
      )
      .map((units) =>
        units.map((unit) =>
          Array.from({ length: codes }, (_, code) => unit.filter((given) => given === code).length),
        ),
      ),
  );

describe('fleissKappa', () => {
  referenceTests<{ counts: number[][] }>('fleiss', ({ counts }) => {
    const { kappa, standardError, perCode } = fleissKappa(counts);
    const figures: Record<string, number> = { kappa, se_null: standardError };
    perCode.forEach((ofCode, j) => {
      figures[`per_code_kappa.${j}`] = ofCode;
    });
    return figures;
  });

  test('Fleiss 1971, Table 1 (cells from memory): kappa .430, z 17.65 with the error of 1979', () => {
    const [table1] = casesOf('fleiss');
    const counts = table1?.input.counts as number[][];
    const { kappa, standardError } = fleissKappa(counts);
    expect(kappa).toBeCloseTo(0.43, 3);
    expect(kappa / standardError).toBeCloseTo(17.65, 2);
  });

  test('of two observers is Scott’s pi', () => {
    // 2 × 2 table of Feinstein & Cicchetti 1990: 40, 9, 6, 45.
    const unit = (times: number, row: number[]): number[][] => new Array<number[]>(times).fill(row);
    const { kappa } = fleissKappa([...unit(40, [2, 0]), ...unit(15, [1, 1]), ...unit(45, [0, 2])]);
    const pe = (95 / 200) ** 2 + (105 / 200) ** 2;
    expectNear(kappa, (0.85 - pe) / (1 - pe));
  });

  test('does not change when units or codes are permuted; kappa is the average of the codes’ weighted by pq', () => {
    fc.assert(
      fc.property(someCounts, (counts) => {
        const { kappa, standardError, perCode } = fleissKappa(counts);
        const turned = fleissKappa([...counts].reverse().map((row) => [...row].reverse()));
        if (Number.isNaN(kappa)) {
          expect(turned.kappa).toBeNaN();
          return;
        }
        expectNear(turned.kappa, kappa);
        expect(turned.standardError).toBeCloseTo(standardError, 8);
        const totals = perCode.map((_, j) => counts.reduce((sum, row) => sum + (row[j] as number), 0));
        const all = totals.reduce((x, y) => x + y, 0);
        let weights = 0;
        let sum = 0;
        perCode.forEach((ofCode, j) => {
          const weight = (totals[j] as number) * (all - (totals[j] as number));
          if (weight === 0) return;
          weights += weight;
          sum += weight * ofCode;
        });
        expectNear(sum / weights, kappa, 1e-9);
      }),
    );
  });

  test('is exactly 1 when all agree and two codes are used', () => {
    expect(
      fleissKappa([
        [4, 0, 0],
        [0, 4, 0],
        [4, 0, 0],
      ]).kappa,
    ).toBe(1);
  });

  test('is undefined for one code, one observer, no unit', () => {
    for (const counts of [
      [
        [3, 0],
        [3, 0],
      ],
      [
        [1, 0],
        [0, 1],
      ],
      [],
    ]) {
      const got = fleissKappa(counts);
      expect(got.kappa).toBeNaN();
      expect(got.standardError).toBeNaN();
      for (const ofCode of got.perCode) expect(ofCode).toBeNaN();
    }
    expect(
      fleissKappa([
        [2, 1, 0],
        [1, 2, 0],
      ]).perCode[2],
    ).toBeNaN();
  });

  test('nonsense throws and names the argument', () => {
    expect(() =>
      fleissKappa([
        [2, 1],
        [2, 2],
      ]),
    ).toThrow(/^counts/);
    expect(() => fleissKappa([[2, 1], [3]])).toThrow(/^counts/);
    expect(() =>
      fleissKappa([
        [2, -1],
        [1, 0],
      ]),
    ).toThrow(RangeError);
  });
});
