import type { WakeLockPort, WakeLockState } from '../recorder/ports.ts';

/** A wake lock of its own: the wish outlives the lock, which is lost at each hiding of the page. */
export function wakeLock(): WakeLockPort {
  const listeners = new Set<() => void>();
  let wanted = false;
  let asking = false;
  let lock: WakeLockSentinel | null = null;
  let state: WakeLockState = 'idle';

  const say = (next: WakeLockState): void => {
    if (state === next) return;
    state = next;
    for (const listener of listeners) listener();
  };

  const ask = async (): Promise<void> => {
    if (!wanted || lock !== null || asking) return;
    if (!('wakeLock' in navigator)) return say('missing');
    asking = true;
    try {
      const given = await navigator.wakeLock.request('screen');
      if (!wanted) {
        await given.release();
        return;
      }
      lock = given;
      given.addEventListener('release', () => {
        if (lock !== given) return;
        lock = null;
        if (!wanted) return;
        say('refused');
        // Taken away in full view (battery saver): one more try is all that a page can do.
        if (document.visibilityState === 'visible') void ask();
      });
      say('held');
    } catch {
      if (wanted) say('refused');
    } finally {
      asking = false;
    }
  };

  const seenAgain = (): void => {
    if (document.visibilityState === 'visible') void ask();
  };

  return {
    hold: () => {
      if (wanted) return;
      wanted = true;
      document.addEventListener('visibilitychange', seenAgain);
      void ask();
    },
    letGo: () => {
      wanted = false;
      document.removeEventListener('visibilitychange', seenAgain);
      const given = lock;
      lock = null;
      void given?.release().catch(() => undefined);
      say('idle');
    },
    state: () => state,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}
