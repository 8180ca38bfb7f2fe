import { useMemo } from 'react';
import { useRoom } from './useRoom.ts';

/** Who stands in for whom at present: the child who is away, and the reserve in its place. */
export function useStandIns(): ReadonlyMap<string, string> {
  const standIns = useRoom((s) => s.state.standIns);
  return useMemo(
    () => new Map(standIns.flatMap(({ child, by, to }) => (to === null ? [[child, by] as const] : []))),
    [standIns],
  );
}
