import type { JournalState } from '../journal/state.ts';

/**
 * How many children are present in a headcount: as the count of the latest scan said, or before the first count all who
 * are expected; children who left since then are fewer, those who came back are more.
 */
export function presentNow({ entries, header }: Pick<JournalState, 'entries' | 'header'>): number {
  const expected = new Set(header.children.map(({ id }) => id));
  let [present, scan] = [header.children.length, 0];
  for (const entry of entries) {
    if (entry.kind === 'left' && expected.has(entry.child)) present -= 1;
    else if (entry.kind === 'returned' && expected.has(entry.child)) present += 1;
    else if ((entry.kind === 'marked' || entry.kind === 'corrected') && entry.counts !== undefined) {
      // A correction of an earlier scan says nothing of now.
      if (entry.interval < scan) continue;
      scan = entry.interval;
      present = entry.counts.present;
    }
  }
  return Math.max(0, present);
}
