import type { AwayReason } from '../journal/entry.ts';
import { readOut } from '../journal/readOut.ts';
import { isCovered, type JournalState } from '../journal/state.ts';
import type { Id } from '../kernel/ids.ts';
import type { PageMs } from '../kernel/units.ts';
import type { MissingReason } from '../model/missing.ts';
import type { Protocol } from '../model/protocol.ts';
import type { ScheduledInterval } from '../schedule/layOut.ts';
import type { Book } from './book.ts';
import type { SessionClock } from './clock.ts';
import type { CueRound } from './cueRound.ts';
import { freeReserve } from './freeReserve.ts';
import type { Plan } from './grid.ts';
import type { HeadsUp } from './headsUp.ts';
import type { Correction } from './liveSession.ts';
import type { SoundDesk } from './soundDesk.ts';
import { breathMs, countInMs, type Standing } from './standing.ts';
import type { TouchDesk } from './touchDesk.ts';
import { timeOf, undoable } from './undoable.ts';

/** Time between a tap that begins a part and its first tick: enough to lay the tick on the audio clock. */
export const headStartMs = 250;

/** What the deeds of an observer work on. */
export interface Desk {
  readonly protocol: Protocol;
  readonly plan: Plan;
  readonly book: Book;
  readonly clock: SessionClock;
  readonly cues: CueRound;
  readonly sound: SoundDesk;
  readonly touches: TouchDesk;
  readonly headsUp: HeadsUp;
}

/** The moment of a tap: session time, page time, and where the session stands. */
export interface Present {
  readonly now: number;
  readonly page: PageMs;
  readonly place: Standing;
}

/** One tap of the observer beside the marks. What makes no sense where the session stands does nothing. */
export type Deed = (desk: Desk, present: Present) => void;

export const undo: Deed = ({ book, touches, cues }, { now }) => {
  const last = undoable(book.state);
  if (last === null) return;
  const since = timeOf(book.state, last.target) ?? now;
  book.write(now, { kind: 'withdrawn', target: last.target });
  touches.forget();
  cues.takeBack();
  // Cues that were held back while what is now undone was believed: nobody got them.
  if (last.kind === 'interrupted' || last.kind === 'breakStarted') cues.sayLost(since, now);
};

export const interruptClass: Deed = ({ book, cues }, { now, place }) => {
  if (place.phase !== 'running') return;
  book.write(now, { kind: 'interrupted' });
  cues.takeBack();
};

export const continueClass: Deed = ({ book }, { now }) => {
  if (isCovered(book.state, 'class interrupted')) book.write(now, { kind: 'continued' });
};

/** Only for an observer who records alone: two would drift apart. */
export const pause: Deed = ({ book, clock, cues }, { now, place, page }) => {
  const may = place.phase === 'running' || place.phase === 'interrupted';
  if (!may || book.state.header.role !== null) return;
  clock.pause(page);
  book.write(now, { kind: 'paused' });
  cues.takeBack();
};

export const resume: Deed = ({ book, clock, cues, headsUp, plan, protocol }, { now, place, page }) => {
  if (place.phase !== 'paused') return;
  const broken = protocol.afterPause === 'repeat' ? brokenInterval(plan, book.state, now, protocol) : null;
  clock.resume(page);
  if (broken === null) {
    book.write(now, { kind: 'resumed' });
    return;
  }
  const openAt = (book.state.origins[broken.part] ?? 0) + broken.openMs;
  // A cue that opens the interval is given anew; one that came before it is not.
  const back = broken.cueMs === broken.openMs ? openAt - breathMs : openAt;
  clock.stepBack(now - back);
  cues.startAt(back);
  headsUp.startAt(back);
  book.write(back, { kind: 'resumed', repeats: broken.number });
};

/**
 * The interval that a pause at session time `now` broke, where doing it again makes sense: a momentary look that was
 * already answered is not broken by a pause after it.
 */
function brokenInterval(
  plan: Plan,
  state: JournalState,
  now: number,
  { method }: Protocol,
): ScheduledInterval | null {
  if (method === 'duration') return null;
  const line = plan.intervals.findLast(({ part, openMs, endMs }) => {
    const origin = state.origins[part] ?? Number.NaN;
    return origin + openMs <= now && now < origin + endMs;
  });
  if (line === undefined) return null;
  const looked = (method === 'momentary' || method === 'headcount') && line.cueMs === line.openMs;
  const answered = readOut(state, { now })[line.number - 1]?.status === 'scored';
  return looked && answered ? null : line;
}

export const childLeft =
  (child: Id, reason: AwayReason): Deed =>
  ({ book, protocol }, { now }) => {
    const by = protocol.reservesStepIn === true ? freeReserve(book.state, child) : null;
    book.write(now, { kind: 'left', child, reason, ...(by === null ? {} : { by }) });
  };

export const swap =
  (pairs: readonly (readonly [number, number])[]): Deed =>
  ({ book }, { now }) => {
    if (pairs.length > 0) book.write(now, { kind: 'swapped', pairs: pairs.map(([a, b]) => [a, b]) });
  };

export const correct =
  (interval: number, to: Correction): Deed =>
  ({ book }, { now }) => {
    const record = readOut(book.state, { now })[interval - 1];
    if (record === undefined || record.status === 'waiting') return;
    const counts = 'counts' in to ? { counts: to.counts } : {};
    const codes = 'codes' in to ? [...to.codes] : 'counts' in to ? [] : null;
    book.write(now, {
      kind: 'corrected',
      interval,
      codes,
      missing: 'missing' in to ? to.missing : null,
      ...counts,
    });
  };

export const unusable =
  (stretch: { from: number; to: number }, reason: MissingReason, words?: string): Deed =>
  ({ book }, { now }) => {
    const from = Math.round(stretch.from);
    const to = Math.round(stretch.to);
    if (to <= from) return;
    book.write(now, { kind: 'unusable', from, to, reason, ...(words === undefined ? {} : { words }) });
  };

export const breakStarted: Deed = ({ book, cues, plan }, { now, place }) => {
  if (place.phase === 'paused' || place.part + 1 >= plan.parts.length) return;
  if ((book.state.closed[place.part] ?? null) !== null) return;
  book.write(now, { kind: 'breakStarted' });
  cues.takeBack();
};

export const firstTaskGiven: Deed = ({ book, cues, plan }, { now, place }) => {
  if (place.phase !== 'between parts') return;
  if (isCovered(book.state, 'class interrupted')) book.write(now, { kind: 'continued' });
  const inBreak = (book.state.closed[place.part] ?? null) !== null;
  if (inBreak) book.write(now, { kind: 'breakEnded' });
  const origin = Math.round(now) + headStartMs + countInMs;
  const phase = plan.parts[place.next]?.phase ?? '';
  book.write(now, { kind: 'phaseStarted', phase, part: place.next, origin });
  cues.takeBack();
};

export const silence =
  (silent: boolean): Deed =>
  ({ book, cues, sound }, { now }) => {
    const said = sound.byHand(!silent);
    if (said === null) return;
    book.write(now, said);
    if (silent) cues.takeBack();
  };
