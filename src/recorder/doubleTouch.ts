import type { PageMs } from '../kernel/units.ts';

/**
 * The same target again within this time is the same finger (a double tap; systems count two taps up to 300 ms apart
 * as one gesture), and it must not spill over a cue into the next interval.
 */
export const sameTargetMs = 300;

/**
 * Another target within this time is the same palm: contacts of one hand land within a few tens of milliseconds,
 * and no thumb travels across a tablet that fast. From memory of touch hardware, no source.
 */
export const otherTargetMs = 80;

export interface TouchDown {
  readonly at: PageMs;
  readonly target: string;
}

/** True when a touch is an echo of the touch that was taken last: only the first one makes a mark. */
export function isEcho(last: TouchDown | null, next: TouchDown): boolean {
  if (last === null) return false;
  const apart = Math.abs(next.at - last.at);
  return apart < (next.target === last.target ? sameTargetMs : otherTargetMs);
}
