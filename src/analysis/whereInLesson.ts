import type { SessionRecord } from './sessionRecord.ts';

/** A place of the schedule, as people find it again. */
export interface WhereInLesson {
  readonly number: number;
  /** The tablet's clock when its cue came; null without cues. */
  readonly wall: string | null;
  /** Session time of it in ms; null where unknown. */
  readonly at: number | null;
}

/** Where an interval lies, by the first of these records that knows. */
export function whereInLesson(number: number, ...records: readonly SessionRecord[]): WhereInLesson {
  const walls = records.map(({ state }) => state.cues.get(number)?.find(({ cue }) => cue !== 'record')?.wall);
  const times = records.map(({ looks }) => looks.find((look) => look.number === number)?.cueAt);
  return {
    number,
    wall: walls.find((wall) => wall !== undefined) ?? null,
    at: times.find((at) => at !== undefined && !Number.isNaN(at)) ?? null,
  };
}
