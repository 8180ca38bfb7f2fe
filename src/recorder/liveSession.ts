import type { AwayReason, EntryRef, JournalEntry } from '../journal/entry.ts';
import type { Id } from '../kernel/ids.ts';
import type { Result } from '../kernel/result.ts';
import type { EpochMs, PageMs } from '../kernel/units.ts';
import type { MissingReason } from '../model/missing.ts';
import type { Manner } from '../model/observer.ts';
import type { Stop } from './ports.ts';
import type { RoomSnapshot } from './roomSnapshot.ts';

/**
 * A session while it is recorded. It lives outside React and survives a broken screen. Times of touches are the
 * `event.timeStamp` of the touch going down.
 */
export interface LiveSession {
  subscribe(listener: () => void): Stop;
  snapshot(): RoomSnapshot;
  /**
   * Called in the tap: unlocks the sound, counts in (3, 2, 1), then session time 0. Goes on without sound where the
   * browser gives none (`sound` false). Fails when another tab records.
   */
  begin(how?: Beginning): Promise<Result<{ readonly sound: boolean }>>;
  /** Takes the start back before session time 0, while nothing could be marked: the session waits to be begun anew. */
  callOff(): void;
  /** A code; null = observed, none of the codes occurred. */
  touch(code: string | null, at: PageMs): void;
  /** Headcount: children on-task and children present; `of`: the interval whose figure was stepped on from. */
  count(on: number, present: number, at: PageMs, of?: number): void;
  cannotSee(at: PageMs): void;
  /** What stands at the other intervals of each pair changes places: the wrong child was watched. */
  swap(pairs: readonly (readonly [number, number])[]): void;
  /** From now on the interval holds this, whatever was touched before. */
  correct(interval: number, to: Correction): void;
  /** Intervals whose cue lies in [from, to) of session time are missing, with this reason. */
  unusable(
    stretch: { readonly from: number; readonly to: number },
    reason: MissingReason,
    words?: string,
  ): void;
  /** How touches are answered and prompts recalled; may change while the session runs. */
  behave(manner: Pick<Manner, 'confirm' | 'remind'>): void;
  /** The next touch (within 5 s) marks the interval before; a second call takes that back. */
  childBefore(): void;
  undo(): void;
  childLeft(child: Id, reason: AwayReason): void;
  childReturned(child: Id): void;
  childMoved(child: Id, seat: Id): void;
  interruptClass(): void;
  continueClass(): void;
  /** True pause; nothing happens unless the observer records alone (`mayPause`). */
  pause(): void;
  resume(): void;
  flag(): void;
  note(text: string, about?: EntryRef): void;
  lessonPart(lessonPart: string | null): void;
  /** Closes the running part; its last look stays open for its time. */
  breakStarted(): void;
  /** Opens the next part after the count-in. */
  firstTaskGiven(): void;
  /** true = silent. Turning the sound on again is also the answer to "the output changed". */
  silence(silent: boolean): void;
  /** Ends the session early. */
  end(words?: string): void;
  /** Resolves when everything queued is durable, or false after one more refusal. */
  flush(): Promise<boolean>;
  /** Lets go of every port. What is not kept yet goes on being tried until it is. */
  dispose(): void;
}

/** What a correction puts in place of what was there. */
export type Correction =
  | { readonly codes: readonly string[] }
  | { readonly missing: MissingReason }
  | { readonly counts: { readonly on: number; readonly present: number } };

export interface Beginning {
  /** Session time 0 is this moment of the nudged wall clock (agreed with the second observer). Default: after the count-in. */
  readonly at?: EpochMs;
  /** What the tick check found: how many milliseconds later than it shows this tablet's wall clock is to be read. */
  readonly nudgeMs?: number;
}

export interface LiveOptions {
  /** How touches are answered and prompts recalled. Default: answered, and not recalled. */
  readonly manner?: Pick<Manner, 'confirm' | 'remind'>;
  /** The words that are spoken ahead of a look; null where there is nothing to say. */
  readonly headsUp?: (look: { readonly child: Id | null; readonly seat: Id | null }) => string | null;
  /** Checks that stood on hold when the observer went in. */
  readonly checks: readonly string[];
  readonly anyway: boolean;
  /** The journal of a session that was cut off: it goes on at the right interval of its grid. */
  readonly resumeFrom?: readonly JournalEntry[];
  /** True when that journal comes from another tablet: a new writer then goes on with it. */
  readonly elsewhere?: boolean;
  /** A quiet lead-in before each tone, for wireless earpieces. Default: where the output's delay says that it is one. */
  readonly leadIn?: boolean;
}
