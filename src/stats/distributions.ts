import betaCdfOf from '@stdlib/stats-base-dists-beta-cdf';
import betaQuantileOf from '@stdlib/stats-base-dists-beta-quantile';
import chiSquareQuantileOf from '@stdlib/stats-base-dists-chisquare-quantile';
import fQuantileOf from '@stdlib/stats-base-dists-f-quantile';
import normalCdfOf from '@stdlib/stats-base-dists-normal-cdf';
import tCdfOf from '@stdlib/stats-base-dists-t-cdf';
import tQuantileOf from '@stdlib/stats-base-dists-t-quantile';
import { gammaHalfStep } from './gammaHalfStep.ts';
import { incompleteGamma } from './incompleteGamma.ts';
import { mendQuantile } from './mendQuantile.ts';

// The one file that imports the library: a bundle that needs no tails of distributions carries none of it.
// Every function gives NaN for NaN and for parameters that are not positive. Both tails have their own function,
// since one minus a tail has no digits left far out.

/** Share of the standard normal distribution below z. The upper tail is normalCdf(−z). */
export function normalCdf(z: number): number {
  return normalCdfOf(z, 0, 1);
}

/** Two-sided p of a normal z. */
export function normalTwoSided(z: number): number {
  return 2 * normalCdf(-Math.abs(z));
}

/** Share of Student's t below x. The upper tail is tCdf(−x, df). */
export function tCdf(x: number, df: number): number {
  return tCdfOf(x, df);
}

/** Two-sided p of Student's t. */
export function tTwoSided(t: number, df: number): number {
  return 2 * tCdf(-Math.abs(t), df);
}

/**
 * Quantile of Student's t. The library loses its digits near the median (0 for p = .499999 at a million degrees of
 * freedom) and one degree's far tails; there Newton steps on the mass between 0 and x, here the closed form.
 */
export function tQuantile(p: number, df: number): number {
  const mass = p - 0.5;
  if (mass === 0 && df > 0) return 0;
  if (df === 1 && p > 0 && p < 1) {
    if (Math.abs(mass) < 0.25) return Math.tan(Math.PI * mass);
    return Math.sign(mass) / Math.tan(Math.PI * (mass < 0 ? p : 1 - p));
  }
  const start = tQuantileOf(p, df);
  if (!(Math.abs(mass) < 0.1) || Number.isNaN(start)) return start;
  let x = Math.abs(mass) / tDensity(0, df);
  for (let i = 0; i < 12; i++) {
    const massTo = betaCdf((x * x) / (df + x * x), 0.5, df / 2) / 2;
    const step = (massTo - Math.abs(mass)) / tDensity(x, df);
    x -= step;
    if (Math.abs(step) <= 1e-15 * x) break;
  }
  return mass < 0 ? -x : x;
}

function tDensity(x: number, df: number): number {
  const atZero = gammaHalfStep(df / 2) / Math.sqrt(2 * Math.PI);
  return atZero * Math.exp((-(df + 1) / 2) * Math.log1p((x * x) / df));
}

/** The t of a two-sided interval: 2.26 for a confidence of 0.95 and 9 degrees of freedom. */
export function twoSidedT(confidence: number, df: number): number {
  return df > 0 ? -tQuantile((1 - confidence) / 2, df) : Number.NaN;
}

/** Share of chi-square below x. */
export function chiSquareCdf(x: number, df: number): number {
  return df > 0 ? incompleteGamma(df / 2, x / 2).lower : Number.NaN;
}

/** Share of chi-square above x, to its own digits far out. */
export function chiSquareUpper(x: number, df: number): number {
  return df > 0 ? incompleteGamma(df / 2, x / 2).upper : Number.NaN;
}

/** Quantile of chi-square; the library is off in the seventh digit at a million degrees of freedom. */
export function chiSquareQuantile(p: number, df: number): number {
  const start = chiSquareQuantileOf(p, df);
  return p < 0.5
    ? mendQuantile(start, p, (x) => chiSquareCdf(x, df))
    : mendQuantile(start, 1 - p, (x) => chiSquareUpper(x, df));
}

/** Share of F below x, through the beta distribution: the library's own loses small x. */
export function fCdf(x: number, df1: number, df2: number): number {
  return x <= 0 ? 0 : betaCdf((df1 * x) / (df2 + df1 * x), df1 / 2, df2 / 2);
}

/** Share of F above x. */
export function fUpper(x: number, df1: number, df2: number): number {
  return x <= 0 ? 1 : betaCdf(df2 / (df2 + df1 * x), df2 / 2, df1 / 2);
}

/** Quantile of F, its lower tail mended where the library stops (5 and 15 degrees, p = 1e-100). */
export function fQuantile(p: number, df1: number, df2: number): number {
  const start = fQuantileOf(p, df1, df2);
  return p < 0.5
    ? mendQuantile(start, p, (x) => fCdf(x, df1, df2))
    : mendQuantile(start, 1 - p, (x) => fUpper(x, df1, df2));
}

/** Share of the beta distribution below x. The upper tail is betaCdf(1 − x, b, a). */
export function betaCdf(x: number, a: number, b: number): number {
  return betaCdfOf(x, a, b);
}

/** Quantile of the beta distribution, its lower half checked against the distribution and mended. */
export function betaQuantile(p: number, a: number, b: number): number {
  const start = betaQuantileOf(p, a, b);
  return p < 0.5 ? mendQuantile(start, p, (x) => betaCdf(x, a, b)) : start;
}
