import { epochMs, type WallTime } from '../kernel/units.ts';
import { epochOf, toWallTime } from '../kernel/wallTime.ts';
import type { SessionHeader } from '../model/session.ts';

/**
 * What the wall clock may have shown at a session time (ms) of a session from a table: counted from its start, else
 * from midnight (UTC) of its date, else from 1970.
 */
export function wallClockOf({ plannedStart, date }: SessionHeader): (at: number) => WallTime {
  const start = plannedStart ?? `${date ?? '1970-01-01'}T00:00:00Z`;
  const epoch = epochOf(start);
  const [, sign, hours, minutes] = /([+-])(\d{2}):(\d{2})$/.exec(start) ?? [];
  const offset = (sign === '-' ? -1 : 1) * (Number(hours ?? 0) * 60 + Number(minutes ?? 0));
  return (at) => toWallTime(epochMs(epoch + at), offset);
}
