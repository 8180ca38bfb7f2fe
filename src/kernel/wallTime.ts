import { type EpochMs, epochMs, type WallTime } from './units.ts';

const two = (n: number): string => String(n).padStart(2, '0');

/**
 * Writes an instant as local date and time with its offset.
 * @param epoch instant
 * @param offsetMinutes the zone's offset from UTC at that instant, east positive (`-new Date().getTimezoneOffset()`)
 */
export function toWallTime(epoch: EpochMs, offsetMinutes: number): WallTime {
  const local = new Date(epoch + offsetMinutes * 60_000).toISOString().slice(0, 23);
  const sign = offsetMinutes < 0 ? '-' : '+';
  const size = Math.abs(offsetMinutes);
  return `${local}${sign}${two(Math.floor(size / 60))}:${two(size % 60)}` as WallTime;
}

/** The instant of a wall time; NaN when the text is no date. */
export function epochOf(wall: string): EpochMs {
  return epochMs(Date.parse(wall));
}

/** The calendar date as it was where it was written (`2026-11-03`), never shifted to another zone. */
export function dateOf(wall: string): string {
  return wall.slice(0, 10);
}

/** The wall time so many milliseconds later, with the same offset; the text as it is when it is no date. */
export function shiftedWall(wall: string, ms: number): string {
  const epoch = epochOf(wall);
  const [, sign, hours, minutes] = /([+-])(\d\d):(\d\d)$/.exec(wall) ?? [];
  if (Number.isNaN(epoch)) return wall;
  const size = sign === undefined ? 0 : Number(hours) * 60 + Number(minutes);
  return toWallTime(epochMs(epoch + ms), sign === '-' ? -size : size);
}
