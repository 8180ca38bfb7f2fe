import type { About } from './about.ts';
import { requireSameLength, requireThat } from './requireThat.ts';

export interface ChartPoint {
  readonly p: number;
  readonly lower: number;
  readonly upper: number;
  /** Strictly beyond its own limits. */
  readonly outside: boolean;
}

export interface ProportionChart {
  readonly centre: number;
  readonly points: ChartPoint[];
}

/**
 * Control chart of shares: one point for each session, `counts` out of `ns`, around the common share with limits of
 * three standard errors for each session's own number of looks, cut to 0–1.
 *
 * Looks within a session are taken as independent, so limits are too narrow when they are not. A session with no look
 * has undefined (NaN) figures, is not outside, and leaves the centre alone; no look at all: centre NaN. Relative error 1e-10.
 *
 * Sources: Shewhart 1931, Economic control of quality of manufactured product; Montgomery, Introduction to
 * statistical quality control (p chart with variable sample size).
 *
 * @example proportionChart([40, 10], [50, 50]).centre // → 0.5
 */
export function proportionChart(counts: ArrayLike<number>, ns: ArrayLike<number>): ProportionChart {
  requireSameLength(counts, ns, 'counts, ns');
  let successes = 0;
  let looks = 0;
  for (let i = 0; i < ns.length; i++) {
    const n = ns[i] as number;
    const x = counts[i] as number;
    requireThat(Number.isFinite(n) && n >= 0, 'ns', 'must hold counts, none negative');
    requireThat(x >= 0 && x <= n, 'counts', 'must lie between 0 and their number of looks');
    successes += x;
    looks += n;
  }
  const centre = successes / looks;
  const points = Array.from({ length: ns.length }, (_, i): ChartPoint => {
    const n = ns[i] as number;
    if (n === 0) return { p: Number.NaN, lower: Number.NaN, upper: Number.NaN, outside: false };
    const p = (counts[i] as number) / n;
    const reach = 3 * Math.sqrt((centre * (1 - centre)) / n);
    const lower = Math.max(0, centre - reach);
    const upper = Math.min(1, centre + reach);
    // A share that only rounding puts beyond its limit is on it.
    return { p, lower, upper, outside: p < lower - 1e-12 || p > upper + 1e-12 };
  });
  return { centre, points };
}

export const about: About = {
  name: 'proportionChart',
  sentence: 'Which sessions differ from the others by more than their number of looks explains.',
  formula: 'p̄ ± 3 √(p̄(1 − p̄)/n_i), cut to 0–1',
  source:
    'Shewhart 1931, Economic control of quality of manufactured product; Montgomery, Introduction to statistical quality control',
  check: {
    input: 'proportionChart([45, 27], [60, 30]).points[0].upper',
    expected: 0.8 + 3 * Math.sqrt(0.16 / 60),
    source: 'by hand: centre 72/90 = .8',
    tolerance: 1e-12,
  },
  recompute: () => proportionChart([45, 27], [60, 30]).points[0]?.upper ?? Number.NaN,
};
