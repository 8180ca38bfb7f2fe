import {
  type Child,
  type Design,
  designOf,
  gradientOf,
  type RandomInterceptFit,
  randomInterceptLikelihood,
} from './randomInterceptLikelihood.ts';
import { dot, type Matrix, times } from './smallMatrix.ts';

export interface RandomIntercept {
  readonly coefficients: number[];
  readonly covariance: Matrix;
  readonly df: number[];
  readonly childVariance: number;
  readonly residualVariance: number;
  readonly logLikelihood: number;
}

/**
 * Fits a linear model with a random intercept for each child by restricted maximum likelihood. The residual variance
 * is profiled out; the ratio of the two variances is the highest maximum on a grid, then bisected to the last digit.
 * Undefined where the design or the data leave no estimate.
 */
export function fitRandomIntercept(children: readonly Child[]): RandomIntercept | undefined {
  const n = children.reduce((sum, { scores }) => sum + scores.length, 0);
  const size = children[0]?.rows[0]?.length ?? 0;
  if (n <= size || children.every(({ scores }) => scores.length < 2)) return undefined;
  const design = designOf(children);
  const profile = (ratio: number): Profile | undefined => profileAt(design, ratio, n - size);
  const ratio = bestRatio(profile);
  const best = profile(ratio);
  if (!best || !(best.residual > 1e-20 * largestSquare(children))) return undefined;
  const residualVariance = best.residual;
  const childVariance = ratio * residualVariance;
  const fit = randomInterceptLikelihood(design, childVariance, residualVariance);
  if (!fit) return undefined;
  return {
    coefficients: fit.coefficients,
    covariance: fit.covariance,
    df: satterthwaite(design, fit, childVariance, residualVariance, n - size),
    childVariance,
    residualVariance,
    logLikelihood: fit.logLikelihood,
  };
}

interface Profile {
  readonly residual: number;
  readonly logLikelihood: number;
  /** Has the sign of the derivative of the profiled log-likelihood in the ratio. */
  readonly slope: number;
}

function profileAt(design: Design, ratio: number, freedom: number): Profile | undefined {
  const fit = randomInterceptLikelihood(design, ratio, 1);
  if (!fit) return undefined;
  const residual = fit.squares / freedom;
  return {
    residual,
    logLikelihood: -0.5 * (fit.determinants + freedom * (Math.log(residual) + 1)),
    slope: fit.pull[0] / residual - fit.expected[0],
  };
}

function bestRatio(profile: (ratio: number) => Profile | undefined): number {
  let best = 0;
  const atZero = profile(0);
  let height = atZero?.logLikelihood ?? Number.NEGATIVE_INFINITY;
  let low = 0;
  let slopeAtLow = atZero?.slope ?? 0;
  for (let step = -24; step <= 24; step++) {
    const high = 10 ** (step / 4);
    const there = profile(high);
    if (!there) break;
    if (slopeAtLow > 0 && there.slope <= 0) {
      const root = bisect((ratio) => profile(ratio)?.slope ?? 0, low, high);
      const here = profile(root)?.logLikelihood ?? Number.NEGATIVE_INFINITY;
      if (here > height) {
        best = root;
        height = here;
      }
    }
    low = high;
    slopeAtLow = there.slope;
  }
  return best;
}

function bisect(f: (x: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  for (let i = 0; i < 100; i++) {
    const middle = (low + high) / 2;
    if (middle <= low || middle >= high) break;
    if (f(middle) > 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

function largestSquare(children: readonly Child[]): number {
  return children.reduce((top, { scores }) => scores.reduce((t, s) => Math.max(t, s * s), top), 0);
}

/** Satterthwaite's degrees of freedom of each coefficient. */
function satterthwaite(
  design: Design,
  fit: RandomInterceptFit,
  childVariance: number,
  residual: number,
  freedom: number,
): number[] {
  if (childVariance === 0) return fit.coefficients.map(() => freedom);
  const [[a, b], [, d]] = information(design, childVariance, residual);
  const determinant = a * d - b * b;
  return fit.coefficients.map((_, i) => {
    const column = fit.covariance[i] as number[];
    // Derivative of the coefficient's variance: c′ (X′V⁻¹ V_k V⁻¹ X) c with c a column of the covariance.
    const [child, rest] = fit.change.map((change) => dot(column, times(change, column))) as [number, number];
    const spread = (child * child * d - 2 * child * rest * b + rest * rest * a) / determinant;
    return (2 * (column[i] as number) ** 2) / spread;
  });
}

/** Observed information about the two variances: differences of the derivatives, to the fourth order. */
function information(
  design: Design,
  childVariance: number,
  residual: number,
): [[number, number], [number, number]] {
  const step = 1e-3;
  const along = (child: number, rest: number): [number, number] => {
    const slopes = (times: number): [number, number] => {
      const there = randomInterceptLikelihood(design, childVariance + times * child, residual + times * rest);
      return there ? gradientOf(there) : [Number.NaN, Number.NaN];
    };
    const [m2, m1, p1, p2] = [slopes(-2), slopes(-1), slopes(1), slopes(2)];
    const size = child + rest;
    return [0, 1].map(
      (k) =>
        -((m2[k] as number) - 8 * (m1[k] as number) + 8 * (p1[k] as number) - (p2[k] as number)) /
        (12 * size),
    ) as [number, number];
  };
  return [along(step * (childVariance + 0.1 * residual), 0), along(0, step * residual)];
}
