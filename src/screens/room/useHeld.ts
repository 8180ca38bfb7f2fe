import { useCallback } from 'react';
import type { IntervalRecord } from '../../journal/readOut.ts';
import type { Correction } from '../../recorder/liveSession.ts';
import { useCoreWords } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';

type Held = Pick<IntervalRecord, 'status' | 'codes' | 'counts' | 'missing'>;

/** What an interval would hold after a correction. */
export function heldAfter(to: Correction): Held {
  const nothing = { codes: null, counts: null, missing: null };
  if ('missing' in to) return { ...nothing, status: 'missing', missing: to.missing };
  if ('counts' in to) return { ...nothing, status: 'scored', codes: [], counts: to.counts };
  return { ...nothing, status: 'scored', codes: to.codes };
}

/** What an interval holds, in words. */
export function useHeld(): (held: Held) => string {
  const words = useCoreWords();
  const { codes } = useFacts();
  return useCallback(
    (held) => {
      const { room, missing, f } = words;
      if (held.missing !== null) return room.heldMissing({ reason: missing[held.missing] });
      if (held.status !== 'scored') return room.heldNothing;
      if (held.counts !== null) return room.countSaid(held.counts);
      const labels = (held.codes ?? []).map((code) => codes.get(code)?.code.label ?? code);
      return labels.length === 0 ? room.noneOfThese : f.list(labels);
    },
    [words, codes],
  );
}
