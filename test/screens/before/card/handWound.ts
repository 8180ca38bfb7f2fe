import { act } from '@testing-library/react';

/** A timer that a test winds by hand, by one wish at a time. */
export function handWound() {
  const wishes: { readonly ms: number; readonly wake: () => void }[] = [];
  return {
    wakeIn: (ms: number, wake: () => void) => {
      const wish = { ms, wake };
      wishes.push(wish);
      return () => {
        const at = wishes.indexOf(wish);
        if (at >= 0) wishes.splice(at, 1);
      };
    },
    waiting: () => wishes.map(({ ms }) => ms),
    /** Wakes the one that has waited longest, and lets the screen answer. */
    next: async () => {
      const wish = wishes.shift();
      if (wish === undefined) throw new Error('nobody waits');
      await act(async () => wish.wake());
    },
  };
}
