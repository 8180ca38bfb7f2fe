import { isCovered, type JournalState } from '../journal/state.ts';
import type { Plan } from './grid.ts';

/** Seconds that are counted before a part begins: three, two, one. */
export const countInMs = 3000;

/** Before the cue of an interval that is done again: one that is given at once would come before anybody is ready. */
export const breathMs = 1000;

/** Where a session stands, whatever the clocks do. */
export type Standing =
  | { readonly phase: 'counting in' | 'running' | 'paused' | 'interrupted'; readonly part: number }
  | { readonly phase: 'between parts'; readonly part: number; readonly next: number }
  /** Its last interval has closed at `at`: it is complete, and only has to be written down. */
  | { readonly phase: 'over'; readonly part: number; readonly at: number }
  | { readonly phase: 'ended'; readonly part: number };

/** The latest part that was opened. */
export function latestPart(state: JournalState): number {
  return Math.max(
    0,
    state.origins.findLastIndex((origin) => origin !== null),
  );
}

/** Where the session stands at session time `now`, from its journal alone. */
export function standing(plan: Plan, state: JournalState, now: number): Standing {
  const part = latestPart(state);
  if (state.ended !== null) return { phase: 'ended', part };
  if (isCovered(state, 'paused')) return { phase: 'paused', part };
  const origin = state.origins[part] ?? 0;
  const closesAt = origin + (plan.parts[part]?.duration ?? 0);
  const next = part + 1 < plan.parts.length ? part + 1 : null;
  if (next === null && now >= closesAt) return { phase: 'over', part, at: closesAt };
  if (next !== null && (now >= closesAt || (state.closed[part] ?? null) !== null))
    return { phase: 'between parts', part, next };
  if (now < origin) return { phase: 'counting in', part };
  return { phase: isCovered(state, 'class interrupted') ? 'interrupted' : 'running', part };
}

/** True while cues are to be given: not paused, not interrupted, not over. */
export function cuesGiven(place: Standing): boolean {
  return place.phase === 'running' || place.phase === 'counting in';
}
