import type { JournalEntry } from '../journal/entry.ts';
import { canonicalJson } from '../kernel/canonicalJson.ts';
import { type Fault, fault } from './problemValues.ts';

/** Entries that are absent from a journal (each writer counts from 0 without gaps), and identities with two contents. */
export function checkJournal(
  journal: readonly JournalEntry[],
  path: string,
): { path: string | null; fault: Fault }[] {
  const notices: { path: string | null; fault: Fault }[] = [];
  const writers = new Map<string, Map<number, JournalEntry>>();
  for (const [e, entry] of journal.entries()) {
    const known = writers.get(entry.writer) ?? new Map<number, JournalEntry>();
    writers.set(entry.writer, known);
    const other = known.get(entry.seq);
    if (other !== undefined && canonicalJson(other) !== canonicalJson(entry)) {
      const place = `${path}[${e}]`;
      notices.push({ path: place, fault: fault('study.entryConflict', { path: place, seq: entry.seq }) });
    }
    known.set(entry.seq, entry);
  }
  for (const entries of writers.values()) {
    const numbers = [...entries.keys()].sort((a, b) => a - b);
    const absent = (numbers.at(-1) ?? -1) + 1 - numbers.length;
    if (absent === 0) continue;
    const first = numbers.findIndex((seq, i) => seq !== i);
    notices.push({ path, fault: fault('study.gap', { path, n: absent, first }) });
  }
  return notices;
}
