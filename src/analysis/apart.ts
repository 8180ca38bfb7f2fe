import { cueTimes } from './cueTimes.ts';
import { medianOfSorted } from './medianOfSorted.ts';
import type { SessionRecord } from './sessionRecord.ts';
import { limits } from './warning.ts';
import { type WhereInLesson, whereInLesson } from './whereInLesson.ts';

/** How far apart two observers' cues for the same intervals came, by their wall clocks. Seconds, second − first. */
export interface Apart {
  /** The journals' cues, or the times of two tables. */
  readonly by: 'cues' | 'starts';
  readonly cues: number;
  readonly median: number;
  /** The one farthest from 0, with its sign. */
  readonly largest: number;
  /** Five minutes after five minutes: a drift or a step shows. */
  readonly course: readonly {
    readonly from: WhereInLesson;
    readonly cues: number;
    readonly median: number;
  }[];
  /** By how many ms the tick check moved each tablet's wall clock; 0 = not at all. */
  readonly nudges: readonly [number, number];
  /** Stretches in which the schedules ran out of step. */
  readonly far: readonly FarStretch[];
}

/** Cues one after the other that all came at least `limits.outOfStepSeconds` apart, on the same side. */
export interface FarStretch {
  readonly from: WhereInLesson;
  /** Its last cue; null where it goes on to the end. */
  readonly to: WhereInLesson | null;
  /** It is there from the first cue on. */
  readonly fromStart: boolean;
  readonly cues: number;
  /** Median distance in it. */
  readonly seconds: number;
}

interface Distance {
  readonly number: number;
  /** ms since 1970, first observer. */
  readonly at: number;
  readonly seconds: number;
}

const courseMs = 5 * 60_000;
/** One cue may come late to a screen; three in a row are a schedule. */
const fewestFar = 3;

/**
 * Compares the wall times, corrected by each tablet's nudges, of the cues that both records delivered; null where they
 * share none. Without a tick check the tablets' wall clocks may themselves differ by seconds, so a steady distance can
 * be the clocks' or the observers'.
 */
export function apart(a: SessionRecord, b: SessionRecord): Apart | null {
  const [first, second] = [cueTimes(a), cueTimes(b)];
  if (first === null || second === null || first.by !== second.by) return null;
  const distances = [...first.times]
    .flatMap(([number, at]): Distance[] => {
      const other = second.times.get(number);
      return other === undefined ? [] : [{ number, at, seconds: (other - at) / 1000 }];
    })
    .sort((x, y) => x.number - y.number);
  const sorted = distances.map(({ seconds }) => seconds).sort((x, y) => x - y);
  const [low, high] = [sorted[0], sorted.at(-1)];
  const median = medianOfSorted(sorted);
  if (median === null || low === undefined || high === undefined) return null;
  return {
    by: first.by,
    cues: distances.length,
    median,
    largest: Math.abs(low) > Math.abs(high) ? low : high,
    course: courseOf(distances, a),
    nudges: [a.state.nudge, b.state.nudge],
    far: farStretches(distances, a),
  };
}

const medianOf = (distances: readonly Distance[]): number =>
  medianOfSorted(distances.map(({ seconds }) => seconds).sort((x, y) => x - y)) ?? Number.NaN;

function courseOf(distances: readonly Distance[], record: SessionRecord): Apart['course'] {
  const parts = new Map<number, Distance[]>();
  const begin = distances[0]?.at ?? 0;
  for (const one of distances) {
    const part = Math.floor((one.at - begin) / courseMs);
    parts.set(part, [...(parts.get(part) ?? []), one]);
  }
  return [...parts.values()].map((part) => ({
    from: whereInLesson(part[0]?.number ?? 0, record),
    cues: part.length,
    median: medianOf(part),
  }));
}

function farStretches(distances: readonly Distance[], record: SessionRecord): FarStretch[] {
  const side = ({ seconds }: Distance): number =>
    Math.abs(seconds) >= limits.outOfStepSeconds ? Math.sign(seconds) : 0;
  const runs: Distance[][] = [];
  for (const one of distances) {
    const run = runs.at(-1);
    const last = run?.at(-1);
    if (run !== undefined && last !== undefined && side(last) === side(one)) run.push(one);
    else runs.push([one]);
  }
  return runs.flatMap((run) => {
    const [start, end] = [run[0], run.at(-1)];
    if (start === undefined || end === undefined || side(start) === 0) return [];
    // A session of one or two cues (a duration) is all there is.
    if (run.length < Math.min(fewestFar, distances.length)) return [];
    const goesOn = end === distances.at(-1);
    return [
      {
        from: whereInLesson(start.number, record),
        to: goesOn ? null : whereInLesson(end.number, record),
        fromStart: start === distances[0],
        cues: run.length,
        seconds: medianOf(run),
      },
    ];
  });
}
