import {
  addOuter,
  addScaled,
  dot,
  invert,
  type Matrix,
  times,
  traceOfProduct,
  zeros,
} from './smallMatrix.ts';

/** One child's scores and their rows of the design. */
export interface Child {
  readonly scores: number[];
  readonly rows: number[][];
}

/** What the likelihood needs of the data, summed up once. */
export interface Design {
  readonly children: readonly { count: number; columnSums: number[]; scoreSum: number }[];
  readonly scores: readonly number[];
  readonly rows: readonly number[][];
  /** X′X and X′y over all rows. */
  readonly cross: Matrix;
  readonly crossScores: number[];
}

export interface RandomInterceptFit {
  readonly coefficients: number[];
  /** Covariance of the coefficients. */
  readonly covariance: Matrix;
  readonly logLikelihood: number;
  /** ln of the determinants of V and X′V⁻¹X, and the constant: −2 log-likelihood less `squares`. */
  readonly determinants: number;
  /** r′V⁻¹r of the residuals. */
  readonly squares: number;
  /** In the variance between children and the residual variance: derivative = ½ (pull − expected). */
  readonly expected: [child: number, residual: number];
  readonly pull: [child: number, residual: number];
  /** Derivatives of X′V⁻¹X in the same two, with the sign turned. */
  readonly change: [child: Matrix, residual: Matrix];
}

export function designOf(children: readonly Child[]): Design {
  const size = children[0]?.rows[0]?.length ?? 0;
  const cross = zeros(size);
  const crossScores = new Array<number>(size).fill(0);
  const summed = children.map(({ scores, rows }) => {
    const columnSums = new Array<number>(size).fill(0);
    rows.forEach((row, r) => {
      addOuter(cross, row, 1);
      row.forEach((x, j) => {
        columnSums[j] = (columnSums[j] as number) + x;
        crossScores[j] = (crossScores[j] as number) + x * (scores[r] as number);
      });
    });
    return { count: scores.length, columnSums, scoreSum: scores.reduce((sum, score) => sum + score, 0) };
  });
  const scores = children.flatMap((child) => child.scores);
  return { children: summed, scores, rows: children.flatMap(({ rows }) => rows), cross, crossScores };
}

/**
 * Restricted likelihood of a linear model with a random intercept for each child, at given variances. A child's
 * covariance is residual · I + childVariance · J, whose inverse is known, so that the whole is linear in the scores.
 * Undefined where the design cannot tell its columns apart. The log-likelihood carries no ½ ln|X'X|.
 */
export function randomInterceptLikelihood(
  { children, scores, rows, cross, crossScores }: Design,
  childVariance: number,
  residual: number,
): RandomInterceptFit | undefined {
  const size = cross.length;
  const information = zeros(size);
  addScaled(information, cross, 1 / residual);
  const right = crossScores.map((sum) => sum / residual);
  let determinants = (scores.length - size) * Math.log(2 * Math.PI);
  for (const { count, columnSums, scoreSum } of children) {
    const inflated = residual + childVariance * count;
    const shrink = childVariance / (residual * inflated);
    addOuter(information, columnSums, -shrink);
    columnSums.forEach((x, j) => {
      right[j] = (right[j] as number) - shrink * x * scoreSum;
    });
    determinants += (count - 1) * Math.log(residual) + Math.log(inflated);
  }
  const inverted = invert(information);
  if (!inverted) return undefined;
  const { inverse: covariance, logDeterminant } = inverted;
  determinants += logDeterminant;
  const coefficients = times(covariance, right);
  let rest = 0;
  rows.forEach((row, r) => {
    rest += ((scores[r] as number) - dot(row, coefficients)) ** 2;
  });
  let squares = rest / residual;
  let pullResidual = rest / residual ** 2;
  let pullChild = 0;
  let traceChild = 0;
  let traceResidual = 0;
  const changeChild = zeros(size);
  const changeResidual = zeros(size);
  addScaled(changeResidual, cross, 1 / residual ** 2);
  for (const { count, columnSums, scoreSum } of children) {
    const inflated = residual + childVariance * count;
    const ratio = childVariance / inflated;
    const sum = scoreSum - dot(columnSums, coefficients);
    // V⁻¹ of a column v is (v − ratio · its sum)/residual; its square loses this much to the child's sum.
    const lost = (2 * ratio - count * ratio ** 2) / residual ** 2;
    squares -= (ratio * sum ** 2) / residual;
    pullResidual -= lost * sum ** 2;
    pullChild += (sum / inflated) ** 2;
    traceChild += count / inflated;
    traceResidual += (count - count * ratio) / residual;
    addOuter(changeChild, columnSums, 1 / inflated ** 2);
    addOuter(changeResidual, columnSums, -lost);
  }
  return {
    coefficients,
    covariance,
    logLikelihood: -0.5 * (determinants + squares),
    determinants,
    squares,
    expected: [
      traceChild - traceOfProduct(covariance, changeChild),
      traceResidual - traceOfProduct(covariance, changeResidual),
    ],
    pull: [pullChild, pullResidual],
    change: [changeChild, changeResidual],
  };
}

/** Derivatives of the log-likelihood in the variance between children and the residual variance. */
export function gradientOf({ expected, pull }: RandomInterceptFit): [child: number, residual: number] {
  return [0.5 * (pull[0] - expected[0]), 0.5 * (pull[1] - expected[1])];
}
