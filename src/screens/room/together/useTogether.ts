import { useState } from 'react';
import type { EpochMs } from '../../../kernel/units.ts';
import { epochOf } from '../../../kernel/wallTime.ts';
import type { Beginning } from '../../../recorder/liveSession.ts';
import { likelySecond, tooNearMs } from './agreedSecond.ts';
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
  /** The tick check was done and kept. */
  readonly checked: boolean;
  readonly checking: boolean;
  readonly openCheck: () => void;
  readonly keep: (nudgeMs: number) => void;
  readonly leave: () => void;
  /** What the session is told when it begins. */
  readonly how: Beginning;
}

/** What two observers settle before they begin. By the count until their clocks have been brought together. */
export function useTogether(plannedStart: string | null): Together {
  const [chosen, choose] = useState<StartsBy | null>(null);
  const [agreed, agree] = useState<EpochMs | null>(null);
  const [nudge, setNudge] = useState<number | null>(null);
  const [checking, setChecking] = useState(false);
  const nudgeMs = nudge ?? 0;
  const now = useWallSecond(nudgeMs);
  // What is merely offered moves on before it is too near; what somebody agreed on stays.
  const [offered, offer] = useState(() => likelySecond(now, plannedStart));
  const stale = agreed === null && offered - epochOf(now) < tooNearMs;
  if (stale) offer(likelySecond(now, plannedStart));
  const by = chosen ?? (nudge === null ? 'count' : 'second');
  const at = agreed ?? offered;
  return {
    by,
    choose,
    now,
    at,
    agree,
    nudgeMs,
    checked: nudge !== null,
    checking,
    openCheck: () => setChecking(true),
    keep: (ms) => {
      setNudge(ms);
      setChecking(false);
    },
    leave: () => setChecking(false),
    how: { ...(by === 'second' ? { at } : {}), ...(nudge === null ? {} : { nudgeMs: nudge }) },
  };
}
