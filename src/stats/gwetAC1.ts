import type { About } from './about.ts';
import { type CountTable, margins } from './countTable.ts';
import { twoSidedZ } from './normalQuantile.ts';
import { requireConfidence } from './requireThat.ts';

export interface GwetAC1 {
  readonly observedAgreement: number;
  readonly chanceAgreement: number;
  readonly ac1: number;
  readonly standardError: number;
  readonly lower: number;
  readonly upper: number;
}

/**
 * Gwet's first-order agreement coefficient AC1 of two observers from a square table of counts. It moves less
 * than kappa when one code prevails. Codes that neither used count: chance agreement depends on how many are listed.
 *
 * The error is Gwet's 2008 form (divisor n, no finite-population correction) with a normal interval, not clipped.
 * Undefined (NaN): an empty table, or fewer than two codes listed. One code used by both gives 1. Relative error 1e-10.
 *
 * Source: Gwet 2008, Br J Math Stat Psychol 61:29-48.
 *
 * @example gwetAC1([[80, 10], [5, 5]]).ac1 // → 0.8080
 */
export function gwetAC1(table: CountTable, confidence = 0.95): GwetAC1 {
  requireConfidence(confidence);
  const { n, rows, columns, agreed } = margins(table);
  const others = table.length - 1;
  const shares = rows.map((row, i) => (row + (columns[i] as number)) / (2 * n));
  const observed = agreed / n;
  const chance = shares.reduce((sum, share) => sum + share * (1 - share), 0) / others;
  const ac1 = (observed - chance) / (1 - chance);
  let onDiagonal = 0;
  let everywhere = 0;
  table.forEach((row, i) => {
    row.forEach((count, j) => {
      const notThese = 1 - ((shares[i] as number) + (shares[j] as number)) / 2;
      everywhere += count * notThese ** 2;
      if (i === j) onDiagonal += count * notThese;
    });
  });
  const missing = 1 - ac1;
  const spread =
    observed * (1 - observed) -
    4 * missing * (onDiagonal / n / others - observed * chance) +
    4 * missing ** 2 * (everywhere / n / others ** 2 - chance ** 2);
  const variance = spread < 1e-14 ? 0 : spread;
  const standardError = Math.sqrt(variance / n) / (1 - chance);
  const half = twoSidedZ(confidence) * standardError;
  return {
    observedAgreement: observed,
    chanceAgreement: chance,
    ac1,
    standardError,
    lower: ac1 - half,
    upper: ac1 + half,
  };
}

export const about: About = {
  name: 'gwetAC1',
  sentence: 'Agreement of two observers beyond chance, steadier than kappa when one code prevails.',
  formula: 'AC1 = (po − pe)/(1 − pe), pe = Σ π_k(1 − π_k)/(q − 1), π_k = (p_k. + p_.k)/2',
  source: 'Gwet 2008, Br J Math Stat Psychol 61:29-48',
  check: {
    input: 'gwetAC1([[80, 10], [5, 5]]).ac1',
    expected: (0.85 - 0.21875) / (1 - 0.21875),
    source: 'by hand: mean margin of the first code .875, pe = 2 × .875 × .125 = .21875',
    tolerance: 1e-12,
  },
  recompute: () =>
    gwetAC1([
      [80, 10],
      [5, 5],
    ]).ac1,
};
