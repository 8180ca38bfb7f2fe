import type { IntervalRecord } from '../../journal/readOut.ts';
import type { Method } from '../../model/protocol.ts';
import type { Plan } from '../../recorder/grid.ts';

/** What a session consists of, in the words of the room. */
export type Unit = 'look' | 'scan' | 'time';

export function unitOf(method: Method): Unit {
  return method === 'headcount' ? 'scan' : method === 'duration' ? 'time' : 'look';
}

/** How much of a session: `n` looks or scans; `ms` where it is time. */
export interface Amount {
  readonly unit: Unit;
  readonly n: number;
  readonly ms: number;
}

/** What is missing of it. In a duration record time in which nothing is in force is missing, too. */
export function missingOf(intervals: readonly IntervalRecord[], unit: Unit): Amount {
  const gone = intervals.filter(
    ({ status }) => status === 'missing' || (unit === 'time' && status === 'open'),
  );
  const ms = gone.reduce((sum, { openAt, closeAt }) => sum + (closeAt - openAt || 0), 0);
  return { unit, n: gone.length, ms };
}

/** What is still to come: looks whose cue has not come; time until the parts are over. */
export function aheadOf(
  {
    intervals,
    msLeft,
    state,
  }: {
    readonly intervals: readonly IntervalRecord[];
    readonly msLeft: number | null;
    readonly state: { readonly origins: readonly (number | null)[] };
  },
  plan: Plan,
  unit: Unit,
): Amount {
  const waiting = plan.parts.filter((_, part) => (state.origins[part] ?? null) === null);
  return {
    unit,
    n: intervals.filter(({ status }) => status === 'waiting').length,
    ms: waiting.reduce((sum, { duration }) => sum + duration, Math.max(0, msLeft ?? 0)),
  };
}

/** Milliseconds that each part is planned to last, without the time in which its last look may still be marked. */
export function partLengths(plan: Plan): number[] {
  return plan.parts.map((_, part) =>
    plan.intervals.reduce((end, line) => (line.part === part ? Math.max(end, line.endMs) : end), 0),
  );
}
