import { addOuter, dot, invert, type Matrix, times, traceOfProduct, zeros } from './smallMatrix.ts';

/** One child's scores and their rows of the design. */
export interface Child {
  readonly scores: number[];
  readonly rows: number[][];
}

export interface RandomInterceptFit {
  readonly coefficients: number[];
  /** Covariance of the coefficients. */
  readonly covariance: Matrix;
  readonly logLikelihood: number;
  /** Derivatives of the log-likelihood in the variance between children and the residual variance. */
  readonly gradient: [child: number, residual: number];
  /** Derivatives of the inverse covariance of the coefficients in the same two, with the sign turned. */
  readonly change: [child: Matrix, residual: Matrix];
  /** r′V⁻¹r of the residuals. */
  readonly squares: number;
}

/**
 * Restricted likelihood of a linear model with a random intercept for each child, at given variances. A child's
 * covariance is residual · I + childVariance · J, whose inverse is known, so that the whole is linear in the scores.
 * Undefined where the design cannot tell its columns apart. The log-likelihood carries no ½ ln|X'X|.
 */
export function randomInterceptLikelihood(
  children: readonly Child[],
  childVariance: number,
  residual: number,
): RandomInterceptFit | undefined {
  const size = children[0]?.rows[0]?.length ?? 0;
  const information = zeros(size);
  const right = new Array<number>(size).fill(0);
  let logDeterminant = 0;
  let n = 0;
  const totals = children.map(({ scores, rows }) => {
    const count = scores.length;
    const inflated = residual + childVariance * count;
    const columnSums = new Array<number>(size).fill(0);
    rows.forEach((row, r) => {
      addOuter(information, row, 1 / residual);
      row.forEach((x, j) => {
        columnSums[j] = (columnSums[j] as number) + x;
        right[j] = (right[j] as number) + (x * (scores[r] as number)) / residual;
      });
    });
    const scoreSum = scores.reduce((sum, score) => sum + score, 0);
    const shrink = childVariance / (residual * inflated);
    addOuter(information, columnSums, -shrink);
    columnSums.forEach((x, j) => {
      right[j] = (right[j] as number) - shrink * x * scoreSum;
    });
    logDeterminant += (count - 1) * Math.log(residual) + Math.log(inflated);
    n += count;
    return { count, inflated, columnSums, scoreSum };
  });
  const inverted = invert(information);
  if (!inverted) return undefined;
  const { inverse: covariance, logDeterminant: logInformation } = inverted;
  const coefficients = times(covariance, right);
  const changeChild = zeros(size);
  const changeResidual = zeros(size);
  let squares = 0;
  let traceChild = 0;
  let traceResidual = 0;
  let pullChild = 0;
  let pullResidual = 0;
  children.forEach(({ scores, rows }, c) => {
    const { count, inflated, columnSums, scoreSum } = totals[c] as (typeof totals)[number];
    const ratio = childVariance / inflated;
    const pull = (scoreSum - dot(columnSums, coefficients)) / inflated;
    traceChild += count / inflated;
    traceResidual += (count - count * ratio) / residual;
    pullChild += pull * pull;
    addOuter(changeChild, columnSums, 1 / inflated ** 2);
    rows.forEach((row, r) => {
      // V⁻¹ of a column is (column − ratio · its sum)/residual, row by row.
      const left = (scores[r] as number) - dot(row, coefficients);
      const weighted = (left - childVariance * pull) / residual;
      pullResidual += weighted * weighted;
      squares += left * weighted;
      const cleared = row.map((x, j) => (x - ratio * (columnSums[j] as number)) / residual);
      addOuter(changeResidual, cleared, 1);
    });
  });
  const constant = (n - size) * Math.log(2 * Math.PI);
  return {
    coefficients,
    covariance,
    logLikelihood: -0.5 * (constant + logDeterminant + logInformation + squares),
    gradient: [
      -0.5 * (traceChild - traceOfProduct(covariance, changeChild) - pullChild),
      -0.5 * (traceResidual - traceOfProduct(covariance, changeResidual) - pullResidual),
    ],
    change: [changeChild, changeResidual],
    squares,
  };
}
