import type { DiskPort } from '../recorder/ports.ts';

/** What cannot be asked (no HTTPS, an old browser, a refusal by exception) is not known: null. */
async function known<T>(question: () => Promise<T> | undefined): Promise<T | null> {
  try {
    return (await question()) ?? null;
  } catch {
    return null;
  }
}

export const disk: DiskPort = {
  free: () =>
    known(async () => {
      const { quota, usage } = (await navigator.storage?.estimate?.()) ?? {};
      return quota === undefined ? null : Math.max(0, quota - (usage ?? 0));
    }),
  kept: () => known(() => navigator.storage?.persisted?.()),
  askToKeep: () => known(() => navigator.storage?.persist?.()),
};
