import { epochMs } from '../kernel/units.ts';
import type { WallClock } from '../recorder/ports.ts';

/** The tablet's wall clock and time zone. */
export const wallClock: WallClock = {
  now: () => epochMs(Date.now()),
  offsetMinutes: (at) => -new Date(at).getTimezoneOffset(),
  timeZone: () => Intl.DateTimeFormat().resolvedOptions().timeZone ?? null,
};
