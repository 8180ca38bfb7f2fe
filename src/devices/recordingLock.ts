import type { LockPort } from '../recorder/ports.ts';

const name = 'lookbell-recording';

/** One tab records: the browser gives the lock back by itself when the tab dies. Without the API nothing is locked. */
export const recordingLock: LockPort = {
  take: () => {
    if (!('locks' in navigator)) return Promise.resolve(() => {});
    return new Promise((resolve, reject) => {
      navigator.locks
        .request(name, { ifAvailable: true }, (lock) => {
          if (lock === null) return resolve(null);
          // The lock is held until this promise is settled.
          return new Promise<void>((giveBack) => resolve(() => giveBack()));
        })
        .catch(reject);
    });
  },
  heldElsewhere: async () => {
    if (!('locks' in navigator)) return false;
    const { held = [] } = await navigator.locks.query();
    return held.some((lock) => lock.name === name);
  },
};
