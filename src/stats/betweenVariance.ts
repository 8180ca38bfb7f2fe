import { mean } from './moments.ts';

/** Inverse-variance weights and what they give. */
export interface Weighted {
  readonly sum: number;
  readonly estimate: number;
  /** Σ w (y − estimate)². */
  readonly q: number;
  readonly sumOfSquaredWeights: number;
}

export function weighted(effects: readonly number[], variances: readonly number[], tau2: number): Weighted {
  let sum = 0;
  let squares = 0;
  let total = 0;
  effects.forEach((effect, i) => {
    const weight = 1 / ((variances[i] as number) + tau2);
    sum += weight;
    squares += weight * weight;
    total += weight * effect;
  });
  const estimate = total / sum;
  let q = 0;
  effects.forEach((effect, i) => {
    q += (effect - estimate) ** 2 / ((variances[i] as number) + tau2);
  });
  return { sum, estimate, q, sumOfSquaredWeights: squares };
}

/** DerSimonian and Laird's moment estimate of the variance between studies, not below 0. */
export function momentVariance(effects: readonly number[], variances: readonly number[]): number {
  const { sum, q, sumOfSquaredWeights } = weighted(effects, variances, 0);
  return Math.max(0, (q - (effects.length - 1)) / (sum - sumOfSquaredWeights / sum));
}

/** Twice the derivative of the restricted log-likelihood in the variance between studies. */
export function restrictedScore(
  effects: readonly number[],
  variances: readonly number[],
  tau2: number,
): number {
  const { sum, estimate, sumOfSquaredWeights } = weighted(effects, variances, tau2);
  let pull = 0;
  effects.forEach((effect, i) => {
    pull += ((effect - estimate) / ((variances[i] as number) + tau2)) ** 2;
  });
  return pull - sum + sumOfSquaredWeights / sum;
}

function restrictedLogLikelihood(
  effects: readonly number[],
  variances: readonly number[],
  tau2: number,
): number {
  const { sum, q } = weighted(effects, variances, tau2);
  const logs = variances.reduce((total, variance) => total + Math.log(variance + tau2), 0);
  return -0.5 * (logs + Math.log(sum) + q);
}

/**
 * The restricted maximum likelihood estimate of the variance between studies: the highest of all maxima (there can
 * be several), found on a grid and then to the last digits by bisection of the derivative.
 */
export function restrictedVariance(effects: readonly number[], variances: readonly number[]): number {
  const centre = mean(effects);
  const spread = effects.reduce((sum, effect) => sum + (effect - centre) ** 2, 0);
  // Beyond this every maximum has passed: with tau² alone the score's zero is spread/(k − 1).
  const ceiling = 4 * spread + Math.max(...variances);
  const floor = 1e-6 * Math.min(...variances);
  const score = (tau2: number): number => restrictedScore(effects, variances, tau2);
  const steps = 400;
  let best = 0;
  let height = restrictedLogLikelihood(effects, variances, 0);
  let low = 0;
  let atLow = score(0);
  for (let i = 0; i <= steps; i++) {
    const high = floor * (ceiling / floor) ** (i / steps);
    const atHigh = score(high);
    if (atLow > 0 && atHigh <= 0) {
      const root = bisect(score, low, high);
      const here = restrictedLogLikelihood(effects, variances, root);
      if (here > height) {
        best = root;
        height = here;
      }
    }
    low = high;
    atLow = atHigh;
  }
  return best;
}

/** Halves [low, high], where f is positive at low and not at high, until no number lies between. */
function bisect(f: (x: number) => number, low: number, high: number): number {
  let a = low;
  let b = high;
  for (let i = 0; i < 200; i++) {
    const middle = (a + b) / 2;
    if (middle <= a || middle >= b) break;
    if (f(middle) > 0) a = middle;
    else b = middle;
  }
  return (a + b) / 2;
}
