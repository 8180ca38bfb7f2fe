import type { VisibilityPort } from '../recorder/ports.ts';

/** `resume` comes when a frozen page is let run again; its visibility may not have changed. */
const events = ['visibilitychange', 'resume', 'freeze'] as const;

export const visibility: VisibilityPort = {
  hidden: () => document.visibilityState === 'hidden',
  subscribe: (listener) => {
    for (const event of events) document.addEventListener(event, listener);
    return () => {
      for (const event of events) document.removeEventListener(event, listener);
    };
  },
};
