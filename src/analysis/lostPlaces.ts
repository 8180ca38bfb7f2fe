import type { Said } from './likeness.ts';
import { comparableAs, scoredAs } from './pairedLooks.ts';
import type { Look, SessionRecord } from './sessionRecord.ts';
import { fewestPlaces, type Slip, slippedStretches } from './slippedStretches.ts';
import { type WhereInLesson, whereInLesson } from './whereInLesson.ts';

/** What in one record, just there, speaks for its observer having lost the place. */
export interface Signs {
  readonly missed: number;
  /** Marked after the next prompt: within the grace, or by "child before". */
  readonly late: number;
  /** Corrected or swapped in the room. */
  readonly corrected: number;
}

/** A stretch in which one of the two records stands some places off the other. */
export interface LostPlace {
  /** 1 or 2. */
  readonly places: number;
  /** Whose entries stand later: 0 the first record, 1 the second. Marks alone cannot tell which of them is wrong. */
  readonly later: 0 | 1;
  readonly from: WhereInLesson;
  /** Its last interval; null where the place was not found again. */
  readonly to: WhereInLesson | null;
  /** It is there from the first interval on. */
  readonly fromStart: boolean;
  readonly intervals: number;
  /** Of the intervals that both scored, how many agree as they stand, and shifted. */
  readonly unshifted: { readonly compared: number; readonly same: number };
  readonly shifted: { readonly compared: number; readonly same: number };
  /** Signs in each record from two intervals before to two after. */
  readonly signs: readonly [Signs, Signs];
  /** The one of the two whose record alone has signs (two at least); else null: one of the two. */
  readonly who: 0 | 1 | null;
}

/** Why the marks were not searched for a lost place. */
export type NotSearched = 'tooFew' | 'orderUnknown' | 'notIntervals';

export interface LostPlaces {
  readonly lost: readonly LostPlace[];
  readonly notSearched: NotSearched | null;
}

/** A table may number its intervals as it likes; this many between the first and the last one are searched. */
const mostPlaces = 5000;

/**
 * Searches two records of one visit for stretches in which one observer had lost the place: the marks agree clearly
 * better when one record is shifted by one or two intervals in the schedule's order, whoever's turn it is.
 */
export function lostPlaces(a: SessionRecord, b: SessionRecord): LostPlaces {
  const none = (notSearched: NotSearched): LostPlaces => ({ lost: [], notSearched });
  const kind = comparableAs(a, b);
  if (kind === 'duration' || kind === 'methods differ') return none('notIntervals');
  const [first, second] = [byNumber(a), byNumber(b)];
  // One number for several children: then their order in time is not known.
  if (first === null || second === null) return none('orderUnknown');
  const numbers = [...first.keys(), ...second.keys()];
  const low = numbers.reduce((least, n) => Math.min(least, n), Number.POSITIVE_INFINITY);
  const high = numbers.reduce((most, n) => Math.max(most, n), 0);
  if (numbers.length === 0) return none('tooFew');
  if (high - low >= mostPlaces) return none('orderUnknown');
  const line = (looks: ReadonlyMap<number, Look>): Said[] =>
    Array.from({ length: high - low + 1 }, (_, i) => saidAt(looks.get(low + i)));
  const [said, other] = [line(first), line(second)];
  const both = said.filter((one, i) => one !== null && (other[i] ?? null) !== null).length;
  if (both < fewestPlaces) return none('tooFew');
  const lost = slippedStretches(said, other).map((slip) => lostPlace(slip, { a, b, low, high }));
  return { lost, notSearched: null };
}

function byNumber({ looks }: SessionRecord): Map<number, Look> | null {
  const map = new Map(looks.map((look) => [look.number, look]));
  return map.size === looks.length ? map : null;
}

function saidAt(look: Look | undefined): Said {
  if (look?.status !== 'scored') return null;
  if (look.counts === null) return scoredAs(look);
  return look.counts.present === 0 ? null : look.counts.on / look.counts.present;
}

function lostPlace(
  slip: Slip,
  { a, b, low, high }: { a: SessionRecord; b: SessionRecord; low: number; high: number },
): LostPlace {
  const [from, to] = [low + slip.from, low + slip.to];
  const signs = [signsIn(a, from - 2, to + 2), signsIn(b, from - 2, to + 2)] as const;
  const [mine, theirs] = signs.map(({ missed, late, corrected }) => missed + late + corrected) as [
    number,
    number,
  ];
  // So close to an end nothing could be told apart from being lost up to it.
  const near = Math.abs(slip.places) + 1;
  return {
    places: Math.abs(slip.places),
    later: slip.places > 0 ? 1 : 0,
    from: whereInLesson(from, a, b),
    to: high - to <= near ? null : whereInLesson(to, a, b),
    fromStart: from - low <= near,
    intervals: to - from + 1,
    unshifted: slip.unshifted,
    shifted: slip.shifted,
    signs,
    who: mine >= 2 && theirs === 0 ? 0 : theirs >= 2 && mine === 0 ? 1 : null,
  };
}

function signsIn({ looks, state }: SessionRecord, from: number, to: number): Signs {
  const there = looks.filter(({ number }) => number >= from && number <= to);
  const isBefore = ({ number }: Look): boolean =>
    state.sayings.get(number)?.some((saying) => 'before' in saying && saying.before === true) ?? false;
  return {
    missed: there.filter(({ status, missing }) => status !== 'scored' && missing === 'missed').length,
    late: there.filter((look) => look.late || isBefore(look)).length,
    corrected: there.filter(({ corrected }) => corrected).length,
  };
}
