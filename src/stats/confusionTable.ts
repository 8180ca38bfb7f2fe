import type { About } from './about.ts';
import { requireSameLength, requireThat } from './requireThat.ts';

export type Code = string | number;
/** One observer's codes, interval by interval; a plain or a typed array. */
export type CodeSeries = ArrayLike<Code | null | undefined>;

/**
 * Cross-tabulates two observers' codes of the same intervals: rows are the first observer's, columns the
 * second's, both in the order of `codes`. A pair with a missing side is left out.
 *
 * Missing is `null`, `undefined`, or −1 where −1 is not itself a code (typed arrays cannot hold null).
 * A code that is not listed, a code listed twice, and unequal lengths throw.
 *
 * @example confusionTable(['on', 'on', 'off', null], ['on', 'off', 'off', 'on'], ['on', 'off']) // → [[1, 1], [0, 1]]
 */
export function confusionTable(a: CodeSeries, b: CodeSeries, codes: ArrayLike<Code>): number[][] {
  requireSameLength(a, b, 'a, b');
  const size = codes.length;
  const place = new Map<Code | null | undefined, number>([
    [null, -1],
    [undefined, -1],
    [-1, -1],
  ]);
  for (let i = 0; i < size; i++) {
    const code = codes[i] as Code;
    requireThat((place.get(code) ?? -1) === -1, 'codes', 'must list each code once');
    place.set(code, i);
  }
  const counts = new Float64Array(size * size);
  for (let i = 0; i < a.length; i++) {
    const row = place.get(a[i]);
    const column = place.get(b[i]);
    if (row === undefined) throw unlisted('a', a[i]);
    if (column === undefined) throw unlisted('b', b[i]);
    if (row >= 0 && column >= 0) counts[row * size + column] = (counts[row * size + column] as number) + 1;
  }
  return Array.from({ length: size }, (_, row) => Array.from(counts.subarray(row * size, (row + 1) * size)));
}

function unlisted(argument: string, code: unknown): RangeError {
  return new RangeError(`${argument}: holds ${String(code)}, which is not among the codes`);
}

export const about: About = {
  name: 'confusionTable',
  sentence: 'How often each code of one observer met each code of the other, over the intervals both scored.',
  formula: 'n_ij = number of intervals that the first observer scored i and the second j',
  source: 'Cohen 1960, Educ Psychol Meas 20:37-46',
  check: {
    input: 'confusionTable([1, 1, 2, null], [1, 2, 2, 1], [1, 2])[0][1]',
    expected: 1,
    source: 'counted by hand',
    tolerance: 0,
  },
  recompute: () => confusionTable([1, 1, 2, null], [1, 2, 2, 1], [1, 2])[0]?.[1] ?? Number.NaN,
};
