/** An interval on the session's own clock. Given in order of `cueAt`; only parts that have begun. */
export interface TimedInterval {
  readonly number: number;
  readonly cueAt: number;
  /** The next cue, or one interval length after the last one. */
  readonly closeAt: number;
}

export interface TouchQuestion {
  readonly intervals: readonly TimedInterval[];
  /** Session time at which the touch went down. */
  readonly at: number;
  readonly graceMs: number;
  /** True while nothing is known of the interval: no mark, and no other reason why it has none than having been missed. */
  readonly isEmpty: (number: number) => boolean;
  /** True when its cue fell into an interruption or a pause: no mark is taken. */
  readonly isBarred: (number: number) => boolean;
  /** Number of the interval that "child before" is armed for; null when it is not. */
  readonly before: number | null;
}

export type TouchAnswer =
  | { readonly taken: true; readonly interval: number; readonly late: boolean; readonly before: boolean }
  | {
      readonly taken: false;
      readonly why: 'before the first cue' | 'after the last interval' | 'class interrupted';
    };

/**
 * Whose touch is it? The interval whose cue came last; within the grace after a cue the interval before, if that is
 * still empty (then it is late). Nothing is taken before the first cue; a part's last interval stays open for one
 * interval length. A cue and its grace are inclusive: a touch at the cue's own millisecond comes after it.
 */
export function whoseTouch(question: TouchQuestion): TouchAnswer {
  const { intervals, at, graceMs, isEmpty, isBarred, before } = question;
  if (before !== null) {
    if (isBarred(before)) return { taken: false, why: 'class interrupted' };
    return { taken: true, interval: before, late: false, before: true };
  }
  const position = lastCued(intervals, at);
  const current = intervals[position];
  if (current === undefined) return { taken: false, why: 'before the first cue' };
  const previous = intervals[position - 1];
  if (
    previous !== undefined &&
    previous.closeAt === current.cueAt &&
    at <= current.cueAt + graceMs &&
    isEmpty(previous.number) &&
    !isBarred(previous.number)
  ) {
    return { taken: true, interval: previous.number, late: true, before: false };
  }
  if (at >= current.closeAt) return { taken: false, why: 'after the last interval' };
  if (isBarred(current.number)) return { taken: false, why: 'class interrupted' };
  return { taken: true, interval: current.number, late: false, before: false };
}

/** Position of the interval whose cue came last at that time; −1 before the first cue. */
export function lastCued(intervals: readonly TimedInterval[], at: number): number {
  let low = 0;
  let high = intervals.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((intervals[middle]?.cueAt ?? Number.POSITIVE_INFINITY) <= at) low = middle + 1;
    else high = middle;
  }
  return low - 1;
}

/** The interval that "child before" means at that time: the one whose look came before the latest one; null for none. */
export function intervalBefore(intervals: readonly TimedInterval[], at: number): number | null {
  const position = lastCued(intervals, at);
  const current = intervals[position];
  if (current === undefined) return null;
  const open = at < current.closeAt;
  return (open ? intervals[position - 1] : current)?.number ?? null;
}
