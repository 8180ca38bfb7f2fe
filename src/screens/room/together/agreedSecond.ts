import { clockTime } from '../../../kernel/typedTime.ts';
import { type EpochMs, epochMs } from '../../../kernel/units.ts';
import { epochOf, shiftedWall } from '../../../kernel/wallTime.ts';

/** A second that is offered is at least so far away (ms): two people have to say it to each other. */
const awayMs = 20_000;

/** The visit's planned start is offered when it lies no further ahead than this (ms). */
const plannedWithinMs = 15 * 60_000;

/** So near (ms) a second cannot be begun at any more: the count-in needs its time. */
export const tooNearMs = 3500;

const halfDayMs = 12 * 3_600_000;

/**
 * The second that two observers will probably agree on: the planned start where it is near, else the next full minute.
 * @param now wall time as the tick check says that it is to be read
 */
export function likelySecond(now: string, plannedStart: string | null): EpochMs {
  const present = epochOf(now);
  const planned = plannedStart === null ? Number.NaN : epochOf(plannedStart);
  if (planned >= present + awayMs && planned <= present + plannedWithinMs) return epochMs(planned);
  return epochMs(Math.ceil((present + awayMs) / 60_000) * 60_000);
}

/** The moment that a typed time of day means, the one nearest to now; null for what is no time of day. */
export function typedSecond(text: string, now: string): EpochMs | null {
  const time = clockTime(text);
  if (time === null) return null;
  const seconds = time.length === 5 ? `${time}:00` : time;
  const today = epochOf(`${now.slice(0, 11)}${seconds}.000${now.slice(23)}`);
  const present = epochOf(now);
  const days = today < present - halfDayMs ? 1 : today > present + halfDayMs ? -1 : 0;
  return epochMs(today + days * 2 * halfDayMs);
}

/** A moment as this tablet's clock will show it: `10:42:00`. */
export function secondOfDay(at: EpochMs, now: string): string {
  return shiftedWall(now, at - epochOf(now)).slice(11, 19);
}
