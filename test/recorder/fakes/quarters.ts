import { headerOf } from '../../support/session.ts';
import { Lesson } from './lesson.ts';

/** Momentary looks each 15 seconds, at 15, 30 … 90, of c1, c2, c3, c1, c2, c3. */
export const begun = (header = headerOf()) => new Lesson({ header }).begin();

/** Marks "on" two seconds after each cue whose interval is named. */
export async function mark(lesson: Lesson, ...intervals: number[]): Promise<void> {
  for (const interval of intervals) {
    await lesson.until(interval * 15_000 + 2000);
    lesson.touch('on');
  }
}

/** Session times (whole ms) of what was heard after the count-in. */
export const heardTimes = (lesson: Lesson): number[] =>
  lesson.audio
    .heard()
    .map(({ heardAt }) => Math.round((heardAt ?? 0) - lesson.zero))
    .filter((at) => at > 0);
