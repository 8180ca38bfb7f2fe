import { medianOfSorted } from './medianOfSorted.ts';
import type { SessionRecord } from './sessionRecord.ts';

/** How long after its cue the first mark of an interval came. Milliseconds. */
export interface ResponseTimes {
  readonly marks: number;
  readonly median: number;
  /** Nine in ten were no slower. */
  readonly ninetieth: number;
  /** From the first to the third quarter: the middle half lies in so much. */
  readonly spread: number;
}

/**
 * Response times of a session: first mark of an interval minus its cue as delivered. Only where a mark answers a cue
 * (momentary, headcount). Left out: marks within the grace and by "child before" (they answer the cue before), marks that
 * changed places, and intervals whose first word is a correction. null of none.
 */
export function responseTimes({ method, state }: SessionRecord): ResponseTimes | null {
  if (method !== 'momentary' && method !== 'headcount') return null;
  const times = [...state.sayings]
    .flatMap(([number, [first]]) => {
      if (first?.kind !== 'marked' || first.late === true || first.before === true) return [];
      const cue = state.cues.get(number)?.findLast((one) => one.cue !== 'record');
      if (cue?.delivered == null || first.at < cue.delivered || state.swapped.has(number)) return [];
      return [first.at - cue.delivered];
    })
    .sort((a, b) => a - b);
  const median = medianOfSorted(times);
  if (median === null) return null;
  return {
    marks: times.length,
    median,
    ninetieth: quantileOfSorted(times, 0.9),
    spread: quantileOfSorted(times, 0.75) - quantileOfSorted(times, 0.25),
  };
}

/** Type 7 of Hyndman & Fan 1996: on the line between the two nearest. */
function quantileOfSorted(sorted: readonly number[], p: number): number {
  const at = (sorted.length - 1) * p;
  const [low, high] = [sorted[Math.floor(at)] ?? Number.NaN, sorted[Math.ceil(at)] ?? Number.NaN];
  return low + (high - low) * (at - Math.floor(at));
}
