import type { Method } from '../model/protocol.ts';
import { wilsonInterval } from '../stats/index.ts';
import type { Look } from './sessionRecord.ts';
import { settle, type Why, type WhyCode } from './why.ts';

/**
 * What looks add up to. Units by method: intervals (momentary, partial, whole); child looks, that is children counted
 * (headcount; `missing` counts scans); seconds (duration).
 */
export interface Tally {
  /** Scored, whatever the code. */
  readonly scored: number;
  readonly missing: number;
  readonly onTask: number;
  /** What percent on-task is a share of. */
  readonly base: number;
}

export const noLooks: Tally = { scored: 0, missing: 0, onTask: 0, base: 0 };

export function addTallies(a: Tally, b: Tally): Tally {
  return {
    scored: a.scored + b.scored,
    missing: a.missing + b.missing,
    onTask: a.onTask + b.onTask,
    base: a.base + b.base,
  };
}

/**
 * Adds looks up. Momentary and duration: codes that count neither as on-task nor as off-task are scored, and percent
 * on-task is a share of the others (on / (on + off)). Partial and whole interval: a share of all scored intervals,
 * on-task being those with some on-task code. Stretches without times make a duration tally NaN.
 */
export function tallyOf(looks: readonly Look[], method: Method): Tally {
  let total = noLooks;
  for (const look of looks) total = addTallies(total, tallyOfLook(look, method));
  return total;
}

function tallyOfLook(look: Look, method: Method): Tally {
  const size = method === 'duration' ? (look.closeAt - look.openAt) / 1000 : 1;
  if (look.status !== 'scored') return { ...noLooks, missing: size };
  if (look.counts !== null) {
    const { on, present } = look.counts;
    return { scored: present, missing: 0, onTask: on, base: present };
  }
  const sets = method === 'partial' || method === 'whole';
  return {
    scored: size,
    missing: 0,
    onTask: look.as === 'on' ? size : 0,
    base: sets || look.as !== 'other' ? size : 0,
  };
}

/** 0–100; NaN where nothing counts. */
export function percentOf({ onTask, base }: Tally): number {
  return base === 0 ? Number.NaN : (100 * onTask) / base;
}

/** A share as reports give it: percentages 0–100 with Wilson's 95 % limits, which treat looks as independent. */
export interface Share {
  readonly scored: number | null;
  readonly missing: number | null;
  readonly onTask: number | null;
  readonly percentOnTask: number | null;
  readonly lower: number | null;
  readonly upper: number | null;
  readonly why: Why<'scored' | 'missing' | 'onTask' | 'percentOnTask' | 'lower' | 'upper'>;
}

export function shareOf(tally: Tally, method: Method): Share {
  const { scored, missing, onTask, base } = tally;
  const limits =
    method === 'duration' ? { lower: Number.NaN, upper: Number.NaN } : wilsonInterval(onTask, base);
  const { figures, why } = settle(
    {
      scored,
      missing,
      onTask,
      percentOnTask: percentOf(tally),
      lower: 100 * limits.lower,
      upper: 100 * limits.upper,
    },
    (field): WhyCode => {
      if (field === 'missing' || Number.isNaN(scored)) return 'timesUnknown';
      if (scored === 0) return 'nothingScored';
      return base === 0 ? 'neitherOnNorOff' : 'durationHasNoLooks';
    },
  );
  return { ...figures, why };
}
