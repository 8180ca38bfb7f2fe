import type { EpochMs, PageMs } from '../kernel/units.ts';

/** Both clocks at one moment. */
export interface WallReading {
  readonly page: PageMs;
  readonly wall: EpochMs;
}

/** Less than this is read as the wall clock being trimmed. */
export const wallJumpMs = 1000;

export type WallJump =
  | { readonly kind: 'none' }
  /** The device slept and its page clock with it; session time has to step on by `ms`. */
  | { readonly kind: 'slept'; readonly ms: number }
  /** Somebody moved the wall clock; nothing shifts. */
  | { readonly kind: 'moved'; readonly ms: number };

/**
 * Compares what the wall clock and the page clock did between two wake-ups. Forward while the page was hidden it was
 * sleep, which stops the page clock on most systems; backward, or in full view, somebody moved the wall clock.
 */
export function wallJump(before: WallReading, now: WallReading, wasHidden: boolean): WallJump {
  const ms = now.wall - before.wall - (now.page - before.page);
  if (Math.abs(ms) < wallJumpMs) return { kind: 'none' };
  return ms > 0 && wasHidden ? { kind: 'slept', ms } : { kind: 'moved', ms };
}
