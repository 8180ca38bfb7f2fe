import type { Id } from '../kernel/ids.ts';
import type { Method } from '../model/protocol.ts';
import type { ScheduledInterval } from './layOut.ts';

/** When one child (null = everybody) is watched in one part. Times are milliseconds from the beginning of the part. */
export interface Seen {
  readonly child: Id | null;
  readonly part: number;
  /** From when to when each look takes, in order; the moment of a momentary look or a count is both. */
  readonly looks: readonly (readonly [from: number, to: number])[];
  /** Beginning of the first and of the last look; null without any. */
  readonly firstMs: number | null;
  readonly lastMs: number | null;
  /** The longest time from one look to the next; null with fewer than two. */
  readonly longestMs: number | null;
  /** Time watched in all; null where looks are moments. */
  readonly watchedMs: number | null;
}

/**
 * When each child is watched, part by part: the laid-out schedule read child by child, in the order of `children`.
 * Children without a look are there, too.
 * @param children the children of the schedule in order; of a headcount nothing but null is read
 */
export function whenSeen(
  intervals: readonly ScheduledInterval[],
  method: Method,
  children: readonly Id[],
  parts: number,
): Seen[] {
  const moments = method === 'momentary' || method === 'headcount';
  const looksOf = new Map<string, [number, number][]>();
  for (const { child, part, cueMs, recordMs, endMs } of intervals) {
    const key = `${part} ${child ?? ''}`;
    const look: [number, number] = [cueMs, moments ? cueMs : (recordMs ?? endMs)];
    const looks = looksOf.get(key);
    if (looks === undefined) looksOf.set(key, [look]);
    else looks.push(look);
  }
  const rows: readonly (Id | null)[] = method === 'headcount' ? [null] : children;
  return rows.flatMap((child) =>
    Array.from({ length: parts }, (_, part) =>
      seen(child, part, looksOf.get(`${part} ${child ?? ''}`) ?? [], moments),
    ),
  );
}

function seen(child: Id | null, part: number, looks: readonly [number, number][], moments: boolean): Seen {
  let longest: number | null = null;
  let watched = 0;
  looks.forEach(([from, to], k) => {
    watched += to - from;
    const next = looks[k + 1];
    if (next !== undefined) longest = Math.max(longest ?? 0, next[0] - from);
  });
  return {
    child,
    part,
    looks,
    firstMs: looks[0]?.[0] ?? null,
    lastMs: looks.at(-1)?.[0] ?? null,
    longestMs: longest,
    watchedMs: moments ? null : watched,
  };
}
