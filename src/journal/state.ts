import type { SessionHeader } from '../model/session.ts';
import type { AwayReason, GapCause, KnownEntry } from './entry.ts';
import { type PlannedInterval, plannedIntervals } from './plannedIntervals.ts';

/** What the observer said of one interval, newest last. */
export type Saying = Extract<
  KnownEntry,
  { kind: 'marked' | 'missing' | 'corrected' | 'unusable' | 'amended' }
>;

/** A reserve in the place of a child who left; `to` null = still. */
export interface StandIn {
  readonly child: string;
  readonly by: string;
  readonly from: number;
  readonly to: number | null;
}

/** A stretch of session time in which something kept intervals from being scored; `to` null = still going on. */
export interface Cover {
  readonly from: number;
  readonly to: number | null;
  readonly reason: 'class interrupted' | 'paused' | 'prompt failed' | AwayReason;
  /** null = everybody */
  readonly child: string | null;
}

export interface Gap {
  readonly from: number;
  readonly to: number;
  readonly cause: GapCause;
  readonly estimated: boolean;
}

/**
 * Where a session stands after the entries read so far. Built by `step`, one entry at a time; everything that
 * is shown of a session is computed from it.
 */
export interface JournalState {
  readonly header: SessionHeader;
  readonly planned: readonly PlannedInterval[];
  /** Entries that count, in the order read (withdrawn ones and their withdrawals are out). */
  readonly entries: readonly KnownEntry[];
  /** Entry count including withdrawn and unknown ones. */
  readonly read: number;
  readonly sayings: ReadonlyMap<number, readonly Saying[]>;
  readonly settled: ReadonlyMap<number, readonly string[]>;
  readonly cues: ReadonlyMap<number, readonly Extract<KnownEntry, { kind: 'cued' }>[]>;
  readonly covers: readonly Cover[];
  readonly standIns: readonly StandIn[];
  /** Intervals whose marks changed places with another's. */
  readonly swapped: ReadonlySet<number>;
  /** Stretches that were said to be of no use, in the order said. */
  readonly unusable: readonly Extract<KnownEntry, { kind: 'unusable' }>[];
  /** How many milliseconds later than it shows this tablet's wall clock has to be read. */
  readonly nudge: number;
  /** Session time at which each part began; null = not yet. */
  readonly origins: readonly (number | null)[];
  /** Session time at which a part was closed by "break started"; null = not closed by hand. */
  readonly closed: readonly (number | null)[];
  readonly seats: ReadonlyMap<string, string>;
  readonly lessonParts: readonly { readonly at: number; readonly lessonPart: string | null }[];
  readonly breakStartedAt: number | null;
  readonly breakEndedAt: number | null;
  readonly gaps: readonly Gap[];
  /** The latest session time that the journal speaks of. */
  readonly at: number;
  readonly ended: { readonly at: number; readonly reason: 'complete' | 'early' } | null;
}

/** Before the first entry. */
export function emptyState(header: SessionHeader): JournalState {
  const planned = plannedIntervals(header);
  const parts = planned.reduce((most, line) => Math.max(most, line.part + 1), 1);
  const seats = new Map<string, string>();
  for (const seat of header.plan?.seats ?? []) if (seat.child !== null) seats.set(seat.child, seat.id);
  return {
    header,
    planned,
    entries: [],
    read: 0,
    sayings: new Map(),
    settled: new Map(),
    cues: new Map(),
    covers: [],
    standIns: [],
    swapped: new Set(),
    unusable: [],
    nudge: 0,
    origins: Array.from({ length: parts }, (_, part) => (part === 0 ? 0 : null)),
    closed: Array.from({ length: parts }, () => null),
    seats,
    lessonParts: [],
    breakStartedAt: null,
    breakEndedAt: null,
    gaps: [],
    at: 0,
    ended: null,
  };
}

/** True while a cover of this reason is open (for a child, where one is given). */
export function isCovered(
  state: JournalState,
  reason: Cover['reason'],
  child: string | null = null,
): boolean {
  return state.covers.some((cover) => cover.to === null && cover.reason === reason && cover.child === child);
}

/** Why a child is away at present, or null. */
export function awayNow(state: JournalState, child: string): AwayReason | null {
  const cover = state.covers.find((c) => c.to === null && c.child === child);
  return cover === undefined ? null : (cover.reason as AwayReason);
}

/** Who is really to be watched when a child's turn comes at that session time: the child, or who stands in for it. */
export function childAt(state: Pick<JournalState, 'standIns'>, child: string, at: number): string {
  let now = child;
  // A reserve may leave, too; each stands in at most once along the chain.
  for (let step = 0; step <= state.standIns.length; step++) {
    const next = state.standIns.find(
      ({ child: gone, from, to }) => gone === now && from <= at && (to === null || at < to),
    );
    if (next === undefined) return now;
    now = next.by;
  }
  return now;
}
