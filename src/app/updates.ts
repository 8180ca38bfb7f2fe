/** A new version waits until it is asked for; `subscribe` tells when one does. */
export interface Updates {
  waiting(): boolean;
  subscribe(listener: () => void): () => void;
  /** Puts the waiting version in and opens the app anew. Never call while a session is recorded. */
  putIn(): void;
}

/** Registers the service worker, which keeps the whole program on the tablet. The development server has none. */
export function watchForUpdates(
  workers = import.meta.env.PROD ? navigator.serviceWorker : undefined,
): Updates {
  let waiting: ServiceWorker | null = null;
  const listeners = new Set<() => void>();
  const wait = (worker: ServiceWorker | null): void => {
    // The very first version waits for nobody: there is none before it.
    if (worker?.state !== 'installed' || workers?.controller === null) return;
    waiting = worker;
    for (const listener of listeners) listener();
  };
  const register = async (all: ServiceWorkerContainer): Promise<void> => {
    const registration = await all.register('./sw.js');
    wait(registration.waiting);
    registration.addEventListener('updatefound', () => {
      const coming = registration.installing;
      coming?.addEventListener('statechange', () => wait(coming));
    });
  };
  // Without it (no HTTPS, no network at the first start) the app runs as well, from the network.
  if (workers !== undefined) void register(workers).catch(() => undefined);
  return {
    waiting: () => waiting !== null,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    putIn: () => {
      workers?.addEventListener('controllerchange', () => window.location.reload(), { once: true });
      waiting?.postMessage({ type: 'SKIP_WAITING' });
    },
  };
}
