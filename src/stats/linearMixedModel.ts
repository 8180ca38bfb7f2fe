import type { About } from './about.ts';
import { tTwoSided, twoSidedT } from './distributions.ts';
import { fitRandomIntercept } from './fitRandomIntercept.ts';
import { mean } from './moments.ts';
import type { Child } from './randomInterceptLikelihood.ts';
import { requireConfidence, requireFinite, requireSameLength } from './requireThat.ts';

export interface MixedModelInput {
  readonly score: ArrayLike<number>;
  /** 0 = before, 1 = after (any numbers). */
  readonly phase: ArrayLike<number>;
  /** 0 = control, 1 = treated (any numbers). */
  readonly group: ArrayLike<number>;
  readonly child: ArrayLike<string | number>;
  readonly confidence?: number;
}

export interface FixedEffect {
  /** `intercept`, `phase`, `group`, `phase:group`. */
  readonly name: string;
  readonly estimate: number;
  readonly standardError: number;
  /** Satterthwaite's. */
  readonly df: number;
  readonly lower: number;
  readonly upper: number;
  /** Two-sided, Student's t with these degrees of freedom. */
  readonly p: number;
}

export interface LinearMixedModel {
  readonly fixed: FixedEffect[];
  readonly childVariance: number;
  readonly residualVariance: number;
  readonly logLikelihood: number;
  readonly converged: boolean;
}

const names = ['intercept', 'phase', 'group', 'phase:group'];

/**
 * Linear mixed model score ~ phase × group with a random intercept for each child, by restricted maximum likelihood:
 * with 0/1 coding, `phase` is the change of group 0 and `phase:group` the difference in changes. One row for each
 * score; children may have any number.
 *
 * Degrees of freedom: Satterthwaite's, 2 v²/(g′ A g), v the variance of the estimate, g its derivatives in the two
 * variances, A the inverse of the observed information about them; rows − 4 where the child variance is 0 (a
 * legitimate estimate). Undefined (NaN, converged false): a design that cannot tell the four effects apart, no
 * more rows than effects, no child with two rows, or no residual spread. Relative error 1e-8 (iterated).
 *
 * Sources: Laird & Ware 1982, Biometrics 38:963-974; Satterthwaite 1946, Biometrics Bull 2:110-114.
 *
 * @example linearMixedModel({ score: [1, 3, 2, 6, 5, 6, 4, 9], phase: [0, 1, 0, 1, 0, 1, 0, 1], group: [0, 0, 1, 1, 0, 0, 1, 1], child: [1, 1, 2, 2, 3, 3, 4, 4] }).fixed[3].estimate // → 3
 */
export function linearMixedModel({
  score,
  phase,
  group,
  child,
  confidence = 0.95,
}: MixedModelInput): LinearMixedModel {
  requireSameLength(score, phase, 'score, phase');
  requireSameLength(score, group, 'score, group');
  requireSameLength(score, child, 'score, child');
  requireFinite(score, 'score');
  requireFinite(phase, 'phase');
  requireFinite(group, 'group');
  requireConfidence(confidence);
  // Centred scores lose no digits to a high level; the intercept gets it back.
  const level = mean(score);
  const children = new Map<string | number, Child>();
  for (let i = 0; i < score.length; i++) {
    const key = child[i] as string | number;
    const one = children.get(key) ?? { scores: [], rows: [] };
    one.scores.push((score[i] as number) - level);
    const [p, g] = [phase[i] as number, group[i] as number];
    one.rows.push([1, p, g, p * g]);
    children.set(key, one);
  }
  const fit = fitRandomIntercept([...children.values()]);
  return {
    fixed: names.map((name, i): FixedEffect => {
      const estimate = (fit?.coefficients[i] ?? Number.NaN) + (name === 'intercept' ? level : 0);
      const standardError = Math.sqrt(fit?.covariance[i]?.[i] ?? Number.NaN);
      const df = fit?.df[i] ?? Number.NaN;
      const half = twoSidedT(confidence, df) * standardError;
      const p = Number.isNaN(df) ? Number.NaN : tTwoSided(estimate / standardError, df);
      return { name, estimate, standardError, df, lower: estimate - half, upper: estimate + half, p };
    }),
    childVariance: fit?.childVariance ?? Number.NaN,
    residualVariance: fit?.residualVariance ?? Number.NaN,
    logLikelihood: fit?.logLikelihood ?? Number.NaN,
    converged: fit !== undefined,
  };
}

export const about: About = {
  name: 'linearMixedModel',
  sentence:
    'How scores change from before to after in both groups, when each child is watched several times.',
  formula:
    'score = β₀ + β₁ phase + β₂ group + β₃ phase·group + child + residual, by restricted maximum likelihood',
  source: 'Laird & Ware 1982, Biometrics 38:963-974; Satterthwaite 1946, Biometrics Bull 2:110-114',
  check: {
    input: 'linearMixedModel of four children, before and after, two groups: standard error of phase:group',
    expected: Math.sqrt(0.5),
    source:
      'closed form when balanced: changes 2, 1 and 4, 5, their variance .5 in each group: √(.5/2 + .5/2)',
    tolerance: 1e-8,
  },
  recompute: () =>
    linearMixedModel({
      score: [1, 3, 2, 6, 5, 6, 4, 9],
      phase: [0, 1, 0, 1, 0, 1, 0, 1],
      group: [0, 0, 1, 1, 0, 0, 1, 1],
      child: [1, 1, 2, 2, 3, 3, 4, 4],
    }).fixed[3]?.standardError ?? Number.NaN,
};
