import type { About } from './about.ts';
import { mean, sampleVariance } from './moments.ts';
import { type PhaseScores, present } from './phaseScores.ts';

export interface LogResponseRatio {
  readonly estimate: number;
  readonly standardError: number;
}

/**
 * Natural logarithm of the ratio of the phases' means, corrected for small samples:
 * ln(m_b/m_a) + s_b²/(2 n_b m_b²) − s_a²/(2 n_a m_a²), with its standard error √(s_a²/(n_a m_a²) + s_b²/(n_b m_b²)),
 * which takes sessions as independent. exp(estimate) − 1 is the relative change. Poor near 100 %: use points there.
 *
 * Undefined (NaN): a mean of 0 or below, fewer than two scores in a phase. Relative error 1e-10.
 *
 * Source: Pustejovsky 2018, J Sch Psychol 68:99-112.
 *
 * @example logResponseRatio([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]).estimate // → 0.13583
 */
export function logResponseRatio(a: PhaseScores, b: PhaseScores): LogResponseRatio {
  const before = present(a, 'a');
  const after = present(b, 'b');
  const meanBefore = mean(before);
  const meanAfter = mean(after);
  if (!(meanBefore > 0 && meanAfter > 0)) return { estimate: Number.NaN, standardError: Number.NaN };
  const partBefore = sampleVariance(before) / (before.length * meanBefore ** 2);
  const partAfter = sampleVariance(after) / (after.length * meanAfter ** 2);
  return {
    estimate: Math.log(meanAfter / meanBefore) + (partAfter - partBefore) / 2,
    standardError: Math.sqrt(partBefore + partAfter),
  };
}

export const about: About = {
  name: 'logResponseRatio',
  sentence: 'How many times as high the level is after the change, on the scale on which studies are pooled.',
  formula: 'ln(m_b/m_a) + s_b²/(2 n_b m_b²) − s_a²/(2 n_a m_a²)',
  source: 'Pustejovsky 2018, J Sch Psychol 68:99-112',
  check: {
    input: 'logResponseRatio([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]).standardError',
    expected: Math.sqrt(10 / (5 * 66 ** 2) + 14.8 / (5 * 75.6 ** 2)),
    source: 'by hand: means 66 and 75.6, variances 10 and 14.8',
    tolerance: 1e-12,
  },
  recompute: () => logResponseRatio([62, 70, 66, 64, 68], [74, 78, 70, 80, 76]).standardError,
};
