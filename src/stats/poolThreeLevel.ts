import type { About } from './about.ts';
import { climb } from './climb.ts';
import { twoSidedT } from './distributions.ts';
import { mean } from './moments.ts';
import { twoSidedZ } from './normalQuantile.ts';
import { requireConfidence, requireFinite, requireSameLength, requireThat } from './requireThat.ts';
import { type Cluster, threeLevelLikelihood } from './threeLevelLikelihood.ts';

export interface ThreeLevelOptions {
  /** `t` has effects − 1 degrees of freedom. */
  readonly inference: 'normal' | 't';
  readonly confidence?: number;
}

export interface ThreeLevelEffect {
  readonly estimate: number;
  readonly standardError: number;
  readonly lower: number;
  readonly upper: number;
  /** Variance between clusters (classes). */
  readonly varianceBetween: number;
  /** Variance of true effects within a cluster. */
  readonly varianceWithin: number;
  readonly logLikelihood: number;
  /** False where the iteration found no top: do not report the figures then. */
  readonly converged: boolean;
}

/**
 * Average of effects that come in clusters (several effects of one class), with restricted maximum likelihood
 * estimates of the variance between clusters and of the variance within them. The log-likelihood has the constant
 * ½ ln|X'X|. A variance of 0 is a legitimate estimate.
 *
 * Degrees of freedom for `t`: number of effects − 1. Undefined (NaN, converged false): fewer than two effects, or a
 * sampling variance of 0. With a single cluster, or every cluster holding one effect, the two variances cannot be
 * told apart: undefined. Relative error 1e-8 (iterated).
 *
 * Sources: Konstantopoulos 2011, Res Synth Methods 2:61-76; Cheung 2014, Psychol Methods 19:211-229.
 *
 * @example poolThreeLevel([0.3, 0.5, 0.1, 0.9], [0.1, 0.1, 0.1, 0.1], ['A', 'A', 'B', 'B'], { inference: 'normal' }).estimate // → 0.45
 */
export function poolThreeLevel(
  effects: ArrayLike<number>,
  variances: ArrayLike<number>,
  clusters: ArrayLike<string | number>,
  { inference, confidence = 0.95 }: ThreeLevelOptions,
): ThreeLevelEffect {
  requireSameLength(effects, variances, 'effects, variances');
  requireSameLength(effects, clusters, 'effects, clusters');
  requireFinite(effects, 'effects');
  requireFinite(variances, 'variances');
  requireConfidence(confidence);
  requireThat(inference === 'normal' || inference === 't', 'inference', 'must be "normal" or "t"');
  const y = Array.from(effects);
  const v = Array.from(variances);
  requireThat(
    v.every((variance) => variance >= 0),
    'variances',
    'must not be negative',
  );
  const grouped = groupByCluster(y, v, clusters);
  const canTellApart = grouped.length > 1 && grouped.length < y.length;
  if (!canTellApart || v.includes(0)) return undefinedResult();
  const centre = mean(y);
  const spread = y.reduce((sum, effect) => sum + (effect - centre) ** 2, 0) / (y.length - 1);
  const unit = Math.max(spread, Math.min(...v));
  const { at, converged } = climb((pair) => threeLevelLikelihood(grouped, pair), unit);
  const { estimate, variance, logLikelihood } = threeLevelLikelihood(grouped, at);
  const standardError = Math.sqrt(variance);
  const half =
    standardError * (inference === 'normal' ? twoSidedZ(confidence) : twoSidedT(confidence, y.length - 1));
  return {
    estimate,
    standardError,
    lower: estimate - half,
    upper: estimate + half,
    varianceBetween: at[0],
    varianceWithin: at[1],
    logLikelihood,
    converged,
  };
}

function groupByCluster(
  effects: readonly number[],
  variances: readonly number[],
  clusters: ArrayLike<string | number>,
): Cluster[] {
  const groups = new Map<string | number, { effects: number[]; variances: number[] }>();
  effects.forEach((effect, i) => {
    const name = clusters[i] as string | number;
    const group = groups.get(name) ?? { effects: [], variances: [] };
    group.effects.push(effect);
    group.variances.push(variances[i] as number);
    groups.set(name, group);
  });
  return [...groups.values()];
}

function undefinedResult(): ThreeLevelEffect {
  const none = Number.NaN;
  return {
    estimate: none,
    standardError: none,
    lower: none,
    upper: none,
    varianceBetween: none,
    varianceWithin: none,
    logLikelihood: none,
    converged: false,
  };
}

export const about: About = {
  name: 'poolThreeLevel',
  sentence:
    'The average effect when several effects come from the same class, and how classes and effects differ.',
  formula: 'y_ij = μ + u_i + w_ij + e_ij, variances of u and w by restricted maximum likelihood',
  source: 'Konstantopoulos 2011, Res Synth Methods 2:61-76; Cheung 2014, Psychol Methods 19:211-229',
  check: {
    input: "poolThreeLevel([0, 1, 2, 3], [0.1, 0.1, 0.1, 0.1], ['A', 'A', 'B', 'B'], …).varianceWithin",
    expected: 0.4,
    source: 'closed form when balanced: mean square within clusters (.5) less the sampling variance (.1)',
    tolerance: 1e-8,
  },
  recompute: () =>
    poolThreeLevel([0, 1, 2, 3], [0.1, 0.1, 0.1, 0.1], ['A', 'A', 'B', 'B'], { inference: 'normal' })
      .varianceWithin,
};
