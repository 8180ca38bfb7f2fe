import type { Gap } from '../journal/state.ts';
import type { SessionRecord } from './sessionRecord.ts';

/** How well the cues kept their schedule. Milliseconds; null where no cue was delivered (a table). */
export interface TimingFacts {
  readonly cues: number;
  /** Cues that were neither heard nor shown. */
  readonly failedCues: number;
  /** Largest distance of a delivered cue from its planned moment. */
  readonly largestDeviationMs: number | null;
  readonly medianDeviationMs: number | null;
  /** Stretches in which the tablet did not run. */
  readonly gaps: readonly Gap[];
}

/** Timing of a whole session (the records of one session share it). */
export function timingFacts({ state }: SessionRecord): TimingFacts {
  const cues = [...state.cues.values()].flat();
  const deviations = cues
    .flatMap(({ planned, delivered }) => (delivered === null ? [] : Math.abs(delivered - planned)))
    .sort((a, b) => a - b);
  return {
    cues: cues.length,
    failedCues: cues.filter(({ by }) => by.length === 0).length,
    largestDeviationMs: deviations.at(-1) ?? null,
    medianDeviationMs: medianOfSorted(deviations),
    gaps: state.gaps,
  };
}

/** The middle of sorted numbers, the mean of the two middle ones of an even count; null of none. */
export function medianOfSorted(sorted: readonly number[]): number | null {
  const half = sorted.length / 2;
  const [low, high] = [sorted[Math.ceil(half) - 1], sorted[Math.floor(half)]];
  return low === undefined || high === undefined ? null : (low + high) / 2;
}
