import { medianOfSorted } from './medianOfSorted.ts';
import { type ResponseTimes, responseTimes } from './responseTimes.ts';
import type { Look, SessionRecord } from './sessionRecord.ts';
import { type TimingGap, timingGaps } from './timingGaps.ts';
import { type TimingVerdict, timingVerdict } from './timingVerdict.ts';

/** How well the cues kept their schedule, and how soon the observer answered. Milliseconds. */
export interface TimingFacts {
  readonly cues: number;
  /** Heard: they come at the planned moment by construction, laid on the audio clock. */
  readonly bySound: number;
  /** Only shown or felt: they come with the tablet's next wake-up. */
  readonly byScreenOnly: number;
  /** Cues that were neither heard nor shown. */
  readonly failedCues: number;
  /** Largest distance of a delivered cue from its planned moment; null where no cue was delivered (a table). */
  readonly largestDeviationMs: number | null;
  readonly medianDeviationMs: number | null;
  /** Intervals marked within the grace after the next cue. */
  readonly late: number;
  /** null where marks do not answer a cue (partial, whole, duration) or none is known. */
  readonly responses: ResponseTimes | null;
  readonly gaps: readonly TimingGap[];
  /** By how many ms the tick check moved this tablet's wall clock; 0 = not at all. */
  readonly nudgeMs: number;
  /** Whether the timing can be relied on, and why not quite; null where no cue is known. */
  readonly verdict: TimingVerdict | null;
}

/**
 * Timing of a whole session (the records of one session share it).
 * @param looks of all phases
 */
export function timingFacts(record: SessionRecord, looks: readonly Look[]): TimingFacts {
  const { state } = record;
  const cues = [...state.cues.values()].flat();
  const deviations = cues
    .flatMap(({ planned, delivered }) => (delivered === null ? [] : Math.abs(delivered - planned)))
    .sort((a, b) => a - b);
  const gaps = timingGaps(state);
  return {
    cues: cues.length,
    bySound: cues.filter(({ by }) => by.includes('sound')).length,
    byScreenOnly: cues.filter(({ by }) => by.length > 0 && !by.includes('sound')).length,
    failedCues: cues.filter(({ by }) => by.length === 0).length,
    largestDeviationMs: deviations.at(-1) ?? null,
    medianDeviationMs: medianOfSorted(deviations),
    late: looks.filter((look) => look.late).length,
    responses: responseTimes(record),
    gaps,
    nudgeMs: state.nudge,
    verdict: timingVerdict(record, gaps),
  };
}
