import type { StoreNotice } from '../tasks/ports.ts';

/** What happened to the store from outside, latest last word; screens follow it. */
export interface StoreNotices {
  tell(notice: StoreNotice): void;
  latest(): StoreNotice | null;
  subscribe(listener: () => void): () => void;
}

export function storeNotices(): StoreNotices {
  let latest: StoreNotice | null = null;
  const listeners = new Set<() => void>();
  return {
    tell: (notice) => {
      // Closing follows from making way for a newer version: the reason is what people need to read.
      if (notice === 'closed' && latest === 'newerVersionWaits') return;
      latest = notice;
      for (const listener of listeners) listener();
    },
    latest: () => latest,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}
