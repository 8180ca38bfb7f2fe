import { pageMs } from '../kernel/units.ts';
import type { PageClock } from '../recorder/ports.ts';

/** The page's monotonic clock. */
export const pageClock: PageClock = { now: () => pageMs(performance.now()) };
