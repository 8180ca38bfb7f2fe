import { type EpochMs, epochMs, type WallTime } from './units.ts';
import { epochOf, toWallTime } from './wallTime.ts';

/** A zone's offset from UTC at an instant, in minutes, east positive; null for a zone that is not known. */
export function offsetAt(epoch: EpochMs, timeZone: string): number | null {
  try {
    const parts = new Intl.DateTimeFormat('en', { timeZone, timeZoneName: 'longOffset' }).formatToParts(
      epoch,
    );
    const name = parts.find(({ type }) => type === 'timeZoneName')?.value ?? '';
    const found = /^GMT(?:([+-])(\d{2}):(\d{2}))?/.exec(name);
    if (found === null) return null;
    const [, sign, hours, minutes] = found;
    return sign === undefined ? 0 : (sign === '-' ? -1 : 1) * (Number(hours) * 60 + Number(minutes));
  } catch {
    return null;
  }
}

/** An instant as local date and time of a zone; by `fallback` minutes where the zone is not known. */
export function wallIn(epoch: EpochMs, timeZone: string | null, fallback: number): WallTime {
  return toWallTime(epoch, (timeZone === null ? null : offsetAt(epoch, timeZone)) ?? fallback);
}

/**
 * The instant of a local date (`2026-11-03`) and clock time (`10:42` or `10:42:07`); null for what is neither. An hour
 * that a zone has twice is taken for the first one, an hour that it leaves out for the one after.
 */
export function instantOf(
  date: string,
  time: string,
  timeZone: string | null,
  fallback: number,
): EpochMs | null {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(date) || !/^([01]\d|2[0-3]):[0-5]\d(:[0-5]\d)?$/.test(time)) return null;
  const asUtc = epochOf(`${date}T${time.length === 5 ? `${time}:00` : time}Z`);
  if (Number.isNaN(asUtc) || new Date(asUtc).toISOString().slice(0, 10) !== date) return null;
  if (timeZone === null) return epochMs(asUtc - fallback * 60_000);
  const around = [-86_400_000, 86_400_000].map((by) => offsetAt(epochMs(asUtc + by), timeZone) ?? fallback);
  const tried = around.map((offset) => epochMs(asUtc - offset * 60_000)).sort((a, b) => a - b);
  const fits = tried.find((epoch) => epoch + (offsetAt(epoch, timeZone) ?? fallback) * 60_000 === asUtc);
  return fits ?? (tried.at(-1) as EpochMs);
}

/** The offset that a wall time is written with, in minutes. */
export function offsetOf(wall: string): number {
  const found = /([+-])(\d{2}):(\d{2})$/.exec(wall);
  return found === null ? 0 : (found[1] === '-' ? -1 : 1) * (Number(found[2]) * 60 + Number(found[3]));
}
