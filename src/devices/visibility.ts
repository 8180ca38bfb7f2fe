import type { VisibilityPort } from '../recorder/ports.ts';

/** Whether the page is seen; `pageshow` and `resume` tell of a frozen page that comes back. */
export const visibility: VisibilityPort = {
  hidden: () => document.visibilityState === 'hidden',
  subscribe: (listener) => {
    const events: [EventTarget, string][] = [
      [document, 'visibilitychange'],
      [document, 'resume'],
      [window, 'pageshow'],
    ];
    for (const [target, name] of events) target.addEventListener(name, listener);
    return () => {
      for (const [target, name] of events) target.removeEventListener(name, listener);
    };
  },
};
