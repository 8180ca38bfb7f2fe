import { registerSW } from 'virtual:pwa-register';

/** A new version waits until it is asked for; `subscribe` tells when one does. */
export interface Updates {
  waiting(): boolean;
  subscribe(listener: () => void): () => void;
  /** Puts the waiting version in and opens the app anew. Never call while a session is recorded. */
  putIn(): void;
}

/** Registers the service worker, which keeps the whole program on the tablet. */
export function watchForUpdates(): Updates {
  let waiting = false;
  const listeners = new Set<() => void>();
  const update = registerSW({
    onNeedRefresh() {
      waiting = true;
      for (const listener of listeners) listener();
    },
  });
  return {
    waiting: () => waiting,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    putIn: () => void update(true),
  };
}
