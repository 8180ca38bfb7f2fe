import { byCodePoint } from '../kernel/compare.ts';
import type { Revision } from './common.ts';

/** Positive when `a` is the newer state of the record, negative when `b` is, 0 for the same state. */
export function compareRevisions(a: Revision, b: Revision): number {
  return a.counter - b.counter || byCodePoint(a.writer, b.writer);
}

/** The revision of the next edit made by this writer. */
export function nextRevision(previous: Revision | null, writer: string): Revision {
  return { counter: (previous?.counter ?? -1) + 1, writer };
}
