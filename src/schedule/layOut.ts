import type { Id } from '../kernel/ids.ts';
import type { PartLength, Protocol } from '../model/protocol.ts';

/**
 * One line of the schedule. Times are milliseconds from the beginning of its part: a part begins at session
 * time 0 or, after a break, when the observer says so.
 */
export interface ScheduledInterval {
  /** 1, 2, 3 … through the whole session, all children and parts together. */
  readonly number: number;
  /** 0-based part; each part belongs to one phase. */
  readonly part: number;
  readonly phase: string;
  /** 1-based pass through all target children, counted within its part. */
  readonly round: number;
  readonly child: Id;
  readonly openMs: number;
  /** The look (momentary) or "observe" (partial, whole) cue: from here on a touch belongs to this interval. */
  readonly cueMs: number;
  /** The "record" cue, when behaviour stops counting; null without a record part. */
  readonly recordMs: number | null;
  /** Until here a touch belongs to this interval: the next cue, or one interval length after the last one. */
  readonly closeMs: number;
}

/** How many intervals one part has. */
export function intervalsInPart(
  length: PartLength,
  protocol: Pick<Protocol, 'intervalMs' | 'rotation'>,
  children: number,
): number {
  if (length.kind === 'minutes') return Math.floor((length.minutes * 60_000) / protocol.intervalMs + 1e-9);
  const { rotation } = protocol;
  if (rotation.kind === 'one') return length.rounds;
  return length.rounds * children * (rotation.kind === 'block' ? rotation.intervals : 1);
}

/**
 * The intervals of a session, from its protocol, its phases and its children in order.
 * They tile each part without gap or overlap; every part begins anew with the first child.
 * No children give no intervals.
 */
export function layOut(
  protocol: Protocol,
  phases: readonly string[],
  children: readonly Id[],
): ScheduledInterval[] {
  if (children.length === 0) return [];
  const { intervalMs: length, rotation } = protocol;
  const momentary = protocol.method === 'momentary';
  const cueOffset = momentary && protocol.lookAt === 'end' ? length : 0;
  const inRow = rotation.kind === 'block' ? rotation.intervals : 1;
  const watched = rotation.kind === 'one' ? 1 : children.length;
  const perPart = intervalsInPart(protocol.partLength, protocol, children.length);
  return phases.flatMap((phase, part) =>
    Array.from({ length: perPart }, (_, k): ScheduledInterval => {
      const openMs = k * length;
      const cueMs = openMs + cueOffset;
      return {
        number: part * perPart + k + 1,
        part,
        phase,
        round: Math.floor(k / (inRow * watched)) + 1,
        child: children[Math.floor(k / inRow) % watched] as Id,
        openMs,
        cueMs,
        recordMs: !momentary && protocol.observeMs < length ? openMs + protocol.observeMs : null,
        closeMs: cueMs + length,
      };
    }),
  );
}

/** Milliseconds from the beginning of a part until its last interval closes. */
export function partDuration(intervals: readonly ScheduledInterval[], part: number): number {
  return intervals.reduce(
    (latest, interval) => (interval.part === part ? Math.max(latest, interval.closeMs) : latest),
    0,
  );
}
