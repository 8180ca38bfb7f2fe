import type { Problem } from '../kernel/result.ts';
import type { SessionRecord } from './sessionRecord.ts';
import type { TimingGap } from './timingGaps.ts';

export type TimingReasonCode =
  | 'timingLost'
  | 'timingTimeLost'
  | 'timingOff'
  | 'timingUneven'
  | 'timingSilent'
  | 'timingEstimated';

/** Whether a session's timing can be relied on, in one word, and what stands against it. */
export interface TimingVerdict {
  readonly word: 'reliable' | 'withCare' | 'notReliable';
  /** Empty exactly when reliable. */
  readonly reasons: readonly Problem<TimingReasonCode>[];
}

/**
 * Where the limits come from: two perfect observers who look at moments d seconds apart reach at best
 * kappa e^(−d/8) in a lively class (bouts of 40 s on-task and 10 s off; Rogosa & Ghandour 1991).
 */
export const timingLimits = {
  /** Costs under 1 % of kappa, and nobody looks up that exactly: a prompt this near is on time. */
  onTimeMs: 50,
  /** Costs 3 % of kappa, about what people differ in answering a prompt: one that is farther off counts as lost. */
  usableMs: 250,
  /** Of all intervals: this share of lost ones can move a percentage by more than its rounding. No source. */
  lostShare: 0.05,
} as const;

/**
 * reliable: every cue came, each within `onTimeMs` of its moment, by sound, and no stretch is estimated. notReliable: at
 * least `lostShare` of the intervals had a cue that came to nobody, was over `usableMs` off, or fell into a gap (of a
 * duration: that share of the time). withCare: all between. null where the journal holds no cue.
 */
export function timingVerdict(record: SessionRecord, gaps: readonly TimingGap[]): TimingVerdict | null {
  const { state, method } = record;
  if (state.cues.size === 0) return null;
  const reasons: Problem<TimingReasonCode>[] = [];
  const say = (code: TimingReasonCode, values: Problem['values']): void => {
    reasons.push({ code, values });
  };
  const inGap = intervalsInGaps(record, gaps);
  const [lost, off]: [Set<number>, Set<number>] = [new Set(inGap), new Set()];
  let [largest, silent, heard] = [0, 0, 0];
  for (const [number, cues] of state.cues) {
    for (const { by, planned, delivered } of cues) {
      if (delivered === null || by.length === 0) {
        lost.add(number);
        continue;
      }
      const distance = Math.abs(delivered - planned);
      largest = Math.max(largest, distance);
      if (distance > timingLimits.usableMs) off.add(number);
      if (by.includes('sound')) heard += 1;
      else silent += 1;
    }
  }
  const intervals = new Set([...state.cues.keys(), ...inGap]).size;
  const unusable = new Set([...lost, ...off]).size;
  const gapMs = gaps.reduce((sum, { from, to }) => sum + to - from, 0);
  const share = method === 'duration' ? gapMs / Math.max(1, state.at) : unusable / intervals;
  if (method === 'duration' && gapMs > 0)
    say('timingTimeLost', { seconds: gapMs / 1000, percent: 100 * share });
  if (method !== 'duration' && lost.size > 0) say('timingLost', { lost: lost.size, of: intervals });
  if (off.size > 0) say('timingOff', { off: off.size, ms: timingLimits.usableMs, largest });
  else if (largest > timingLimits.onTimeMs) say('timingUneven', { ms: timingLimits.onTimeMs, largest });
  if (silent > 0) say('timingSilent', { silent, of: silent + heard });
  const guessed = gaps.filter(({ estimated, from, to }) => estimated && to > from).length;
  if (guessed > 0) say('timingEstimated', { gaps: guessed });
  if (reasons.length === 0) return { word: 'reliable', reasons };
  return { word: share >= timingLimits.lostShare ? 'notReliable' : 'withCare', reasons };
}

/** Intervals whose cue fell into a gap and was never delivered. */
function intervalsInGaps({ state, method }: SessionRecord, gaps: readonly TimingGap[]): number[] {
  if (method === 'duration') return [];
  return state.planned.flatMap(({ number, part, cueMs }) => {
    const at = (state.origins[part] ?? Number.NaN) + cueMs;
    const came = state.cues.get(number)?.some(({ delivered }) => delivered !== null) ?? false;
    const fellIn = gaps.some(({ from, to, cause }) => cause !== 'clock' && at >= from && at < to);
    return fellIn && !came ? [number] : [];
  });
}
