import type { JournalState } from './state.ts';

/** The part of the lesson at that session time; null where nobody has said. */
export function lessonPartAt(state: JournalState, at: number): string | null {
  return state.lessonParts.findLast((change) => change.at <= at)?.lessonPart ?? null;
}

/** Minutes from the break to the cue: negative before the break began, positive after the first task was given. */
export function minutesFromBreak(state: JournalState, part: number, cueAt: number): number | null {
  if (Number.isNaN(cueAt) || state.breakStartedAt === null) return null;
  const origin = part === 0 ? state.breakStartedAt : (state.origins[part] ?? Number.NaN);
  return Number.isNaN(origin) ? null : Math.round(((cueAt - origin) / 60_000) * 1000) / 1000;
}
