import type { About } from './about.ts';
import { requireMethod, type SamplingMethod } from './expectedProportion.ts';
import { requireThat } from './requireThat.ts';
import type { Bout } from './simulateLesson.ts';

export interface ScoringOptions {
  /** Seconds from the opening of one interval to that of the next. */
  readonly interval: number;
  /** Seconds watched from the opening of each interval on; the momentary look is at their end. */
  readonly observed: number;
  readonly seconds: number;
}

/**
 * What a perfect observer would score in each whole interval of a lesson: partial = any behaviour in the watched
 * part, whole = behaviour throughout it, momentary = behaviour at its end (a bout that ends at the very instant of
 * the look counts, one that begins there does not). So whole implies momentary, and momentary implies partial,
 * in every interval. Where nothing is watched (observed 0), all three are the state at the opening.
 * Linear in bouts and intervals.
 *
 * `bouts` are sorted by time and do not overlap; a last interval that the lesson cuts short is not scored.
 *
 * Source: by definition; Powell, Martindale & Kulp 1975, J Appl Behav Anal 8:463-469 for the three methods.
 *
 * @example scoreBouts([{ on: 0, off: 12 }], 'whole', { interval: 10, observed: 10, seconds: 30 }) // → [true, false, false]
 */
export function scoreBouts(
  bouts: readonly Bout[],
  method: SamplingMethod,
  { interval, observed, seconds }: ScoringOptions,
): boolean[] {
  requireMethod(method);
  requireThat(interval > 0 && Number.isFinite(interval), 'interval', 'must be positive');
  requireThat(observed >= 0 && observed <= interval, 'observed', 'must lie between 0 and the interval');
  requireThat(seconds >= 0 && Number.isFinite(seconds), 'seconds', 'must not be negative');
  let last = Number.NEGATIVE_INFINITY;
  for (const { on, off } of bouts) {
    requireThat(on >= last && off >= on, 'bouts', 'must be sorted and must not overlap');
    last = off;
  }
  // 0.1-second intervals: 3/0.1 is 29.999…
  const count = Math.floor(seconds / interval + 1e-9);
  const scores: boolean[] = [];
  let first = 0;
  for (let i = 0; i < count; i++) {
    const opens = i * interval;
    const closes = opens + observed;
    while (first < bouts.length && (bouts[first] as Bout).off <= opens) first++;
    scores.push(scoreOne(bouts, first, opens, closes, method));
  }
  return scores;
}

function scoreOne(
  bouts: readonly Bout[],
  first: number,
  opens: number,
  closes: number,
  method: SamplingMethod,
): boolean {
  if (closes === opens) return (bouts[first]?.on ?? Number.POSITIVE_INFINITY) <= opens;
  let reached = opens;
  for (let b = first; b < bouts.length; b++) {
    const { on, off } = bouts[b] as Bout;
    if (on >= closes) break;
    if (off === on) continue;
    if (method === 'partial') return true;
    if (method === 'momentary' && off >= closes) return true;
    if (method === 'whole' && on > reached) return false;
    reached = off;
  }
  return method === 'whole' && reached >= closes;
}

export const about: About = {
  name: 'scoreBouts',
  sentence: 'What a perfect observer would have scored, interval by interval, with each way of recording.',
  formula: 'partial: any behaviour in the watched part; whole: throughout it; momentary: at its end',
  source: 'by definition; Powell, Martindale & Kulp 1975, J Appl Behav Anal 8:463-469 for the three methods',
  check: {
    input: "scoreBouts([{ on: 4, off: 17 }], 'partial', { interval: 10, observed: 10, seconds: 30 }), scored",
    expected: 2,
    source: 'by hand: the bout touches the first two of three intervals',
    tolerance: 0,
  },
  recompute: () =>
    scoreBouts([{ on: 4, off: 17 }], 'partial', { interval: 10, observed: 10, seconds: 30 }).filter(Boolean)
      .length,
};
