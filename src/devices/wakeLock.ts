import type { WakeLockPort, WakeLockState } from '../recorder/ports.ts';

/**
 * Keeps the screen on. The browser drops the lock whenever the page is hidden and may refuse it (battery saving), so
 * the wish is kept apart from the lock, and the lock asked for again when the page is seen.
 */
export function wakeLock(): WakeLockPort {
  const listeners = new Set<() => void>();
  let wanted = false;
  let lock: WakeLockSentinel | null = null;
  let state: WakeLockState = 'idle';
  const become = (next: WakeLockState): void => {
    if (next === state) return;
    state = next;
    for (const listener of listeners) listener();
  };
  const ask = async (): Promise<void> => {
    if (!wanted || lock !== null || document.visibilityState !== 'visible') return;
    if (!('wakeLock' in navigator)) return become('missing');
    try {
      const held = await navigator.wakeLock.request('screen');
      if (!wanted) return void held.release();
      lock = held;
      held.addEventListener('release', () => {
        if (lock === held) lock = null;
        if (wanted) become('refused');
        void ask();
      });
      become('held');
    } catch {
      become('refused');
    }
  };
  const seen = (): void => void ask();
  return {
    hold: () => {
      if (wanted) return;
      wanted = true;
      document.addEventListener('visibilitychange', seen);
      void ask();
    },
    letGo: () => {
      wanted = false;
      document.removeEventListener('visibilitychange', seen);
      void lock?.release();
      lock = null;
      become('idle');
    },
    state: () => state,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}
