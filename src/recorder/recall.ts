import type { Method } from '../model/protocol.ts';
import type { Book } from './book.ts';
import { reminder, reminderRhythm } from './cuePatterns.ts';
import type { VibrationPort } from './ports.ts';
import type { RoomView } from './roomView.ts';
import type { SoundDesk } from './soundDesk.ts';

/** So long before its interval is lost a prompt is recalled, or a quarter of its time where that is shorter. */
const recallMs = 3000;

interface Parts {
  readonly method: Method;
  readonly view: RoomView;
  readonly book: Book;
  readonly sound: SoundDesk;
  readonly vibration: VibrationPort;
}

/** A prompt that waits for its mark is felt and heard once more before its interval is lost. */
export class Recall {
  /** How many prompts were recalled. */
  count = 0;
  wanted = false;
  private last = 0;

  constructor(private readonly parts: Parts) {}

  /** Recalls what is due by now; at most once an interval. */
  due(now: number): void {
    const waiting = this.waiting(now);
    if (waiting === null || now < waiting.at) return;
    this.count += 1;
    this.last = waiting.interval;
    const { sound, vibration } = this.parts;
    sound.play(reminder);
    if (vibration.available) vibration.vibrate(reminderRhythm);
  }

  /** Session time of the next recall, as far as it is known now; infinite for none. */
  nextAfter(now: number): number {
    const at = this.waiting(now)?.at ?? Number.POSITIVE_INFINITY;
    return at > now ? at : Number.POSITIVE_INFINITY;
  }

  private waiting(now: number): { readonly interval: number; readonly at: number } | null {
    const { method, view, book } = this.parts;
    if (!this.wanted || method === 'duration') return null;
    const current = view.currentAt(book.state, now);
    if (current?.status !== 'open' || current.number === this.last) return null;
    const left = Math.min(recallMs, (current.closeAt - current.cueAt) / 4);
    return { interval: current.number, at: current.closeAt - left };
  }
}
