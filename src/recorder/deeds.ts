import { isCovered } from '../journal/state.ts';
import type { PageMs } from '../kernel/units.ts';
import type { Book } from './book.ts';
import type { SessionClock } from './clock.ts';
import type { CueRound } from './cueRound.ts';
import type { Plan } from './grid.ts';
import type { SoundDesk } from './soundDesk.ts';
import { countInMs, type Standing } from './standing.ts';
import type { TouchDesk } from './touchDesk.ts';
import { timeOf, undoable } from './undoable.ts';

/** Time between a tap that begins a part and its first tick: enough to lay the tick on the audio clock. */
export const headStartMs = 250;

/** What the deeds of an observer work on. */
export interface Desk {
  readonly plan: Plan;
  readonly book: Book;
  readonly clock: SessionClock;
  readonly cues: CueRound;
  readonly sound: SoundDesk;
  readonly touches: TouchDesk;
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

export const resume: Deed = ({ book, clock }, { now, place, page }) => {
  if (place.phase !== 'paused') return;
  clock.resume(page);
  book.write(now, { kind: 'resumed' });
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
