import type { EntryBody, KnownEntry } from '../journal/entry.ts';
import type { Id } from '../kernel/ids.ts';
import { sessionMs } from '../kernel/units.ts';
import { toWallTime } from '../kernel/wallTime.ts';
import type { WallClock } from './ports.ts';

/** Stamps entries: one writer, numbered without gaps. */
export class JournalWriter {
  /** @param seq the number of the next entry */
  constructor(
    private readonly session: Id,
    readonly writer: Id,
    private seq: number,
    private readonly wall: WallClock,
  ) {}

  /** @param at session time; rounded to whole milliseconds */
  entry(at: number, body: EntryBody): KnownEntry {
    const now = this.wall.now();
    const stamp = {
      session: this.session,
      writer: this.writer,
      seq: this.seq,
      at: sessionMs(at) + 0,
      wall: toWallTime(now, this.wall.offsetMinutes(now)),
    };
    this.seq += 1;
    return { ...stamp, ...body };
  }
}
