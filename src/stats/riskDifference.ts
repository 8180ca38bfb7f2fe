import type { About } from './about.ts';
import { type CountTable, fourCells } from './countTable.ts';
import type { Effect } from './standardizedMeanChange.ts';

/**
 * Difference of two shares of a 2 × 2 table [[a, b], [c, d]] (rows = groups; columns = happened, did not):
 * a/(a + b) − c/(c + d), variance p₁q₁/n₁ + p₂q₂/n₂. Nothing is ever added to the cells.
 *
 * Undefined (NaN): a group with nobody in it. The variance is 0 when both shares are 0 or 1. Relative error 1e-10.
 *
 * Source: Fleiss 1981, Statistical methods for rates and proportions, 2nd ed., chapter 2.
 *
 * @example riskDifference([[45, 15], [30, 30]]).estimate // → 0.25
 */
export function riskDifference(table2x2: CountTable): Effect {
  const [a, b, c, d] = fourCells(table2x2, 'table2x2');
  const first = a + b;
  const second = c + d;
  return {
    estimate: a / first - c / second,
    variance: (a * b) / first ** 3 + (c * d) / second ** 3,
  };
}

export const about: About = {
  name: 'riskDifference',
  sentence: 'How many points apart two groups’ shares are.',
  formula: 'a/(a + b) − c/(c + d), variance p₁q₁/n₁ + p₂q₂/n₂',
  source: 'Fleiss 1981, Statistical methods for rates and proportions, 2nd ed., chapter 2',
  check: {
    input: 'riskDifference([[45, 15], [30, 30]]).variance',
    expected: 0.1875 / 60 + 0.25 / 60,
    source: 'by hand: .75 · .25/60 + .5 · .5/60',
    tolerance: 1e-12,
  },
  recompute: () =>
    riskDifference([
      [45, 15],
      [30, 30],
    ]).variance,
};
