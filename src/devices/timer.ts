import type { Timer } from '../recorder/ports.ts';

/** The browser's timer: a wake-up that may come late, and in a hidden page very late. */
export const timer: Timer = {
  wakeIn: (ms, wake) => {
    const handle = setTimeout(wake, ms);
    return () => clearTimeout(handle);
  },
};
