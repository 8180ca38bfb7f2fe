import type { About } from './about.ts';
import { type CohenKappa, cohenKappa } from './cohenKappa.ts';
import { type CountTable, margins } from './countTable.ts';

export interface KappaOfCode extends CohenKappa {
  /** Place of the code in the table. */
  readonly code: number;
  /** The table collapsed to this code against all others. */
  readonly table: [[number, number], [number, number]];
}

/**
 * Cohen's kappa of each code against all others, in the table's order.
 *
 * Undefined (NaN) for a code that neither observer used, and for one that both always used.
 *
 * Source: Fleiss 1981, Statistical methods for rates and proportions, 2nd ed., chapter 13.
 *
 * @example kappaPerCode([[88, 14, 18], [10, 40, 10], [2, 6, 12]])[0].kappa // → 0.56
 */
export function kappaPerCode(table: CountTable, confidence = 0.95): KappaOfCode[] {
  const { n, rows, columns } = margins(table);
  return rows.map((row, code) => {
    const both = table[code]?.[code] ?? 0;
    const column = columns[code] as number;
    const collapsed: [[number, number], [number, number]] = [
      [both, row - both],
      [column - both, n - row - column + both],
    ];
    return { code, table: collapsed, ...cohenKappa(collapsed, confidence) };
  });
}

export const about: About = {
  name: 'kappaPerCode',
  sentence: 'Kappa for each code by itself, so that a confusion between two codes can be found.',
  formula: 'κ of the 2 × 2 table: this code against all others',
  source: 'Fleiss 1981, Statistical methods for rates and proportions, 2nd ed., chapter 13',
  check: {
    input: 'kappaPerCode([[88, 14, 18], [10, 40, 10], [2, 6, 12]])[0].kappa',
    expected: 0.56,
    source: 'by hand: po .78, pe .50 of the collapsed table of Cohen 1960',
    tolerance: 1e-12,
  },
  recompute: () =>
    kappaPerCode([
      [88, 14, 18],
      [10, 40, 10],
      [2, 6, 12],
    ])[0]?.kappa ?? Number.NaN,
};
