import type { About } from './about.ts';
import type { Code, CodeSeries } from './confusionTable.ts';
import { alphaOf, codeNumbers, krippendorffAlpha } from './krippendorffAlpha.ts';
import { requireConfidence, requireThat } from './requireThat.ts';
import { sampleQuantile } from './sampleQuantile.ts';

export interface AlphaIntervalOptions {
  /** Numbers in [0, 1), one after the other. */
  readonly random: () => number;
  /** How many times the units are drawn anew; 1000 when left out. */
  readonly draws?: number;
  readonly confidence?: number;
}

export interface AlphaInterval {
  readonly alpha: number;
  readonly lower: number;
  readonly upper: number;
}

/** Units with the same codes, in any order of observers, are of one kind. */
interface Kind {
  readonly values: number;
  readonly disagreeing: number;
  readonly counts: [code: number, count: number][];
}

/**
 * Krippendorff's alpha with a percentile bootstrap interval: units with two codes or more are drawn with
 * replacement. Draws in which alpha is undefined (one code only) are passed over. The same generator gives the same
 * interval. Time grows with units × draws.
 *
 * Undefined (NaN): all where alpha is.
 *
 * Source: Efron 1979, Ann Stat 7:1-26 (percentile bootstrap, units resampled); alpha: Krippendorff 2011.
 *
 * @example krippendorffAlphaInterval([[1, 1], [2, 2], [1, 1]], { random: () => 0.4, draws: 10 }).alpha // → 1
 */
export function krippendorffAlphaInterval(
  units: ArrayLike<CodeSeries>,
  { random, draws = 1000, confidence = 0.95 }: AlphaIntervalOptions,
): AlphaInterval {
  requireThat(typeof random === 'function', 'random', 'must be a generator of numbers in [0, 1)');
  requireThat(Number.isInteger(draws) && draws > 0, 'draws', 'must be a whole number above 0');
  requireConfidence(confidence);
  const alpha = krippendorffAlpha(units);
  if (Number.isNaN(alpha)) return { alpha, lower: Number.NaN, upper: Number.NaN };
  const { kinds, kindOf } = sorted(units);
  const alphas: number[] = [];
  const drawn = new Uint32Array(kinds.length);
  for (let d = 0; d < draws; d++) {
    drawn.fill(0);
    for (let u = 0; u < kindOf.length; u++) {
      const kind = kindOf[Math.floor(random() * kindOf.length)] as number;
      drawn[kind] = (drawn[kind] as number) + 1;
    }
    const resampled = alphaOfDraw(kinds, drawn);
    if (!Number.isNaN(resampled)) alphas.push(resampled);
  }
  alphas.sort((a, b) => a - b);
  return {
    alpha,
    lower: sampleQuantile(alphas, (1 - confidence) / 2),
    upper: sampleQuantile(alphas, (1 + confidence) / 2),
  };
}

function sorted(units: ArrayLike<CodeSeries>): { kinds: Kind[]; kindOf: Uint32Array } {
  const numberOf = codeNumbers();
  const places = new Map<string, number>();
  const kinds: Kind[] = [];
  const kindOf: number[] = [];
  for (let u = 0; u < units.length; u++) {
    const given = Array.from(units[u] as CodeSeries)
      .filter((code): code is Code => code !== null && code !== undefined)
      .map(numberOf)
      .sort((a, b) => a - b);
    if (given.length < 2) continue;
    const key = given.join(' ');
    let place = places.get(key);
    if (place === undefined) {
      place = kinds.length;
      places.set(key, place);
      const counts = new Map<number, number>();
      for (const code of given) counts.set(code, (counts.get(code) ?? 0) + 1);
      const squares = [...counts.values()].reduce((sum, count) => sum + count * count, 0);
      kinds.push({ values: given.length, disagreeing: given.length ** 2 - squares, counts: [...counts] });
    }
    kindOf.push(place);
  }
  return { kinds, kindOf: Uint32Array.from(kindOf) };
}

function alphaOfDraw(kinds: readonly Kind[], drawn: Uint32Array): number {
  const codes: number[] = [];
  const disagreeing = new Map<number, number>();
  kinds.forEach((kind, i) => {
    const times = drawn[i] as number;
    if (times === 0) return;
    disagreeing.set(kind.values, (disagreeing.get(kind.values) ?? 0) + times * kind.disagreeing);
    for (const [code, count] of kind.counts) codes[code] = (codes[code] ?? 0) + times * count;
  });
  return alphaOf({ disagreeing, codes: Array.from(codes, (count) => count ?? 0) });
}

export const about: About = {
  name: 'krippendorffAlphaInterval',
  sentence: 'Alpha, with the range it takes when the intervals are drawn anew from those observed.',
  formula: 'percentiles of α over units drawn with replacement',
  source: 'Efron 1979, Ann Stat 7:1-26; alpha: Krippendorff 2011',
  check: {
    input: 'krippendorffAlphaInterval([[1, 1], [2, 2], [1, 1], [2, 2]], …).lower',
    expected: 1,
    source: 'by hand: without any disagreement every draw with both codes gives 1',
    tolerance: 0,
  },
  recompute: () => {
    let step = 0;
    // Golden-ratio steps stand in for chance, so that the check is the same everywhere.
    const random = (): number => {
      step = (step + 0.6180339887498949) % 1;
      return step;
    };
    return krippendorffAlphaInterval(
      [
        [1, 1],
        [2, 2],
        [1, 1],
        [2, 2],
      ],
      { random, draws: 20 },
    ).lower;
  },
};
