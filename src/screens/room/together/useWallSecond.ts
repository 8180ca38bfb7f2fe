import { useEffect, useState } from 'react';
import { shiftedWall } from '../../../kernel/wallTime.ts';
import { useCoreServices } from '../../coreServices.ts';

/** This tablet's wall time as the nudge says that it is to be read, anew with each of its seconds. */
export function useWallSecond(nudgeMs: number): string {
  const { device } = useCoreServices();
  const [, setCount] = useState(0);
  const wall = shiftedWall(device.now().wall, nudgeMs);
  useEffect(() => {
    let stop: () => void = () => undefined;
    const again = (): void => {
      const into = Number(shiftedWall(device.now().wall, nudgeMs).slice(20, 23));
      stop = device.wakeIn(1000 - into, () => {
        setCount((count) => count + 1);
        again();
      });
    };
    again();
    return () => stop();
  }, [device, nudgeMs]);
  return wall;
}
