import { type Apart, apart, type FarStretch } from './apart.ts';
import { cueTimes } from './cueTimes.ts';
import { type LostPlace, lostPlaces, type NotSearched } from './lostPlaces.ts';
import { medianOfSorted } from './medianOfSorted.ts';
import type { SessionRecord } from './sessionRecord.ts';

/**
 * Whether two observers ran in step, and in the same place of the schedule: one verdict, since a schedule that ran late,
 * a lost place and plain disagreement look alike in every figure of agreement.
 *
 * `apart`: the schedules ran seconds apart. `placeLost`: the clocks agree or are not known, and one of the two was one or
 * two places off for a stretch. `disagreeing`: neither, and the study's criterion is not met. `inStep`: neither.
 * `unknown`: there is not enough to tell one from the other.
 */
export type StepCode = 'inStep' | 'apart' | 'placeLost' | 'disagreeing' | 'unknown';

export interface InStep {
  readonly code: StepCode;
  /** What the verdict `unknown` lacks. */
  readonly lacking: 'cueTimes' | NotSearched | null;
  readonly apart: Apart | null;
  /** What the verdict `apart` speaks of: the longest stretch out of step. */
  readonly far: FarStretch | null;
  /**
   * Kappa that two observers who make no mistake would reach that far apart, in a class whose bouts of on-task last 40 s
   * and of off-task 10 s: e^(−seconds·(1/40 + 1/10)) (Rogosa & Ghandour 1991: the correlation of one moment with a later
   * one). null unless `apart`.
   */
  readonly kappaAtBest: number | null;
  readonly lost: readonly LostPlace[];
  /** null where the marks were searched for a lost place. */
  readonly notSearched: NotSearched | null;
}

/** @param criterionMet whether the pair meets the study's criterion; null where that is undefined */
export function inStep(a: SessionRecord, b: SessionRecord, criterionMet: boolean | null): InStep {
  const distance = apart(a, b);
  const { lost, notSearched } = lostPlaces(a, b);
  const unexplained = lost.filter((one) => !explainedByClocks(one, a, b));
  const [longest = null] = [...(distance?.far ?? [])].sort((x, y) => y.cues - x.cues);
  const rest = { apart: distance, lost: unexplained, notSearched, far: null, kappaAtBest: null };
  if (unexplained.length > 0) return { ...rest, code: 'placeLost', lacking: null };
  if (longest !== null) {
    const kappaAtBest = Math.exp(-Math.abs(longest.seconds) * (1 / 40 + 1 / 10));
    return { ...rest, code: 'apart', lacking: null, far: longest, kappaAtBest };
  }
  if (distance === null) return { ...rest, code: 'unknown', lacking: 'cueTimes' };
  if (criterionMet !== false) return { ...rest, code: 'inStep', lacking: null };
  return notSearched === null
    ? { ...rest, code: 'disagreeing', lacking: null }
    : { ...rest, code: 'unknown', lacking: notSearched };
}

/**
 * One child who is looked at a whole interval later by one observer gives the same marks one place earlier: then the
 * clocks have told already, and nobody lost the place.
 */
function explainedByClocks(lost: LostPlace, a: SessionRecord, b: SessionRecord): boolean {
  const interval = a.facts.intervalMs;
  const [first, second] = [cueTimes(a), cueTimes(b)];
  if (interval === null || first === null || second === null || first.by !== second.by) return false;
  const distances = [...first.times]
    .flatMap(([number, at]) => {
      const other = second.times.get(number);
      const there = number >= lost.from.number && number < lost.from.number + lost.intervals;
      return other === undefined || !there ? [] : [other - at];
    })
    .sort((x, y) => x - y);
  const later = medianOfSorted(distances);
  if (later === null) return false;
  // Who runs later sees later moments of the same child: what the other says one interval on.
  const byMarks = (lost.later === 1 ? -1 : 1) * lost.places * interval;
  return Math.abs(later) >= interval / 2 && Math.sign(later) === Math.sign(byMarks);
}
