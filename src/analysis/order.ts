import { byCodePoint } from '../kernel/compare.ts';
import { epochOf } from '../kernel/wallTime.ts';
import type { SessionRecord } from './sessionRecord.ts';

/** Texts by code point, null last. */
export function byText(a: string | null, b: string | null): number {
  if (a === null || b === null) return (a === null ? 1 : 0) - (b === null ? 1 : 0);
  return byCodePoint(a, b);
}

/** Instants, unknown ones last. */
export function byStart(a: string | null, b: string | null): number {
  const [x, y] = [a === null ? Number.NaN : epochOf(a), b === null ? Number.NaN : epochOf(b)];
  if (Number.isNaN(x) || Number.isNaN(y)) return (Number.isNaN(x) ? 1 : 0) - (Number.isNaN(y) ? 1 : 0);
  return x - y;
}

/** An order of records that no order of rows or files can change. */
export function byRecord(a: SessionRecord, b: SessionRecord): number {
  return (
    byText(a.className, b.className) ||
    byText(a.date, b.date) ||
    byStart(a.start, b.start) ||
    byText(a.visit, b.visit) ||
    byCodePoint(a.observer, b.observer) ||
    byCodePoint(a.label, b.label) ||
    byCodePoint(a.session, b.session) ||
    a.place - b.place
  );
}
