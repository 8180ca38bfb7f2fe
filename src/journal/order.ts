import { byCodePoint } from '../kernel/compare.ts';
import { epochOf } from '../kernel/wallTime.ts';
import type { JournalEntry } from './entry.ts';

/**
 * The order in which a journal is read: one writer after the other (by the wall clock of its first entry, ties by
 * writer), and within a writer by sequence number, never by the wall clock, which may be moved.
 */
export function inOrder<E extends JournalEntry>(entries: readonly E[]): E[] {
  const first = new Map<string, { seq: number; epoch: number }>();
  for (const entry of entries) {
    const known = first.get(entry.writer);
    if (known === undefined || entry.seq < known.seq) {
      const epoch = epochOf(entry.wall);
      first.set(entry.writer, {
        seq: entry.seq,
        epoch: Number.isNaN(epoch) ? Number.POSITIVE_INFINITY : epoch,
      });
    }
  }
  const begin = (entry: E): number => first.get(entry.writer)?.epoch ?? 0;
  return [...entries].sort((a, b) =>
    a.writer === b.writer ? a.seq - b.seq : begin(a) - begin(b) || byCodePoint(a.writer, b.writer),
  );
}
