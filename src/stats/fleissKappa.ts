import type { About } from './about.ts';
import { requireThat } from './requireThat.ts';

export interface FleissKappa {
  readonly kappa: number;
  /** Large-sample error under kappa = 0 (the 1979 form). */
  readonly standardError: number;
  /** Kappa of each code against all others, in the order of the columns. */
  readonly perCode: number[];
}

/**
 * Agreement of many observers beyond chance: `counts` has a row for each unit (interval) and a column for each code,
 * and tells how many observers gave the unit that code. Every row adds up to the same number of observers m.
 * With two observers it is Scott's pi, not Cohen's kappa.
 *
 * Undefined (NaN): one code only, no unit, or fewer than two observers; a code that nobody or everybody always used
 * in `perCode`. Relative error 1e-10.
 *
 * Sources: Fleiss 1971, Psychol Bull 76:378-382; error: Fleiss, Nee & Landis 1979, Psychol Bull 86:974-977.
 *
 * @example fleissKappa([[3, 0], [0, 3], [2, 1], [3, 0]]).kappa // → 0.625
 */
export function fleissKappa(counts: readonly (readonly number[])[]): FleissKappa {
  const units = counts.length;
  const codes = counts[0]?.length ?? 0;
  const totals = new Array<number>(codes).fill(0);
  const split = new Array<number>(codes).fill(0);
  const observers = (counts[0] ?? []).reduce((sum, count) => sum + count, 0);
  for (const row of counts) {
    requireThat(row.length === codes, 'counts', 'must have the same codes in every row');
    let inRow = 0;
    row.forEach((count, j) => {
      requireThat(Number.isInteger(count) && count >= 0, 'counts', 'must hold counts, none negative');
      inRow += count;
      totals[j] = (totals[j] as number) + count;
      split[j] = (split[j] as number) + count * (observers - count);
    });
    requireThat(inRow === observers, 'counts', 'must have the same number of observers in every row');
  }
  const all = units * observers;
  const pairs = all * (observers - 1);
  // Per code: p q as whole numbers over all².
  const spreads = totals.map((total) => total * (all - total));
  const spread = spreads.reduce((sum, s) => sum + s, 0);
  const disagreeing = split.reduce((sum, s) => sum + s, 0);
  const isUndefined = spread === 0 || pairs === 0;
  const skew = totals.reduce((sum, total, j) => sum + (spreads[j] as number) * ((all - 2 * total) / all), 0);
  return {
    kappa: isUndefined ? Number.NaN : 1 - (disagreeing * all * all) / (pairs * spread),
    standardError: isUndefined
      ? Number.NaN
      : (Math.sqrt(2 / pairs) * Math.sqrt(Math.max(0, (spread / all) ** 2 - skew))) / (spread / all),
    perCode: spreads.map((s, j) =>
      s === 0 || pairs === 0 ? Number.NaN : 1 - ((split[j] as number) * all * all) / (pairs * s),
    ),
  };
}

const table1 = [
  '00060',
  '03003',
  '01401',
  '00006',
  '03030',
  '20400',
  '00402',
  '20310',
  '20040',
  '00006',
  '10050',
  '11040',
  '03300',
  '10050',
  '02031',
  '00501',
  '30012',
  '51000',
  '02040',
  '10203',
  '00006',
  '01050',
  '02013',
  '20040',
  '10041',
  '05010',
  '40002',
  '02040',
  '10500',
  '00006',
];

export const about: About = {
  name: 'fleissKappa',
  sentence: 'Agreement of more than two observers beyond what chance would produce.',
  formula: 'κ = (P̄ − Σ p_j²) / (1 − Σ p_j²), P_i = (Σ n_ij² − m)/(m(m − 1))',
  source: 'Fleiss 1971, Psychol Bull 76:378-382; error: Fleiss, Nee & Landis 1979, Psychol Bull 86:974-977',
  check: {
    input: 'fleissKappa of 30 patients, 6 observers, 5 codes',
    expected: 0.43,
    source: 'Fleiss 1971, Table 1 (cells from memory, margins reproduced)',
    tolerance: 5e-4,
  },
  recompute: () => fleissKappa(table1.map((row) => Array.from(row, Number))).kappa,
};
