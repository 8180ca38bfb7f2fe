import { childAt } from '../journal/state.ts';
import type { Id } from '../kernel/ids.ts';
import type { Protocol } from '../model/protocol.ts';
import type { Book } from './book.ts';
import { dueIn, type GridCue, type Plan } from './grid.ts';
import type { SpeechPort } from './ports.ts';

/** Words that come later than this would run into the look itself: they are left out. */
const lateMs = 400;

export type HeadsUpWords = (look: { readonly child: Id | null; readonly seat: Id | null }) => string | null;

interface Parts {
  readonly protocol: Pick<Protocol, 'cues' | 'intervalMs'>;
  readonly plan: Plan;
  readonly book: Book;
  readonly speech: SpeechPort;
  readonly words: HeadsUpWords | null;
}

/** Says ahead of a look whose it is: by a voice that is on the tablet, or else by a soft tone laid with the cues. */
export class HeadsUp {
  private done = Number.NEGATIVE_INFINITY;

  constructor(private readonly parts: Parts) {}

  /** So long before its cue; never so long that it would come before the cue before. null where the protocol wants none. */
  get aheadMs(): number | null {
    const { cues, intervalMs } = this.parts.protocol;
    return cues.headsUp === undefined ? null : Math.min(cues.headsUp.aheadMs, intervalMs - 1000);
  }

  get spoken(): boolean {
    return this.parts.words !== null && this.parts.speech.available();
  }

  /** How far ahead of each look a tone has to be laid; null where a voice speaks, or nothing is wanted. */
  get toneAheadMs(): number | null {
    return this.spoken ? null : this.aheadMs;
  }

  /** The session time of the next words; infinite where none are to come. */
  nextAfter(cues: readonly GridCue[], now: number): number {
    const ahead = this.aheadMs;
    if (ahead === null || !this.spoken) return Number.POSITIVE_INFINITY;
    return (cues.find((cue) => opens(cue) && cue.at - ahead > now)?.at ?? Number.POSITIVE_INFINITY) - ahead;
  }

  /** Speaks what is due by now. What was not spoken in time is left out, never caught up. */
  speak(cues: readonly GridCue[], now: number, wanted: boolean): void {
    const ahead = this.aheadMs;
    const from = Math.max(this.done, now - lateMs);
    this.done = Math.max(this.done, now);
    if (ahead === null || !wanted || !this.spoken) return;
    const due = dueIn(cues, from + ahead, now + ahead).findLast(opens);
    if (due === undefined) return;
    const { plan, book, speech, words, protocol } = this.parts;
    const planned = plan.intervals[due.interval - 1]?.child ?? null;
    const child = planned === null ? null : childAt(book.state, planned, due.at);
    const said = words?.({ child, seat: child === null ? null : (book.state.seats.get(child) ?? null) });
    if (said != null) speech.speak(said, protocol.cues.volume);
  }

  startAt(now: number): void {
    this.done = now;
  }
}

/** A sweep is announced once, not child by child. */
const opens = ({ cue }: GridCue): boolean => cue === 'look' || cue === 'observe';
