import type { AwayReason, CueKind, EntryKind, EntryRef } from '../journal/entry.ts';
import type { IntervalRecord } from '../journal/readOut.ts';
import type { JournalState } from '../journal/state.ts';
import type { Id } from '../kernel/ids.ts';
import type { Problem } from '../kernel/result.ts';
import type { SessionMs } from '../kernel/units.ts';
import type { WakeLockState } from './ports.ts';

export type RoomPhase =
  /** Before the tap that begins (or goes on with) the session. */
  | 'ready'
  | 'counting in'
  | 'running'
  /** True pause: the schedule stands still. */
  | 'paused'
  /** The class is interrupted: the schedule runs on in silence. */
  | 'interrupted'
  | 'between parts'
  | 'ended';

/** The next look: whose, where, when. */
export interface UpcomingLook {
  readonly number: number;
  readonly part: number;
  readonly phase: string | null;
  readonly round: number | null;
  readonly child: Id | null;
  readonly seat: Id | null;
  /** null until its part has begun. */
  readonly cueAt: SessionMs | null;
  /** Why the child is away at present, or null. */
  readonly away: AwayReason | null;
}

export interface PartAhead {
  readonly part: number;
  readonly phase: string | null;
}

/** What "undo" would take back. */
export interface Undoable {
  readonly target: EntryRef;
  readonly kind: EntryKind;
  readonly interval: number | null;
  readonly child: Id | null;
  /** The code of a mark; null for "nothing of these", and for other kinds. */
  readonly code: string | null;
}

/** The last touch that was taken; `count` goes up by one with each, so that the same code twice is seen. */
export interface Felt {
  readonly count: number;
  readonly interval: number;
  /** null = observed, none of the codes. */
  readonly code: string | null;
  readonly outOfView: boolean;
  readonly late: boolean;
  readonly before: boolean;
}

/** Why a touch was not taken. */
export type Refusal =
  | 'not running'
  | 'before the first cue'
  | 'after the last interval'
  | 'class interrupted'
  | 'nothing before'
  | 'another scan'
  /** A palm or a second touch of the same finger. */
  | 'double touch';

export interface Kept {
  readonly kept: number;
  readonly of: number;
  /** Why the last write was refused; null when all goes well. */
  readonly refused: Problem | null;
}

export interface SoundNow {
  readonly on: boolean;
  /** Who switched it last: the observer's hand or the device (earpiece out, sound stuck); null when never switched. */
  readonly cause: 'hand' | 'device' | null;
  /** False while the audio clock does not run: cues are then shown only, whatever `on` says. */
  readonly heard: boolean;
  readonly output: string | null;
  readonly latencyMs: number | null;
  readonly tellsOutputChanges: boolean;
}

/**
 * All that the room screen shows. The same object between changes (for `useSyncExternalStore`); a new one after each
 * cue, touch, tap, kept entry, and once a second while time runs.
 */
export interface RoomSnapshot {
  readonly phase: RoomPhase;
  /** True before `begin()` when this goes on with a session that was cut off. */
  readonly resuming: boolean;
  readonly now: SessionMs;
  /** 3, 2, 1 while counting in, else null. */
  readonly countIn: number | null;
  /** The interval whose cue came last; null before the first cue of a part and after its last interval has closed. */
  readonly current: IntervalRecord | null;
  readonly upcoming: UpcomingLook | null;
  /** The interval that "child before" would mark; null where there is none. */
  readonly previous: IntervalRecord | null;
  /** Number of the interval that the next touch marks by "child before"; null when not armed. */
  readonly armedBefore: number | null;
  /** In a duration record the stretches so far, the one that goes on now last. */
  readonly intervals: readonly IntervalRecord[];
  /** The looks of the last round whose cues have come, oldest first: what may be corrected at once. */
  readonly lastRound: readonly IntervalRecord[];
  /** Headcount: children present, as the last count said, or as many as are expected, less those who left since. */
  readonly present: number;
  /** Milliseconds until the second at which both observers agreed to begin; null when none is awaited. */
  readonly startsIn: number | null;
  /** Goes up by one each time a prompt that waits for its mark is recalled. */
  readonly reminded: number;
  /** Part now running, or last run. */
  readonly part: number;
  readonly partPhase: string | null;
  /** The part that "first task given" would open; null when there is none. */
  readonly nextPart: PartAhead | null;
  readonly round: number | null;
  readonly rounds: number | null;
  /** Until the last interval of the running part closes. */
  readonly msLeft: number | null;
  readonly msToNextCue: number | null;
  /** The cue that came last: look (momentary), observe or record (observed parts). */
  readonly cuePart: CueKind | null;
  readonly kept: Kept;
  readonly undo: Undoable | null;
  readonly sound: SoundNow;
  readonly wakeLock: WakeLockState;
  readonly vibrates: boolean;
  readonly away: ReadonlyMap<Id, AwayReason>;
  /** Where each child sits now: child to seat. */
  readonly seats: ReadonlyMap<Id, Id>;
  readonly lessonPart: string | null;
  readonly mayPause: boolean;
  readonly breakStarted: boolean;
  /** Goes up by one at each cue that the screen shows. */
  readonly flash: number;
  /** The protocol's wish, or true while cues are not heard: the screen's cue should be strong. */
  readonly flashStrongly: boolean;
  readonly felt: Felt | null;
  readonly refusal: { readonly count: number; readonly why: Refusal } | null;
  /** The last flag, for words later. */
  readonly lastFlag: EntryRef | null;
  readonly ended: 'complete' | 'early' | null;
  readonly state: JournalState;
}
