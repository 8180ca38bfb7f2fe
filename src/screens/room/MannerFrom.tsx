import { type ReactNode, useCallback, useEffect, useMemo, useRef, useState } from 'react';
import type { Result } from '../../kernel/result.ts';
import { usualManner } from '../../model/manners.ts';
import type { Manner } from '../../model/observer.ts';
import { useCoreServices } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';
import { MannerContext } from './useManner.ts';
import { useLive } from './useRoom.ts';

/** Reads the observer's manner, tells the running session of it, and keeps what is changed in the room. */
export function MannerFrom({ children }: { readonly children: ReactNode }) {
  const { deps } = useCoreServices();
  const live = useLive();
  const { header, observersManner } = useFacts();
  const [changed, setChanged] = useState<Manner | null>(null);
  const manner = changed ?? observersManner ?? usualManner;
  useEffect(() => {
    live.behave({ confirm: manner.confirm, remind: manner.remind });
  }, [live, manner.confirm, manner.remind]);
  const observer = header.observer.id;
  const [kept, setKept] = useState<Result<unknown> | null>(null);
  const keeping = useRef(Promise.resolve());
  const change = useCallback(
    (next: Manner) => {
      setChanged(next);
      // Rare, and so not part of what has to be loaded before a lesson can be recorded.
      const keep = async (): Promise<void> => {
        const { saveObserver } = await import('../../tasks/observers.ts');
        setKept(await saveObserver(deps, observer, { manner: next }));
      };
      // One after the other: each is an edit of what the one before has kept.
      keeping.current = keeping.current.then(keep, keep);
    },
    [deps, observer],
  );
  const value = useMemo(() => ({ manner, change, kept, seen: () => setKept(null) }), [manner, change, kept]);
  return <MannerContext value={value}>{children}</MannerContext>;
}
