import { type RefObject, useState } from 'react';
import type { EpochMs } from '../../../kernel/units.ts';
import { epochOf } from '../../../kernel/wallTime.ts';
import type { SessionHeader } from '../../../model/session.ts';
import type { Beginning } from '../../../recorder/liveSession.ts';
import { likelySecond, tooNearMs } from './agreedSecond.ts';
import { useTickChecked } from './useTickChecked.ts';
import { useWallSecond } from './useWallSecond.ts';

export type StartsBy = 'count' | 'second';

export interface Together {
  readonly by: StartsBy;
  readonly choose: (by: StartsBy) => void;
  /** This tablet's wall time, as nudged. */
  readonly now: string;
  /** The second that is agreed on, or offered. */
  readonly at: EpochMs;
  readonly agree: (at: EpochMs) => void;
  readonly nudgeMs: number;
  /** How long ago (ms) the tick check was done and kept; null where it was not. */
  readonly checkedAgo: number | null;
  readonly checking: boolean;
  readonly openCheck: () => void;
  readonly keep: (nudgeMs: number) => void;
  readonly leave: () => void;
  /** What the session is told when it begins. */
  readonly how: Beginning;
}

/**
 * What two observers settle before they begin. By the count until their clocks have been brought together.
 * @param chosenBefore how they wanted to begin; it outlives a start that is called off
 */
export function useTogether(
  { visit, plannedStart }: SessionHeader,
  chosenBefore: RefObject<StartsBy | null>,
): Together {
  const [chosen, choose] = useState(chosenBefore.current);
  const [agreed, agree] = useState<EpochMs | null>(null);
  const [checking, setChecking] = useState(false);
  const { checked, keep } = useTickChecked(visit);
  const nudgeMs = checked?.nudgeMs ?? 0;
  const now = useWallSecond(nudgeMs);
  // What is merely offered moves on before it is too near; what somebody agreed on stays.
  const [offered, offer] = useState(() => likelySecond(now, plannedStart));
  const stale = agreed === null && offered - epochOf(now) < tooNearMs;
  if (stale) offer(likelySecond(now, plannedStart));
  const by = chosen ?? (checked === null ? 'count' : 'second');
  const at = agreed ?? offered;
  return {
    by,
    choose: (wanted) => {
      chosenBefore.current = wanted;
      choose(wanted);
    },
    now,
    at,
    agree,
    nudgeMs,
    checkedAgo: checked?.agoMs ?? null,
    checking,
    openCheck: () => setChecking(true),
    keep: (ms) => {
      keep(ms);
      setChecking(false);
    },
    leave: () => setChecking(false),
    how: { ...(by === 'second' ? { at } : {}), ...(checked === null ? {} : { nudgeMs }) },
  };
}
