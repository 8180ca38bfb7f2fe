import type { About } from './about.ts';
import { requireThat } from './requireThat.ts';

/**
 * How many independent looks n looks with lag-one correlation r are worth: n(1 − r)/(1 + r), for many looks whose
 * correlation fades geometrically. At most n for r ≥ 0; above n for negative r (alternating looks).
 *
 * Undefined (NaN): r NaN (a child always on-task has no r), or r = −1.
 *
 * Source: Bayley & Hammersley 1946, J R Stat Soc Suppl 8:184-197 (limit for large n).
 *
 * @example effectiveLooks(60, 0.5) // → 20
 */
export function effectiveLooks(n: number, r: number): number {
  requireThat(Number.isFinite(n) && n >= 0, 'n', 'must be a count');
  if (Number.isNaN(r)) return Number.NaN;
  requireThat(r >= -1 && r <= 1, 'r', 'must lie between -1 and 1');
  return r === -1 ? Number.NaN : (n * (1 - r)) / (1 + r);
}

export const about: About = {
  name: 'effectiveLooks',
  sentence: 'How many independent looks the looks at one child are worth.',
  formula: 'n (1 − r) / (1 + r)',
  source: 'Bayley & Hammersley 1946, J R Stat Soc Suppl 8:184-197',
  check: {
    input: 'effectiveLooks(60, 0.5)',
    expected: 20,
    source: 'by hand: 60 × .5 / 1.5',
    tolerance: 1e-12,
  },
  recompute: () => effectiveLooks(60, 0.5),
};
