import type { Timer } from '../recorder/ports.ts';

export const timer: Timer = {
  wakeIn: (ms, wake) => {
    const handle = setTimeout(wake, ms);
    return () => clearTimeout(handle);
  },
};
