import type { About } from './about.ts';
import { momentVariance, restrictedVariance, weighted } from './betweenVariance.ts';
import { chiSquareUpper, twoSidedT } from './distributions.ts';
import { twoSidedZ } from './normalQuantile.ts';
import { requireConfidence, requireFinite, requireSameLength, requireThat } from './requireThat.ts';

export interface PoolingOptions {
  /** How the variance between studies is estimated. */
  readonly estimator: 'REML' | 'DL';
  /** How the interval is formed; Knapp–Hartung is not truncated and can be narrower than the normal one. */
  readonly inference: 'knapp-hartung' | 'normal';
  readonly confidence?: number;
}

export interface PooledEffect {
  readonly k: number;
  readonly estimate: number;
  readonly standardError: number;
  readonly lower: number;
  readonly upper: number;
  /** Variance between studies (or classes), in squared units of the effects. */
  readonly tau2: number;
  readonly q: number;
  readonly qP: number;
  /** 0–100. */
  readonly i2: number;
  readonly h2: number;
  readonly predictionLower: number;
  readonly predictionUpper: number;
}

/**
 * Random-effects average of k independent effects with their sampling variances. I² and H² come from tau² and the
 * typical variance; the prediction interval uses t(k − 1) with Knapp–Hartung and z with normal inference.
 *
 * One effect: the estimate is that effect, and normal inference gives its own interval; everything about
 * differences between effects is undefined (NaN) but Q, which is 0, and so is Knapp–Hartung. No effect, or a variance of 0: all NaN.
 * DL to 1e-10; REML's tau² to 1e-8 (the highest maximum; iterated).
 *
 * Sources: DerSimonian & Laird 1986, Control Clin Trials 7:177-188; Viechtbauer 2005, J Educ Behav Stat 30:261-293;
 * Knapp & Hartung 2003, Stat Med 22:2693-2710; Higgins & Thompson 2002, Stat Med 21:1539-1558.
 *
 * @example poolRandomEffects([0.2, 0.5, 0.9, 0.4], [0.04, 0.04, 0.04, 0.04], { estimator: 'REML', inference: 'normal' }).tau2 // → 0.0467
 */
export function poolRandomEffects(
  effects: ArrayLike<number>,
  variances: ArrayLike<number>,
  { estimator, inference, confidence = 0.95 }: PoolingOptions,
): PooledEffect {
  requireSameLength(effects, variances, 'effects, variances');
  requireFinite(effects, 'effects');
  requireFinite(variances, 'variances');
  requireConfidence(confidence);
  requireThat(estimator === 'REML' || estimator === 'DL', 'estimator', 'must be "REML" or "DL"');
  requireThat(
    inference === 'knapp-hartung' || inference === 'normal',
    'inference',
    'must be "knapp-hartung" or "normal"',
  );
  const y = Array.from(effects);
  const v = Array.from(variances);
  requireThat(
    v.every((variance) => variance >= 0),
    'variances',
    'must not be negative',
  );
  const k = y.length;
  if (k === 0 || v.includes(0)) return undefinedFor(k);
  const several = k > 1;
  const fixed = weighted(y, v, 0);
  const tau2 = !several ? Number.NaN : estimator === 'DL' ? momentVariance(y, v) : restrictedVariance(y, v);
  const random = several ? weighted(y, v, tau2) : fixed;
  const scale = inference === 'normal' ? 1 : random.q / (k - 1);
  const standardError = Math.sqrt(scale / random.sum);
  const critical = inference === 'normal' ? twoSidedZ(confidence) : twoSidedT(confidence, k - 1);
  const half = critical * standardError;
  const predictionHalf = critical * Math.sqrt(standardError ** 2 + tau2);
  const typical = ((k - 1) * fixed.sum) / (fixed.sum ** 2 - fixed.sumOfSquaredWeights);
  return {
    k,
    estimate: random.estimate,
    standardError,
    lower: random.estimate - half,
    upper: random.estimate + half,
    tau2,
    q: fixed.q,
    qP: several ? chiSquareUpper(fixed.q, k - 1) : Number.NaN,
    i2: several ? (100 * tau2) / (tau2 + typical) : Number.NaN,
    h2: several ? tau2 / typical + 1 : Number.NaN,
    predictionLower: random.estimate - predictionHalf,
    predictionUpper: random.estimate + predictionHalf,
  };
}

function undefinedFor(k: number): PooledEffect {
  const none = Number.NaN;
  return {
    k,
    estimate: none,
    standardError: none,
    lower: none,
    upper: none,
    tau2: none,
    q: none,
    qP: none,
    i2: none,
    h2: none,
    predictionLower: none,
    predictionUpper: none,
  };
}

export const about: About = {
  name: 'poolRandomEffects',
  sentence: 'The average effect over classes or studies, and how much the effects truly differ among them.',
  formula: 'Σ w y / Σ w, w = 1/(v + τ²), τ² by restricted maximum likelihood or by moments',
  source:
    'DerSimonian & Laird 1986, Control Clin Trials 7:177-188; Viechtbauer 2005, J Educ Behav Stat 30:261-293; Knapp & Hartung 2003, Stat Med 22:2693-2710',
  check: {
    input: 'poolRandomEffects of four effects .2 .5 .9 .4, each with variance .04: tau2',
    expected: 0.26 / 3 - 0.04,
    source: 'closed form with equal variances: sample variance of the effects − .04',
    tolerance: 1e-10,
  },
  recompute: () =>
    poolRandomEffects([0.2, 0.5, 0.9, 0.4], [0.04, 0.04, 0.04, 0.04], {
      estimator: 'REML',
      inference: 'normal',
    }).tau2,
};
