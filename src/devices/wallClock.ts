import { epochMs } from '../kernel/units.ts';
import type { WallClock } from '../recorder/ports.ts';

export const wallClock: WallClock = {
  now: () => epochMs(Date.now()),
  // 0 − offset, since -0 would be written as such.
  offsetMinutes: (at) => 0 - new Date(at).getTimezoneOffset(),
  timeZone: () => Intl.DateTimeFormat().resolvedOptions().timeZone ?? null,
};
