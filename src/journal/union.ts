import { canonicalJson } from '../kernel/canonicalJson.ts';
import type { JournalEntry } from './entry.ts';

/** One identity that stands with two contents: both are kept, to be looked at. */
export interface JournalConflict {
  readonly writer: string;
  readonly seq: number;
  readonly contents: JournalEntry[];
}

export interface JournalUnion {
  /** Every distinct entry; where an identity has several contents all of them, in canonical order. */
  readonly entries: JournalEntry[];
  readonly conflicts: JournalConflict[];
}

/** Set union of journals of one session: idempotent, commutative, associative. Order of the result is canonical. */
export function unionOfJournals(...journals: readonly (readonly JournalEntry[])[]): JournalUnion {
  const byText = new Map<string, JournalEntry>();
  for (const journal of journals) for (const entry of journal) byText.set(canonicalJson(entry), entry);
  const sorted = [...byText.entries()].sort(
    ([a, x], [b, y]) =>
      (x.writer < y.writer ? -1 : x.writer > y.writer ? 1 : x.seq - y.seq) || (a < b ? -1 : 1),
  );
  const entries = sorted.map(([, entry]) => entry);
  const groups = new Map<string, JournalEntry[]>();
  for (const entry of entries) {
    const key = `${entry.writer}\u0000${entry.seq}`;
    groups.set(key, [...(groups.get(key) ?? []), entry]);
  }
  const conflicts = [...groups.values()]
    .filter((group) => group.length > 1)
    .map((contents) => ({ writer: contents[0]?.writer ?? '', seq: contents[0]?.seq ?? 0, contents }));
  return { entries, conflicts };
}
