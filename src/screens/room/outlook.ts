import { readOut } from '../../journal/readOut.ts';
import { fold } from '../../journal/step.ts';
import type { StoredSession } from '../../journal/stored.ts';
import type { EpochMs } from '../../kernel/units.ts';
import { planOf, timedIntervals } from '../../recorder/grid.ts';
import { resumption } from '../../recorder/resumption.ts';
import { standing } from '../../recorder/standing.ts';

/** Where a session that was cut off would go on, if it were taken up now. */
export interface Outlook {
  readonly scored: number;
  readonly intervals: number;
  /** Intervals whose cue fell into the time without the tablet. */
  readonly between: number;
  readonly goesOn:
    | { readonly kind: 'start'; readonly child: string | null }
    | { readonly kind: 'at' | 'paused'; readonly number: number; readonly child: string | null }
    | { readonly kind: 'part'; readonly phase: string }
    | { readonly kind: 'nothing' };
}

/** null for a session that cannot be recorded here (it came from a table). */
export function outlook({ header, journal }: StoredSession, wallNow: EpochMs): Outlook | null {
  const plan = planOf(header);
  if (plan === null) return null;
  const state = fold(header, journal);
  const facts = {
    scored: readOut(state).filter((interval) => interval.status === 'scored').length,
    intervals: plan.intervals.length,
  };
  const nameOf = (id: string | null | undefined): string | null =>
    header.children.find((child) => child.id === id)?.pseudonym ?? null;
  const cut = resumption(state, journal, wallNow);
  if (cut === null)
    return { ...facts, between: 0, goesOn: { kind: 'start', child: nameOf(plan.intervals[0]?.child) } };
  const timed = timedIntervals(plan, state);
  const between = timed.filter(({ cueAt }) => cueAt > cut.from && cueAt <= cut.now).length;
  const place = standing(plan, state, cut.now);
  if (place.phase === 'between parts')
    return { ...facts, between, goesOn: { kind: 'part', phase: plan.parts[place.next]?.phase ?? '' } };
  const next = timed.find(({ cueAt }) => cueAt > cut.now);
  if (next === undefined || place.phase === 'over' || place.phase === 'ended')
    return { ...facts, between, goesOn: { kind: 'nothing' } };
  return {
    ...facts,
    between,
    goesOn: {
      kind: place.phase === 'paused' ? 'paused' : 'at',
      number: next.number,
      child: nameOf(plan.intervals[next.number - 1]?.child),
    },
  };
}
