import type { About } from './about.ts';
import { type CountTable, margins } from './countTable.ts';

export interface PooledKappa {
  readonly kappa: number;
  readonly observedAgreement: number;
  readonly chanceAgreement: number;
}

/**
 * One kappa for several tables (sessions, codes, pairs of observers): the observed and the chance agreement are
 * averaged over the tables, each table counting the same, and kappa is formed from the averages.
 *
 * Tables without any look are left out. Undefined (NaN): no table left; kappa when the mean chance agreement is 1.
 *
 * Source: De Vries, Elliott, Kanouse & Teleki 2008, Field Methods 20:272-282.
 *
 * @example pooledKappa([[[40, 9], [6, 45]], [[80, 10], [5, 5]]]).kappa // → 0.5829
 */
export function pooledKappa(tables: readonly CountTable[]): PooledKappa {
  const used = tables.map((table) => margins(table, 'tables')).filter(({ n }) => n > 0);
  // The two averages as sums of shares of n² keep a perfect record exactly perfect.
  let observed = 0;
  let chance = 0;
  let beyondChance = 0;
  let gained = 0;
  for (const { n, rows, columns, agreed } of used) {
    const byChance = rows.reduce((sum, row, i) => sum + row * (columns[i] as number), 0);
    observed += agreed / n;
    chance += byChance / (n * n);
    gained += (n * agreed - byChance) / (n * n);
    beyondChance += (n * n - byChance) / (n * n);
  }
  return {
    kappa: beyondChance === 0 ? Number.NaN : gained / beyondChance,
    observedAgreement: observed / used.length,
    chanceAgreement: chance / used.length,
  };
}

export const about: About = {
  name: 'pooledKappa',
  sentence:
    'One kappa for several tables, from the average of what was agreed and of what chance would give.',
  formula: 'κ = (mean po − mean pe) / (1 − mean pe)',
  source: 'De Vries, Elliott, Kanouse & Teleki 2008, Field Methods 20:272-282',
  check: {
    input: 'pooledKappa([[[40, 9], [6, 45]], [[80, 10], [5, 5]]]).kappa',
    expected: (0.85 - 0.6404) / (1 - 0.6404),
    source: 'by hand: mean po .85, mean pe (.5008 + .7800)/2 = .6404',
    tolerance: 1e-12,
  },
  recompute: () =>
    pooledKappa([
      [
        [40, 9],
        [6, 45],
      ],
      [
        [80, 10],
        [5, 5],
      ],
    ]).kappa,
};
