import { useCallback, useEffect, useState } from 'react';
import { useServices } from '../services.ts';

/** What the tablet tells about itself; undefined while it is being asked. */
export interface TabletFacts {
  readonly awake: 'held' | 'refused' | 'missing';
  readonly room: { readonly free: number | null; readonly kept: boolean | null };
  readonly battery: { readonly level: number; readonly charging: boolean } | null;
  readonly otherTab: boolean;
  readonly offline: boolean;
}

/** Asks the tablet, once on arrival and again on request. */
export function useTabletFacts(): { readonly facts: TabletFacts | undefined; readonly again: () => void } {
  const { device } = useServices();
  const [facts, setFacts] = useState<TabletFacts>();
  const [asked, setAsked] = useState(0);
  // biome-ignore lint/correctness/useExhaustiveDependencies: `asked` asks again
  useEffect(() => {
    let here = true;
    const ask = async () => {
      const [awake, room, battery, otherTab, offline] = await Promise.all([
        device.wakeLock(),
        device.room(),
        device.battery(),
        device.otherTabRecords(),
        device.readyOffline(),
      ]);
      if (here) setFacts({ awake, room, battery, otherTab, offline });
    };
    void ask();
    return () => {
      here = false;
    };
  }, [device, asked]);
  return { facts, again: useCallback(() => setAsked((n) => n + 1), []) };
}

/** Room that one lesson of two times sixty looks takes, journal and all (measured: about 60 kB), with a margin. */
export const bytesPerLesson = 120_000;

/** Below this much room a lesson could fail to be kept. */
export const leastRoom = 20_000_000;

/** Below this charge a tablet may not live through two lessons (common practice, no source). */
export const leastCharge = 0.3;
