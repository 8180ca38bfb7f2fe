import { useFacts } from './RoomFacts.tsx';
import { useRoom } from './useRoom.ts';

/** Where the current look stands in its sweep, or null in other rotations. */
export function useSweep(): { readonly place: number; readonly of: number } | null {
  const { sweep, plan } = useFacts();
  const number = useRoom((s) => s.current?.number ?? null);
  const line = number === null ? undefined : plan.intervals[number - 1];
  if (sweep === null || line === undefined) return null;
  const own = plan.intervals.filter(({ part, round }) => part === line.part && round === line.round);
  return { place: own.findIndex((one) => one.number === line.number) + 1, of: own.length };
}

/** True between two sweeps: every child had its time, and the last one is marked or its time is over, too. */
export function useSweepRest(): boolean {
  const { sweep } = useFacts();
  const place = useSweep();
  const over = useRoom(({ current, now, armedBefore }) => {
    if (sweep === null || current === null || armedBefore !== null) return false;
    return current.status !== 'open' || now >= current.cueAt + sweep.eachMs;
  });
  return place !== null && place.place === place.of && over;
}
