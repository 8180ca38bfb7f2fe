/** Effects of one cluster with their sampling variances. */
export interface Cluster {
  readonly effects: readonly number[];
  readonly variances: readonly number[];
}

export type Pair = readonly [between: number, within: number];

export interface ThreeLevelFit {
  readonly estimate: number;
  /** Of the estimate; its root is the standard error. */
  readonly variance: number;
  /** Restricted log-likelihood, with the constants of ½ ln|X'X|. */
  readonly logLikelihood: number;
  /** Its derivatives in the variance between clusters and within them. */
  readonly gradient: Pair;
}

/**
 * Restricted likelihood of effects with a common mean, a variance between clusters and one within, at given
 * variances. Each cluster's covariance is a diagonal plus a constant, so that its inverse is known and the whole is
 * linear in the effects.
 */
export function threeLevelLikelihood(clusters: readonly Cluster[], [between, within]: Pair): ThreeLevelFit {
  let information = 0;
  let total = 0;
  let logDeterminant = 0;
  let n = 0;
  for (const { effects, variances } of clusters) {
    const { sum, sumOfEffects, logs } = sums(effects, variances, within);
    const inflation = 1 + between * sum;
    information += sum / inflation;
    total += sumOfEffects / inflation;
    logDeterminant += logs + Math.log(inflation);
    n += effects.length;
  }
  const estimate = total / information;
  let squares = 0;
  let traceBetween = 0;
  let traceWithin = 0;
  let fixedBetween = 0;
  let fixedWithin = 0;
  let pullBetween = 0;
  let pullWithin = 0;
  for (const { effects, variances } of clusters) {
    const residuals = effects.map((effect) => effect - estimate);
    const { sum, sumOfEffects: pull, sumOfSquares, ofSquares } = sums(residuals, variances, within);
    const inflation = 1 + between * sum;
    squares += ofSquares - (between * pull * pull) / inflation;
    traceBetween += sum / inflation;
    fixedBetween += (sum / inflation) ** 2;
    pullBetween += (pull / inflation) ** 2;
    traceWithin += sum - (between * sumOfSquares) / inflation;
    fixedWithin += sumOfSquares / inflation ** 2;
    residuals.forEach((residual, i) => {
      const weight = 1 / ((variances[i] as number) + within);
      pullWithin += (weight * (residual - (between * pull) / inflation)) ** 2;
    });
  }
  const constants = (n - 1) * Math.log(2 * Math.PI) - Math.log(n);
  return {
    estimate,
    variance: 1 / information,
    logLikelihood: -0.5 * (constants + logDeterminant + Math.log(information) + squares),
    gradient: [
      -0.5 * (traceBetween - fixedBetween / information - pullBetween),
      -0.5 * (traceWithin - fixedWithin / information - pullWithin),
    ],
  };
}

function sums(values: readonly number[], variances: readonly number[], within: number) {
  let sum = 0;
  let sumOfSquares = 0;
  let sumOfEffects = 0;
  let ofSquares = 0;
  let logs = 0;
  values.forEach((value, i) => {
    const variance = (variances[i] as number) + within;
    const weight = 1 / variance;
    sum += weight;
    sumOfSquares += weight * weight;
    sumOfEffects += weight * value;
    ofSquares += weight * value * value;
    logs += Math.log(variance);
  });
  return { sum, sumOfSquares, sumOfEffects, ofSquares, logs };
}
