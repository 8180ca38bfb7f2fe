import type { About } from './about.ts';
import { type CountTable, fourCells } from './countTable.ts';
import type { Effect } from './standardizedMeanChange.ts';

/**
 * Natural logarithm of the odds ratio of a 2 × 2 table [[a, b], [c, d]] (rows = groups; columns = happened, did not):
 * ln(ad/bc), variance 1/a + 1/b + 1/c + 1/d. A half is added to all four cells only if one of them is 0.
 *
 * Undefined (NaN): a group with nobody in it. Relative error 1e-10.
 *
 * Sources: Haldane 1956, Ann Hum Genet 20:309-311; Anscombe 1956, Biometrika 43:461-464 (the half); Woolf 1955 (variance).
 *
 * @example logOddsRatio([[45, 15], [30, 30]]).estimate // → 1.0986
 */
export function logOddsRatio(table2x2: CountTable): Effect {
  const cells = fourCells(table2x2, 'table2x2');
  const add = cells.includes(0) ? 0.5 : 0;
  const [a, b, c, d] = cells.map((count) => count + add) as [number, number, number, number];
  if (cells[0] + cells[1] === 0 || cells[2] + cells[3] === 0)
    return { estimate: Number.NaN, variance: Number.NaN };
  return { estimate: Math.log((a * d) / (b * c)), variance: 1 / a + 1 / b + 1 / c + 1 / d };
}

export const about: About = {
  name: 'logOddsRatio',
  sentence:
    'How much the odds of being on-task differ between two groups, on the scale on which studies are pooled.',
  formula: 'ln(ad/bc), variance 1/a + 1/b + 1/c + 1/d; ½ added to all cells if one is 0',
  source: 'Haldane 1956, Ann Hum Genet 20:309-311; Anscombe 1956, Biometrika 43:461-464',
  check: {
    input: 'logOddsRatio([[45, 15], [30, 30]]).estimate',
    expected: Math.log(3),
    source: 'by hand: 45 · 30 / (15 · 30) = 3',
    tolerance: 1e-12,
  },
  recompute: () =>
    logOddsRatio([
      [45, 15],
      [30, 30],
    ]).estimate,
};
