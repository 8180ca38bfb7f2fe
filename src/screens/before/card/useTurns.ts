import { useEffect, useState } from 'react';
import { useServices } from '../../services.ts';

/** How long each picture stands: a camera needs a moment to find its focus and a square. */
export const standsMs = 1500;

/** Which of several pictures is shown: in turn, until somebody takes it by hand. */
export function useTurns(count: number) {
  const { device } = useServices();
  const [at, setAt] = useState(0);
  const [turning, setTurning] = useState(true);
  // biome-ignore lint/correctness/useExhaustiveDependencies: each picture is given its own time
  useEffect(() => {
    if (!turning || count < 2) return;
    return device.wakeIn(standsMs, () => setAt((now) => (now + 1) % count));
  }, [device, turning, count, at]);
  const step = (by: number): void => {
    setTurning(false);
    setAt((now) => (now + by + count) % count);
  };
  return { at, turning, setTurning, step };
}
