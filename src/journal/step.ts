import type { SessionHeader } from '../model/session.ts';
import type { JournalEntry, KnownEntry } from './entry.ts';
import { isKnown } from './known.ts';
import { inOrder } from './order.ts';
import { type Cover, emptyState, type JournalState, type Saying } from './state.ts';

/** Reads one more entry. Total: an entry that makes no sense where it stands changes nothing but the count. */
export function step(state: JournalState, entry: JournalEntry): JournalState {
  const counted = { ...state, read: state.read + 1, at: timeAfter(state.at, entry) };
  if (!isKnown(entry)) return counted;
  if (entry.kind === 'withdrawn') {
    const { writer, seq } = entry.target;
    const entries = state.entries.filter((other) => other.writer !== writer || other.seq !== seq);
    if (entries.length === state.entries.length) return counted;
    // Undo reads everything anew: rare, and so there is only one truth about what an entry does.
    return { ...build(state.header, entries), read: counted.read, at: counted.at };
  }
  const draft = { ...copied(counted), entries: [...state.entries, entry] };
  apply(draft, entry);
  return draft;
}

/** Reads a whole journal, in whatever order it was stored. The same as one `step` after the other, in linear time. */
export function fold(header: SessionHeader, entries: readonly JournalEntry[]): JournalState {
  const ordered = inOrder(entries);
  const counting: KnownEntry[] = [];
  const positions = new Map<string, number[]>();
  const gone = new Set<number>();
  for (const entry of ordered) {
    if (!isKnown(entry)) continue;
    if (entry.kind === 'withdrawn') {
      for (const at of positions.get(`${entry.target.writer} ${entry.target.seq}`) ?? []) gone.add(at);
      continue;
    }
    const key = `${entry.writer} ${entry.seq}`;
    positions.set(key, [...(positions.get(key) ?? []), counting.length]);
    counting.push(entry);
  }
  const state = build(
    header,
    counting.filter((_, i) => !gone.has(i)),
  );
  return {
    ...state,
    read: ordered.length,
    at: ordered.reduce(timeAfter, 0),
  };
}

/** The latest session time that is spoken of. Only a repeated interval turns it back. */
function timeAfter(latest: number, entry: JournalEntry): number {
  if (!isKnown(entry)) return Math.max(latest, entry.at);
  if (entry.kind === 'resumed' && entry.repeats !== undefined) return entry.at;
  return Math.max(latest, entry.at, entry.kind === 'gap' ? entry.to : entry.at);
}

type Draft = { -readonly [Key in keyof JournalState]: JournalState[Key] } & {
  sayings: Map<number, JournalState['sayings'] extends ReadonlyMap<number, infer V> ? V : never>;
  settled: Map<number, readonly string[]>;
  cues: Map<number, JournalState['cues'] extends ReadonlyMap<number, infer V> ? V : never>;
  seats: Map<string, string>;
  swapped: Set<number>;
};

function copied(state: JournalState): Draft {
  return {
    ...state,
    sayings: new Map(state.sayings),
    settled: new Map(state.settled),
    cues: new Map(state.cues),
    seats: new Map(state.seats),
    swapped: new Set(state.swapped),
  };
}

function build(header: SessionHeader, entries: readonly KnownEntry[]): JournalState {
  const draft = copied({ ...emptyState(header), entries });
  for (const entry of entries) apply(draft, entry);
  return draft;
}

function apply(draft: Draft, entry: KnownEntry): void {
  switch (entry.kind) {
    case 'marked':
    case 'missing':
    case 'corrected':
    case 'amended':
      hear(draft, entry.interval, entry);
      break;
    case 'swapped':
      for (const [a, b] of entry.pairs) swap(draft, a, b);
      break;
    case 'unusable':
      draft.unusable = [...draft.unusable, entry];
      for (const line of draft.planned) {
        const cueAt = (draft.origins[line.part] ?? Number.NaN) + line.cueMs;
        if (cueAt >= entry.from && cueAt < entry.to) hear(draft, line.number, entry);
      }
      break;
    case 'settled':
      draft.settled.set(entry.interval, entry.codes);
      break;
    case 'cued':
      draft.cues.set(entry.interval, [...(draft.cues.get(entry.interval) ?? []), entry]);
      break;
    case 'interrupted':
      open(draft, { from: entry.at, to: null, reason: 'class interrupted', child: null });
      break;
    case 'continued':
      close(draft, entry.at, (cover) => cover.reason === 'class interrupted');
      break;
    case 'paused':
      open(draft, { from: entry.at, to: null, reason: 'paused', child: null });
      break;
    case 'resumed':
      if (entry.repeats === undefined) close(draft, entry.at, (cover) => cover.reason === 'paused');
      else repeat(draft, entry.repeats, entry.at);
      break;
    case 'clockNudged':
      draft.nudge += entry.by;
      break;
    case 'left':
      open(draft, { from: entry.at, to: null, reason: entry.reason, child: entry.child });
      endStandIn(draft, entry.child, entry.at);
      if (entry.by !== undefined) {
        const standIn = { child: entry.child, by: entry.by, from: entry.at, to: null };
        draft.standIns = [...draft.standIns, standIn];
      }
      break;
    case 'returned':
      close(draft, entry.at, (cover) => cover.child === entry.child);
      endStandIn(draft, entry.child, entry.at);
      break;
    case 'moved':
      draft.seats.set(entry.child, entry.seat);
      break;
    case 'lessonPart':
      draft.lessonParts = [...draft.lessonParts, { at: entry.at, lessonPart: entry.lessonPart }];
      break;
    case 'phaseStarted':
      draft.origins = draft.origins.map((origin, part) => (part === entry.part ? entry.origin : origin));
      break;
    case 'breakStarted':
      draft.breakStartedAt = entry.at;
      draft.closed = draft.closed.map((at, part) =>
        at === null && draft.origins[part] !== null ? entry.at : at,
      );
      break;
    case 'breakEnded':
      draft.breakEndedAt = entry.at;
      break;
    case 'gap':
      draft.gaps = [
        ...draft.gaps,
        { from: entry.from, to: entry.to, cause: entry.cause, estimated: entry.estimated },
      ];
      // A moved wall clock loses nothing: it is written down and covers no interval.
      if (entry.cause !== 'clock' && entry.to > entry.from) {
        draft.covers = [
          ...draft.covers,
          { from: entry.from, to: entry.to, reason: 'prompt failed', child: null },
        ];
      }
      break;
    case 'ended':
      draft.ended = { at: entry.at, reason: entry.reason };
      break;
    default:
      break;
  }
}

/** Opens a cover unless the same one is open already (a second tap changes nothing); a child has one reason at a time. */
function open(draft: Draft, cover: Cover): void {
  if (draft.covers.some((c) => c.to === null && c.child === cover.child && c.reason === cover.reason)) return;
  if (cover.child !== null) close(draft, cover.from, (c) => c.child === cover.child);
  draft.covers = [...draft.covers, cover];
}

function close(draft: Draft, at: number, which: (cover: Cover) => boolean): void {
  draft.covers = draft.covers.map((c) =>
    c.to === null && which(c) ? { ...c, to: Math.max(at, c.from) } : c,
  );
}

function hear(draft: Draft, interval: number, saying: Saying): void {
  draft.sayings.set(interval, [...(draft.sayings.get(interval) ?? []), saying]);
}

function swap(draft: Draft, a: number, b: number): void {
  const [first, second] = [draft.sayings.get(a), draft.sayings.get(b)];
  for (const [interval, sayings] of [
    [a, second],
    [b, first],
  ] as const) {
    if (sayings === undefined) draft.sayings.delete(interval);
    else draft.sayings.set(interval, sayings);
    draft.swapped.add(interval);
  }
}

/**
 * An interval begins anew at session time `at`: neither what was said of its first half stands, nor the pause that broke
 * it, nor what kept from watching in that half and is over. What still holds when the pause ends holds from `at` on.
 */
function repeat(draft: Draft, interval: number, at: number): void {
  draft.sayings.delete(interval);
  draft.covers = draft.covers
    .filter(({ reason, to }) => reason !== 'paused' || to !== null)
    .flatMap((cover) => upTo(cover, at));
  draft.standIns = draft.standIns.flatMap((standIn) => upTo(standIn, at));
}

/** A stretch as it stands when session time turns back to `at`; none when it lay wholly after it and is over. */
function upTo<T extends { readonly from: number; readonly to: number | null }>(stretch: T, at: number): T[] {
  if (stretch.to === null) return [{ ...stretch, from: Math.min(stretch.from, at) }];
  const to = Math.min(stretch.to, at);
  return stretch.from < to || stretch.to <= at ? [{ ...stretch, to }] : [];
}

function endStandIn(draft: Draft, child: string, at: number): void {
  draft.standIns = draft.standIns.map((standIn) =>
    standIn.to === null && standIn.child === child ? { ...standIn, to: at } : standIn,
  );
}
