import type { EntryBody } from '../journal/entry.ts';
import { readOut } from '../journal/readOut.ts';
import type { JournalState } from '../journal/state.ts';
import type { PageMs } from '../kernel/units.ts';
import type { Method } from '../model/protocol.ts';
import { isEcho, type TouchDown } from './doubleTouch.ts';
import type { Felt, Refusal, RoomSnapshot } from './roomSnapshot.ts';
import { breathMs } from './standing.ts';
import { intervalBefore, type TimedInterval, whoseTouch } from './whoseTouch.ts';

/** "Child before" waits this long for its touch, then forgets it. */
export const armedForMs = 5000;

/** What a touch says of an interval. */
export type TouchWord =
  | { readonly kind: 'code'; readonly code: string | null }
  /** `of`: the interval whose figure was stepped on from, where the glass showed one. */
  | { readonly kind: 'count'; readonly on: number; readonly present: number; readonly of?: number }
  | { readonly kind: 'cannot see' };

export interface TouchAt {
  readonly page: PageMs;
  /** The same moment in session time. */
  readonly at: number;
}

/** Decides what a touch means; the journal entry that it makes, or null when it makes none. */
export class TouchDesk {
  private last: TouchDown | null = null;
  private armed: { interval: number; until: number } | null = null;
  felt: Felt | null = null;
  refusal: RoomSnapshot['refusal'] = null;

  constructor(
    private readonly graceMs: number,
    private readonly method: Method,
  ) {}

  /** The interval that "child before" waits to mark. */
  armedBefore(now: number): number | null {
    return this.armed !== null && now <= this.armed.until ? this.armed.interval : null;
  }

  arm(timed: readonly TimedInterval[], now: number): void {
    if (this.armedBefore(now) !== null) {
      this.armed = null;
      return;
    }
    const interval = intervalBefore(timed, now);
    if (interval === null) this.refuse('nothing before');
    else this.armed = { interval, until: now + armedForMs };
  }

  /** After an undo the same code may be touched again at once. */
  forget(): void {
    this.last = null;
  }

  refuse(why: Refusal): null {
    this.refusal = { count: (this.refusal?.count ?? 0) + 1, why };
    return null;
  }

  take(
    word: TouchWord,
    touch: TouchAt,
    state: JournalState,
    timed: readonly TimedInterval[],
  ): Extract<EntryBody, { kind: 'marked' | 'missing' }> | null {
    const down: TouchDown = { at: touch.page, target: targetOf(word) };
    if (isEcho(this.last, down)) return this.refuse('double touch');
    const again = repeated(state, timed);
    const since = again === null ? Number.NaN : touch.at - again.from;
    // In the breath before a repeated cue the interval before is long over: nobody means it.
    if (again?.breath === true && since >= 0 && since < breathMs && this.armedBefore(touch.at) === null)
      return this.refuse('before the first cue');
    const answer = whoseTouch({
      intervals: timed,
      at: touch.at,
      // Nor is anything late just after time turned back.
      graceMs: since >= 0 && since <= this.graceMs ? -1 : this.graceMs,
      isEmpty: (number) => isEmpty(state, number, touch.at),
      isBarred: (number) => isBarred(state, timed, number, this.method === 'duration' ? touch.at : null),
      before: this.armedBefore(touch.at),
    });
    if (!answer.taken) return this.refuse(answer.why);
    const { interval, late, before } = answer;
    // A step on the figure of one scan says nothing of another: its prompt came between glass and finger.
    if (word.kind === 'count' && word.of !== undefined && word.of !== interval)
      return this.refuse('another scan');
    this.last = down;
    this.armed = null;
    this.felt = {
      count: (this.felt?.count ?? 0) + 1,
      interval,
      code: word.kind === 'code' ? word.code : null,
      outOfView: word.kind === 'cannot see',
      late,
      before,
    };
    if (this.saysSoAlready(state, interval, word, touch.at)) return null;
    const how = { ...(late ? { late } : {}), ...(before ? { before } : {}) };
    if (word.kind === 'cannot see') return { kind: 'missing', interval, reason: 'out of view', ...how };
    if (word.kind === 'code') return { kind: 'marked', interval, code: word.code, ...how };
    const counts = { on: word.on, present: word.present };
    return { kind: 'marked', interval, code: null, counts, ...how };
  }

  /** The same word once more changes nothing, so it makes no entry; it is felt all the same. */
  private saysSoAlready(state: JournalState, interval: number, word: TouchWord, at: number): boolean {
    // What a swap brought is no word of this touch: undoing the swap would take it along.
    if (state.swapped.has(interval)) return false;
    const sayings = state.sayings.get(interval) ?? [];
    const last = sayings.at(-1);
    if (last === undefined || (last.kind !== 'marked' && last.kind !== 'missing')) return false;
    if (this.method === 'duration') return goesOn(state, word, at);
    if (word.kind === 'cannot see') return last.kind === 'missing' && last.reason === 'out of view';
    if (word.kind === 'count')
      return last.kind === 'marked' && last.counts?.on === word.on && last.counts.present === word.present;
    if (this.method === 'momentary' || word.code === null)
      return last.kind === 'marked' && last.counts === undefined && last.code === word.code;
    // Several codes latch: the code stands when it was said since the interval was last wiped.
    const wiped = sayings.findLastIndex((saying) => saying.kind !== 'marked' || saying.code === null);
    return sayings.slice(wiped + 1).some((saying) => saying.kind === 'marked' && saying.code === word.code);
  }
}

/** Where session time turned back last for an interval to be done again, and whether a breath lies before its cue. */
function repeated(
  { entries }: JournalState,
  timed: readonly TimedInterval[],
): { readonly from: number; readonly breath: boolean } | null {
  const last = entries.findLast((entry) => entry.kind === 'resumed' && entry.repeats !== undefined);
  if (last?.kind !== 'resumed') return null;
  const cueAt = timed.find(({ number }) => number === last.repeats)?.cueAt ?? Number.NaN;
  return { from: last.at, breath: cueAt - last.at === breathMs };
}

function targetOf(word: TouchWord): string {
  if (word.kind === 'code') return `code ${word.code ?? ''}`;
  // Counting goes fast: each further child is a new touch, however quick.
  return word.kind === 'count' ? `count ${word.on} of ${word.present}` : word.kind;
}

/** In a duration record: what the touch says holds already. */
function goesOn(state: JournalState, word: TouchWord, at: number): boolean {
  const stretch = readOut(state, { now: at }).findLast(({ openAt }) => openAt <= at);
  if (stretch === undefined) return false;
  if (word.kind === 'cannot see') return stretch.missing === 'out of view';
  const code = word.kind === 'code' ? word.code : null;
  return stretch.status === 'scored' && (stretch.codes?.[0] ?? null) === code;
}

/**
 * Nothing is known of the interval. One that is missing for a reason (its child has left, its cue failed) waits for no
 * mark, so a quick touch after the next cue is not its own.
 */
function isEmpty(state: JournalState, number: number, now: number): boolean {
  const record = readOut(state, { now })[number - 1];
  return record?.status === 'open' || (record?.status === 'missing' && record.missing === 'missed');
}

/**
 * No mark for an interval whose cue fell into an interruption or a pause; in a duration record (`touchedAt` given) none
 * during one.
 */
function isBarred(
  state: JournalState,
  timed: readonly TimedInterval[],
  number: number,
  touchedAt: number | null,
): boolean {
  const cueAt = touchedAt ?? timed.find((interval) => interval.number === number)?.cueAt ?? Number.NaN;
  return state.covers.some(
    (cover) =>
      (cover.reason === 'class interrupted' || cover.reason === 'paused') &&
      cover.from <= cueAt &&
      (cover.to === null || cueAt < cover.to),
  );
}
