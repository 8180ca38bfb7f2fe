import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cohenKappa } from '../../src/stats/cohenKappa.ts';
import { kappaPerCode } from '../../src/stats/kappaPerCode.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';
import { squareTable } from './tables.ts';

describe('kappaPerCode', () => {
  referenceTests<{ table: number[][] }>('kappa', ({ table }) => {
    const figures: Record<string, number> = {};
    kappaPerCode(table).forEach(
      ({ code, kappa, observedAgreement, chanceAgreement, table: [[a, b], [c, d]] }) => {
        Object.assign(figures, {
          [`per_code.${code}.code`]: code,
          [`per_code.${code}.a`]: a,
          [`per_code.${code}.b`]: b,
          [`per_code.${code}.c`]: c,
          [`per_code.${code}.d`]: d,
          [`per_code.${code}.po`]: observedAgreement,
          [`per_code.${code}.pe`]: chanceAgreement,
          [`per_code.${code}.kappa`]: kappa,
        });
      },
    );
    return figures;
  });

  test('with two codes, both have the kappa of the table; in general, kappa is their average weighted by 1 − pe', () => {
    fc.assert(
      fc.property(squareTable, (table) => {
        const whole = cohenKappa(table);
        const each = kappaPerCode(table);
        if (Number.isNaN(whole.kappa)) return;
        if (table.length === 2) for (const { kappa } of each) expectNear(kappa, whole.kappa);
        let weights = 0;
        let sum = 0;
        for (const { kappa, chanceAgreement } of each) {
          if (Number.isNaN(kappa)) continue;
          weights += 1 - chanceAgreement;
          sum += kappa * (1 - chanceAgreement);
        }
        expectNear(sum / weights, whole.kappa, 1e-9);
      }),
    );
  });

  test('a code that neither used is undefined; a ragged table throws', () => {
    expect(
      kappaPerCode([
        [10, 2, 0],
        [3, 15, 0],
        [0, 0, 0],
      ])[2]?.kappa,
    ).toBeNaN();
    expect(() => kappaPerCode([[1], [2]])).toThrow(/^table/);
  });
});
