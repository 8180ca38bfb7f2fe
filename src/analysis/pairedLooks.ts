import { byText } from './order.ts';
import type { Look, SessionRecord } from './sessionRecord.ts';

/** One interval as both observers have it; null where an observer's schedule does not hold it. */
export interface PairedLook {
  readonly number: number;
  /** Pseudonym; null for headcounts. */
  readonly child: string | null;
  readonly a: Look | null;
  readonly b: Look | null;
  /** Both scored it. */
  readonly compared: boolean;
}

/** Lines up two records of one visit: same child, same interval number. In the order of the intervals. */
export function pairedLooks(a: SessionRecord, b: SessionRecord): PairedLook[] {
  const lines = new Map<string, { number: number; child: string | null; a: Look | null; b: Look | null }>();
  const put = (record: SessionRecord, side: 'a' | 'b'): void => {
    const labels = new Map(record.children.map(({ id, label }) => [id, label]));
    for (const look of record.looks) {
      const child = look.child === null ? null : (labels.get(look.child) ?? look.child);
      const key = JSON.stringify([child, look.number]);
      const line = lines.get(key) ?? { number: look.number, child, a: null, b: null };
      line[side] = look;
      lines.set(key, line);
    }
  };
  put(a, 'a');
  put(b, 'b');
  return [...lines.values()]
    .map((line) => ({ ...line, compared: line.a?.status === 'scored' && line.b?.status === 'scored' }))
    .sort((x, y) => x.number - y.number || byText(x.child, y.child));
}

/** What two observers' records have in common: how their intervals can be compared at all. */
export type Comparable = 'codes' | 'sets' | 'counts' | 'duration' | 'methods differ';

export function comparableAs(a: SessionRecord, b: SessionRecord): Comparable {
  if (a.method !== b.method) return 'methods differ';
  switch (a.method) {
    case 'momentary':
      return 'codes';
    case 'partial':
    case 'whole':
      return 'sets';
    case 'headcount':
      return 'counts';
    case 'duration':
      return 'duration';
  }
}

/** One text for what an observer scored, equal exactly when two observers scored the same: code, set of codes, or counts. */
export function scoredAs(look: Look): string {
  if (look.counts !== null) return JSON.stringify([look.counts.on, look.counts.present]);
  return JSON.stringify([...(look.labels ?? [])].sort());
}
