import { epochOf } from '../kernel/wallTime.ts';
import type { SessionRecord } from './sessionRecord.ts';
import { medianOfSorted } from './timingFacts.ts';

/** How far apart two observers' cues for the same intervals came, by their wall clocks. Seconds, second − first. */
export interface Apart {
  readonly cues: number;
  readonly median: number;
  /** The one farthest from 0, with its sign. */
  readonly largest: number;
}

/**
 * Compares the wall times of the cues that both records delivered; null where they share none. The tablets' wall
 * clocks may themselves differ by seconds, so a steady distance can be the clocks' or the observers'.
 */
export function apart(a: SessionRecord, b: SessionRecord): Apart | null {
  const [first, second] = [cueTimes(a), cueTimes(b)];
  const distances = [...first]
    .flatMap(([number, at]) => {
      const other = second.get(number);
      return other === undefined ? [] : (other - at) / 1000;
    })
    .sort((x, y) => x - y);
  const [median, low, high] = [medianOfSorted(distances), distances[0], distances.at(-1)];
  if (median === null || low === undefined || high === undefined) return null;
  return { cues: distances.length, median, largest: Math.abs(low) > Math.abs(high) ? low : high };
}

/** Wall time of each interval's first delivered cue in ms: its entry's wall clock, moved to the moment of delivery. */
function cueTimes({ state, looks }: SessionRecord): Map<number, number> {
  const times = new Map<number, number>();
  for (const { number } of looks) {
    const cue = state.cues
      .get(number)
      ?.find(({ delivered, cue: kind }) => delivered !== null && kind !== 'record');
    if (cue === undefined || cue.delivered === null) continue;
    const wall = epochOf(cue.wall);
    if (!Number.isNaN(wall)) times.set(number, wall + (cue.delivered - cue.at));
  }
  return times;
}
