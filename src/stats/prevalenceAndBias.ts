import type { About } from './about.ts';
import { type CountTable, fourCells } from './countTable.ts';

export interface PrevalenceAndBias {
  /** (a − d)/n: how lopsided the codes are; signed, positive when the first code prevails. */
  readonly prevalenceIndex: number;
  /** (b − c)/n: how much more often the first observer used the first code; signed. */
  readonly biasIndex: number;
  /** Prevalence-adjusted bias-adjusted kappa, 2 po − 1. */
  readonly pabak: number;
}

/**
 * Why kappa of a 2 × 2 table is low or high: prevalence and bias, and kappa with both taken out.
 * Table: [[a, b], [c, d]], a = both the first code, d = both the second. Undefined (NaN) for an empty table.
 *
 * Source: Byrt, Bishop & Carlin 1993, J Clin Epidemiol 46:423-429.
 *
 * @example prevalenceAndBias([[40, 9], [6, 45]]).pabak // → 0.7
 */
export function prevalenceAndBias(table2x2: CountTable): PrevalenceAndBias {
  const [a, b, c, d] = fourCells(table2x2, 'table2x2');
  const n = a + b + c + d;
  return { prevalenceIndex: (a - d) / n, biasIndex: (b - c) / n, pabak: (a + d - b - c) / n };
}

export const about: About = {
  name: 'prevalenceAndBias',
  sentence: 'How lopsided the codes and how unlike the observers are, which both move kappa.',
  formula: 'prevalence index = (a − d)/n; bias index = (b − c)/n; PABAK = 2 po − 1',
  source: 'Byrt, Bishop & Carlin 1993, J Clin Epidemiol 46:423-429',
  check: {
    input: 'prevalenceAndBias([[80, 10], [5, 5]]).pabak',
    expected: 0.7,
    source: 'by hand: 2 × .85 − 1; table from Feinstein & Cicchetti 1990',
    tolerance: 1e-12,
  },
  recompute: () =>
    prevalenceAndBias([
      [80, 10],
      [5, 5],
    ]).pabak,
};
