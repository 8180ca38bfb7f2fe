import type { IntervalRecord } from '../../journal/readOut.ts';

/** A stretch of a duration record on the ribbon, in seconds of the parts laid end to end. */
export interface Span {
  readonly from: number;
  readonly to: number;
  /** Something was in force. */
  readonly scored: boolean;
}

/** Where the parts of a duration record lie on the ribbon, in seconds: each begins where the one before ends. */
export function partStarts(lengthsMs: readonly number[]): number[] {
  let sum = 0;
  return lengthsMs.map((length) => {
    const start = sum;
    sum += length / 1000;
    return start;
  });
}

/** The stretches so far; time that is still to come makes none. */
export function ribbonSpans(
  intervals: readonly IntervalRecord[],
  origins: readonly (number | null)[],
  starts: readonly number[],
): Span[] {
  return intervals.flatMap(({ part, status, openAt, closeAt }): Span[] => {
    const origin = origins[part] ?? null;
    if (origin === null || status === 'waiting') return [];
    const at = (ms: number): number => (starts[part] ?? 0) + (ms - origin) / 1000;
    return [{ from: at(openAt), to: at(closeAt), scored: status === 'scored' }];
  });
}
