import type { LockPort, Stop } from '../recorder/ports.ts';

const name = 'lookbell-recording';
let mine = false;

/** Where there are no locks (no HTTPS) nobody can be kept out, and recording goes on. */
export const recordingLock: LockPort = {
  take: () =>
    new Promise<Stop | null>((resolve) => {
      const locks = navigator.locks;
      if (locks === undefined) return resolve(() => undefined);
      locks
        .request(name, { ifAvailable: true }, (lock) => {
          if (lock === null) return resolve(null);
          mine = true;
          // The lock is held until this promise resolves, or until the tab is gone.
          return new Promise<void>((letGo) =>
            resolve(() => {
              mine = false;
              letGo();
            }),
          );
        })
        .catch(() => resolve(() => undefined));
    }),
  heldElsewhere: async () => {
    if (mine) return false;
    const { held } = (await navigator.locks?.query()) ?? {};
    return held?.some((lock) => lock.name === name) ?? false;
  },
};
