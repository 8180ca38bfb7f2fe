import { pageMs } from '../kernel/units.ts';
import type { PageClock } from '../recorder/ports.ts';

/** The clock that also stamps events. */
export const pageClock: PageClock = { now: () => pageMs(performance.now()) };
