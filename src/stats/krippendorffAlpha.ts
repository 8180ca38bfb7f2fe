import type { About } from './about.ts';
import type { Code, CodeSeries } from './confusionTable.ts';
import { requireThat } from './requireThat.ts';

/** What the pairable values of many units add up to. Units with fewer than two values are not in it. */
export interface PairedValues {
  /** For every number of values m: the sum over units of m² − Σ n_c². */
  readonly disagreeing: Map<number, number>;
  /** How often each code was given. */
  readonly codes: number[];
}

/** Krippendorff's alpha of the sums; NaN when nothing is pairable or one code only was used. */
export function alphaOf({ disagreeing, codes }: PairedValues): number {
  let n = 0;
  let squares = 0;
  for (const count of codes) {
    n += count;
    squares += count * count;
  }
  const expected = n * n - squares;
  if (expected === 0) return Number.NaN;
  let observed = 0;
  for (const [values, sum] of disagreeing) observed += sum / (values - 1);
  return 1 - ((n - 1) * observed) / expected;
}

/** Gives each distinct code a number, in the order of first sight. */
export function codeNumbers(): (code: Code) => number {
  const numbers = new Map<Code, number>();
  return (code) => {
    let number = numbers.get(code);
    if (number === undefined) {
      number = numbers.size;
      numbers.set(code, number);
    }
    return number;
  };
}

/**
 * Krippendorff's alpha for nominal codes: units (intervals) × observers, any number of observers, `null` (or
 * undefined) where an observer gave no code. Units with fewer than two codes are dropped before the expected
 * disagreement is formed. 1 = no disagreement, 0 = as by chance. Linear in the data.
 *
 * Undefined (NaN): nothing pairable, or one code only among the pairable. Rows of unequal length throw.
 * Relative error 1e-10.
 *
 * Source: Krippendorff 2011, Computing Krippendorff's alpha-reliability.
 *
 * @example krippendorffAlpha([[0, 1], [1, 1], [0, 1], [0, 0], [0, 0], [0, 1], [0, 0], [0, 0], [1, 0], [0, 0]]) // → 0.0952
 */
export function krippendorffAlpha(units: ArrayLike<CodeSeries>): number {
  const numberOf = codeNumbers();
  const codes: number[] = [];
  const here: number[] = [];
  const seen: number[] = [];
  const disagreeing = new Map<number, number>();
  const width = units[0]?.length ?? 0;
  for (let u = 0; u < units.length; u++) {
    const unit = units[u] as CodeSeries;
    requireThat(unit.length === width, 'units', 'must have one place for each observer in every unit');
    let values = 0;
    for (let o = 0; o < width; o++) {
      const code = unit[o];
      if (code === null || code === undefined) continue;
      const number = numberOf(code);
      const before = here[number] ?? 0;
      if (before === 0) seen.push(number);
      here[number] = before + 1;
      values++;
    }
    let squares = 0;
    for (const c of seen) {
      const count = here[c] as number;
      squares += count * count;
      if (values > 1) codes[c] = (codes[c] ?? 0) + count;
      here[c] = 0;
    }
    seen.length = 0;
    if (values > 1) disagreeing.set(values, (disagreeing.get(values) ?? 0) + values * values - squares);
  }
  return alphaOf({ disagreeing, codes: Array.from(codes, (count) => count ?? 0) });
}

export const about: About = {
  name: 'krippendorffAlpha',
  sentence: 'Agreement of any number of observers beyond chance, also when some codes are missing.',
  formula: 'α = 1 − Do/De',
  source: "Krippendorff 2011, Computing Krippendorff's alpha-reliability",
  check: {
    input: 'krippendorffAlpha of 12 units by 4 observers with missing codes (section C)',
    expected: 0.743,
    source: 'Krippendorff 2011, section C (value and data from memory)',
    tolerance: 5e-4,
  },
  recompute: () => {
    const _ = null;
    return krippendorffAlpha([
      [1, 1, _, 1],
      [2, 2, 3, 2],
      [3, 3, 3, 3],
      [3, 3, 3, 3],
      [2, 2, 2, 2],
      [1, 2, 3, 4],
      [4, 4, 4, 4],
      [1, 1, 2, 1],
      [2, 2, 2, 2],
      [_, 5, 5, 5],
      [_, _, 1, 1],
      [_, 3, _, _],
    ]);
  },
};
