import type { DiskPort } from '../recorder/ports.ts';

/** Room for what is stored, and whether the browser promised to keep it. */
export const disk: DiskPort = {
  free: async () => {
    try {
      const { quota, usage } = await navigator.storage.estimate();
      return quota === undefined ? null : quota - (usage ?? 0);
    } catch {
      return null;
    }
  },
  kept: async () => {
    try {
      return await navigator.storage.persisted();
    } catch {
      return null;
    }
  },
  askToKeep: async () => {
    try {
      return await navigator.storage.persist();
    } catch {
      return null;
    }
  },
};
