import type { JournalEntry } from '../journal/entry.ts';
import type { StoredSession } from '../journal/stored.ts';
import { unionOfJournals } from '../journal/union.ts';
import { canonicalJson } from '../kernel/canonicalJson.ts';
import { byCodePoint } from '../kernel/compare.ts';
import type { MergeConflict } from './types.ts';

/**
 * Union of sessions: one header, the union of its journals. A header that stands with two contents (which a frozen
 * one never should) is told; the recorded one goes before one from a table, then canonical order decides. Records
 * under different headers are never mixed.
 */
export function mergeSessions(sessions: readonly StoredSession[]): {
  sessions: StoredSession[];
  conflicts: MergeConflict[];
} {
  const groups = new Map<string, StoredSession[]>();
  for (const session of sessions) {
    const group = groups.get(session.header.id);
    if (group === undefined) groups.set(session.header.id, [session]);
    else group.push(session);
  }
  const conflicts: MergeConflict[] = [];
  const merged = [...groups.entries()]
    .sort(([a], [b]) => byCodePoint(a, b))
    .map(([id, group]) => {
      const [first] = group as [StoredSession, ...StoredSession[]];
      if (group.length === 1 && inCanonicalOrder(first.journal)) return first;
      const variants = new Map<string, StoredSession[]>();
      for (const session of group) {
        const text = `${session.header.schedule.kind === 'laid' ? 0 : 1}${canonicalJson(session.header)}`;
        variants.set(text, [...(variants.get(text) ?? []), session]);
      }
      const ordered = [...variants].sort(([a], [b]) => (a < b ? -1 : 1)).map(([, same]) => same);
      const headers = ordered.flatMap(([one]) => (one === undefined ? [] : [one.header]));
      if (headers.length > 1) conflicts.push({ kind: 'session', session: id, headers });
      const union = unionOfJournals(...(ordered[0] ?? group).map(({ journal }) => journal));
      for (const { writer, seq, contents } of union.conflicts)
        conflicts.push({ kind: 'entry', session: id, writer, seq, contents });
      return { header: headers[0] ?? first.header, journal: union.entries };
    });
  return { sessions: merged, conflicts };
}

/** True for a journal that is its own union: each identity once, in the order that a union gives. */
function inCanonicalOrder(journal: readonly JournalEntry[]): boolean {
  return journal.every((entry, i) => {
    const before = journal[i - 1];
    if (before === undefined) return true;
    return before.writer === entry.writer ? before.seq < entry.seq : before.writer < entry.writer;
  });
}
