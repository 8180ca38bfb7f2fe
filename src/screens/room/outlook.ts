import { readOut } from '../../journal/readOut.ts';
import { fold } from '../../journal/step.ts';
import type { StoredSession } from '../../journal/stored.ts';
import type { EpochMs } from '../../kernel/units.ts';
import { planOf, timedIntervals } from '../../recorder/grid.ts';
import { resumption } from '../../recorder/resumption.ts';
import { standing } from '../../recorder/standing.ts';
import { partLengths, type Unit, unitOf } from './amounts.ts';

/** Where a session that was cut off would go on, if it were taken up now. */
export interface Outlook {
  readonly scored: number;
  readonly intervals: number;
  /** What the session consists of. */
  readonly unit: Unit;
  /** Of a duration record, in milliseconds: watched, planned, and gone by without the tablet; null of others. */
  readonly time: { readonly kept: number; readonly of: number; readonly lost: number } | null;
  /** Intervals whose cue fell into the time without the tablet. */
  readonly between: number;
  readonly goesOn:
    | { readonly kind: 'start'; readonly child: string | null }
    | { readonly kind: 'at' | 'paused'; readonly number: number; readonly child: string | null }
    | { readonly kind: 'within'; readonly child: string | null; readonly left: number }
    | { readonly kind: 'part'; readonly phase: string }
    | { readonly kind: 'nothing' };
}

/** null for a session that cannot be recorded here (it came from a table). */
export function outlook({ header, journal }: StoredSession, wallNow: EpochMs): Outlook | null {
  const plan = planOf(header);
  if (plan === null) return null;
  const state = fold(header, journal);
  const cut = resumption(state, journal, wallNow);
  const scored = readOut(state).filter((interval) => interval.status === 'scored');
  const method = header.schedule.kind === 'laid' ? header.schedule.protocol.method : header.schedule.method;
  const facts = {
    scored: scored.length,
    intervals: plan.intervals.length,
    unit: unitOf(method),
    time:
      method !== 'duration'
        ? null
        : {
            kept: sum(scored.map(({ openAt, closeAt }) => closeAt - openAt)),
            of: sum(partLengths(plan)),
            lost: cut === null ? 0 : cut.now - cut.from,
          },
  };
  const nameOf = (id: string | null | undefined): string | null =>
    header.children.find((child) => child.id === id)?.pseudonym ?? null;
  if (cut === null)
    return { ...facts, between: 0, goesOn: { kind: 'start', child: nameOf(plan.intervals[0]?.child) } };
  const timed = timedIntervals(plan, state);
  const between = timed.filter(({ cueAt }) => cueAt > cut.from && cueAt <= cut.now).length;
  const place = standing(plan, state, cut.now);
  if (place.phase === 'between parts')
    return { ...facts, between, goesOn: { kind: 'part', phase: plan.parts[place.next]?.phase ?? '' } };
  if (method === 'duration' && place.phase !== 'over' && place.phase !== 'ended') {
    const end = (state.origins[place.part] ?? 0) + (plan.parts[place.part]?.duration ?? 0);
    const child = nameOf(plan.parts[place.part]?.first?.child);
    return { ...facts, between, goesOn: { kind: 'within', child, left: end - cut.now } };
  }
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

const sum = (all: readonly number[]): number => all.reduce((total, one) => total + one, 0);
