import type { About } from './about.ts';
import { mean, sumOfSquares } from './moments.ts';
import { requireFinite } from './requireThat.ts';

/**
 * Correlation of each look with the next, centred on the mean of the whole series: Σ (x_t − m)(x_{t+1} − m) / Σ (x_t − m)².
 * For 0/1 series of looks at one child (1 = on-task), and for any numbers. Looks equally spaced in time.
 *
 * Undefined (NaN): fewer than two looks, or all the same. Relative error 1e-10.
 *
 * Source: Box & Jenkins 1970, Time series analysis, chapter 2 (first sample autocorrelation).
 *
 * @example lagOneAutocorrelation([1, 1, 0, 0]) // → 0.25
 */
export function lagOneAutocorrelation(series: ArrayLike<number>): number {
  requireFinite(series, 'series');
  const centre = mean(series);
  const spread = sumOfSquares(series);
  if (series.length < 2 || spread === 0) return Number.NaN;
  let products = 0;
  for (let i = 1; i < series.length; i++) {
    products += ((series[i - 1] as number) - centre) * ((series[i] as number) - centre);
  }
  return products / spread;
}

export const about: About = {
  name: 'lagOneAutocorrelation',
  sentence: 'How much one look at a child tells about the next.',
  formula: 'r = Σ (x_t − m)(x_{t+1} − m) / Σ (x_t − m)²',
  source: 'Box & Jenkins 1970, Time series analysis, chapter 2',
  check: {
    input: 'lagOneAutocorrelation([1, 1, 0, 0])',
    expected: 0.25,
    source: 'by hand: (.25 − .25 + .25) / 1',
    tolerance: 1e-12,
  },
  recompute: () => lagOneAutocorrelation([1, 1, 0, 0]),
};
