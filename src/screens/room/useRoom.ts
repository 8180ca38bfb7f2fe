import { createContext, useCallback, useContext, useRef, useSyncExternalStore } from 'react';
import type { LiveSession } from '../../recorder/liveSession.ts';
import type { RoomSnapshot } from '../../recorder/roomSnapshot.ts';
import { same } from './same.ts';

export const LiveContext = createContext<LiveSession | null>(null);

/** The session that is being recorded; a part of the room outside it is a bug. */
export function useLive(): LiveSession {
  const live = useContext(LiveContext);
  if (live === null) throw new Error('A part of the room was rendered outside a session.');
  return live;
}

/** A slice of what the room shows. The part renders again only when its own slice has changed. */
export function useRoom<Slice>(select: (snapshot: RoomSnapshot) => Slice): Slice {
  const live = useLive();
  const last = useRef<{ readonly slice: Slice } | null>(null);
  const subscribe = useCallback((listener: () => void) => live.subscribe(listener), [live]);
  return useSyncExternalStore(subscribe, () => {
    const slice = select(live.snapshot());
    if (last.current !== null && same(last.current.slice, slice)) return last.current.slice;
    last.current = { slice };
    return slice;
  });
}
