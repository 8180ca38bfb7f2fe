import type { About } from './about.ts';
import type { Code, CodeSeries } from './confusionTable.ts';
import { requireSameLength } from './requireThat.ts';

export interface IntervalAgreement {
  /** Intervals that both observers scored; all else rests on these. */
  readonly compared: number;
  /** Share with the same code, all codes told apart. */
  readonly overall: number;
  /** Both scored the target, of the intervals in which either did (scored-interval agreement). */
  readonly occurrence: number;
  /** Neither scored the target, of the intervals in which at least one did not (unscored-interval agreement). */
  readonly nonOccurrence: number;
  /** Mean of occurrence and non-occurrence agreement. */
  readonly mean: number;
  /** The smaller count of target intervals over the larger: flattering, since the counts may come from different intervals. */
  readonly totalCount: number;
}

/**
 * Interval-by-interval agreement of two observers, as shares (0–1).
 *
 * Missing (left out for both): `null`, `undefined`, or −1 where the target is not −1.
 * Undefined (NaN): everything when nothing is compared; occurrence when neither ever scored the target;
 * non-occurrence when both always did; mean when either is; totalCount for 0 against 0.
 *
 * Source: Hawkins & Dotson 1975, in Ramp & Semb (eds), Behavior analysis: areas of research and application.
 *
 * @example intervalAgreement(['on', 'on', 'off', 'off'], ['on', 'off', 'off', null], 'on').occurrence // → 0.5
 */
export function intervalAgreement(a: CodeSeries, b: CodeSeries, target: Code): IntervalAgreement {
  requireSameLength(a, b, 'a, b');
  const isMissing = (code: Code | null | undefined): boolean =>
    code === null || code === undefined || (code === -1 && target !== -1);
  let compared = 0;
  let same = 0;
  let both = 0;
  let onlyA = 0;
  let onlyB = 0;
  for (let i = 0; i < a.length; i++) {
    const first = a[i];
    const second = b[i];
    if (isMissing(first) || isMissing(second)) continue;
    compared++;
    if (first === second) same++;
    if (first === target && second === target) both++;
    else if (first === target) onlyA++;
    else if (second === target) onlyB++;
  }
  const neither = compared - both - onlyA - onlyB;
  const occurrence = both / (both + onlyA + onlyB);
  const nonOccurrence = neither / (neither + onlyA + onlyB);
  return {
    compared,
    overall: same / compared,
    occurrence,
    nonOccurrence,
    mean: (occurrence + nonOccurrence) / 2,
    totalCount: (both + Math.min(onlyA, onlyB)) / (both + Math.max(onlyA, onlyB)),
  };
}

export const about: About = {
  name: 'intervalAgreement',
  sentence: 'How often two observers gave the same interval the same code, overall and for the target alone.',
  formula:
    'overall = same / compared; occurrence = both / either; non-occurrence = neither / at least one not',
  source: 'Hawkins & Dotson 1975, in Ramp & Semb (eds), Behavior analysis: areas of research and application',
  check: {
    input: 'intervalAgreement of 40 both, 9 first only, 6 second only, 45 neither: occurrence',
    expected: 40 / 55,
    source: 'counted: 40 / (40 + 9 + 6); table from Feinstein & Cicchetti 1990, J Clin Epidemiol 43:543-549',
    tolerance: 1e-12,
  },
  recompute: () => {
    const { a, b } = seriesOf(40, 9, 6, 45);
    return intervalAgreement(a, b, 1).occurrence;
  },
};

function seriesOf(both: number, onlyA: number, onlyB: number, neither: number): { a: number[]; b: number[] } {
  const run = (times: number, code: number): number[] => new Array<number>(times).fill(code);
  return {
    a: [...run(both, 1), ...run(onlyA, 1), ...run(onlyB, 0), ...run(neither, 0)],
    b: [...run(both, 1), ...run(onlyA, 0), ...run(onlyB, 1), ...run(neither, 0)],
  };
}
