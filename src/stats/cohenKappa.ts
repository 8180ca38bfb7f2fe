import type { About } from './about.ts';
import { type CountTable, type Margins, margins } from './countTable.ts';
import { twoSidedZ } from './normalQuantile.ts';
import { requireConfidence } from './requireThat.ts';

export interface CohenKappa {
  readonly n: number;
  readonly observedAgreement: number;
  readonly chanceAgreement: number;
  readonly kappa: number;
  /** Large-sample error for the interval (not assuming kappa = 0). */
  readonly standardError: number;
  /** Large-sample error under kappa = 0, for a test. */
  readonly nullStandardError: number;
  readonly lower: number;
  readonly upper: number;
  /** The highest kappa that these margins allow. */
  readonly maximumKappa: number;
}

/**
 * Cohen's kappa of two observers from a square table of counts (rows = first observer), with the large-sample
 * standard errors and a normal interval, which is not clipped to −1…1.
 *
 * Looks of the same child or session are not independent, so the interval tends to be too narrow.
 * Undefined (NaN): all but n and the agreements when chance agreement is 1 (both used the same one code);
 * everything for an empty table. One observer constant and the other not gives exactly 0. Codes that neither
 * used change nothing. Perfect agreement gives error 0: true to the formula, not to life. Relative error 1e-10.
 *
 * Sources: Cohen 1960, Educ Psychol Meas 20:37-46; Fleiss, Cohen & Everitt 1969, Psychol Bull 72:323-327.
 *
 * @example cohenKappa([[88, 14, 18], [10, 40, 10], [2, 6, 12]]).kappa // → 0.4915
 * @example cohenKappa([[40, 9], [6, 45]]).maximumKappa // → 0.9399
 */
export function cohenKappa(table: CountTable, confidence = 0.95): CohenKappa {
  requireConfidence(confidence);
  const sums = margins(table);
  const { n, rows, columns, agreed } = sums;
  // Sums of products of counts, kept whole so that kappa of a perfect or a constant record is exact.
  const byChance = rows.reduce((sum, row, i) => sum + row * (columns[i] as number), 0);
  const atMost = rows.reduce((sum, row, i) => sum + Math.min(row, columns[i] as number), 0);
  const beyondChance = n * n - byChance;
  const oneIsConstant = rows.includes(n) || columns.includes(n);
  const kappa = beyondChance === 0 ? Number.NaN : oneIsConstant ? 0 : (n * agreed - byChance) / beyondChance;
  const standardError = oneIsConstant ? kappa : errorOfKappa(table, sums, kappa, byChance / n / n);
  const half = twoSidedZ(confidence) * standardError;
  return {
    n,
    observedAgreement: agreed / n,
    chanceAgreement: byChance / (n * n),
    kappa,
    standardError,
    nullStandardError: oneIsConstant ? kappa : errorUnderChance(sums, byChance / n / n),
    lower: kappa - half,
    upper: kappa + half,
    maximumKappa: beyondChance === 0 ? Number.NaN : (n * atMost - byChance) / beyondChance,
  };
}

function errorOfKappa(
  table: CountTable,
  { n, rows, columns }: Margins,
  kappa: number,
  chance: number,
): number {
  let diagonal = 0;
  let rest = 0;
  table.forEach((row, i) => {
    row.forEach((count, j) => {
      if (i === j) {
        const shares = ((rows[i] as number) + (columns[i] as number)) / n;
        diagonal += count * (1 - shares * (1 - kappa)) ** 2;
      } else {
        // The column margin of the row's code and the row margin of the column's code, as printed in 1969.
        rest += count * (((columns[i] as number) + (rows[j] as number)) / n) ** 2;
      }
    });
  });
  const spread = (diagonal + (1 - kappa) ** 2 * rest) / n;
  const difference = spread - (kappa - chance * (1 - kappa)) ** 2;
  const variance = difference < 1e-14 * spread ? 0 : difference;
  return Math.sqrt(variance / n) / (1 - chance);
}

function errorUnderChance({ n, rows, columns }: Margins, chance: number): number {
  const third = rows.reduce((sum, row, i) => {
    const column = columns[i] as number;
    return sum + ((row / n) * column * (row + column)) / n / n;
  }, 0);
  const variance = Math.max(0, chance + chance * chance - third);
  return Math.sqrt(variance / n) / (1 - chance);
}

export const about: About = {
  name: 'cohenKappa',
  sentence: 'Agreement of two observers beyond what their own habits of coding would produce by chance.',
  formula: 'κ = (po − pe) / (1 − pe), pe = Σ p_i. p_.i',
  source:
    'Cohen 1960, Educ Psychol Meas 20:37-46; errors: Fleiss, Cohen & Everitt 1969, Psychol Bull 72:323-327',
  check: {
    input: 'cohenKappa([[88, 14, 18], [10, 40, 10], [2, 6, 12]]).kappa',
    expected: 0.492,
    source: 'Cohen 1960, worked example (N = 200)',
    tolerance: 5e-4,
  },
  recompute: () =>
    cohenKappa([
      [88, 14, 18],
      [10, 40, 10],
      [2, 6, 12],
    ]).kappa,
};
