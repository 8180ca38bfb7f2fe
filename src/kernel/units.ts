/** Unit types: a signature says which clock it means. They are converted in `recorder/clock.ts` only. */

declare const unit: unique symbol;

/** Integer milliseconds of the session's own time: 0 when the schedule begins; it stops while paused. */
export type SessionMs = number & { readonly [unit]: 'SessionMs' };

/** Seconds of an audio context's clock, on which cues lie. */
export type AudioSeconds = number & { readonly [unit]: 'AudioSeconds' };

/** Milliseconds of the page's monotonic clock (`performance.now()`, `event.timeStamp`). */
export type PageMs = number & { readonly [unit]: 'PageMs' };

/** Milliseconds since 1970 by the device's wall clock; it measures nothing, it is written down. */
export type EpochMs = number & { readonly [unit]: 'EpochMs' };

/** ISO 8601 date and time with milliseconds and offset, for example `2026-11-03T10:42:07.123+01:00`. */
export type WallTime = string & { readonly [unit]: 'WallTime' };

export const sessionMs = (value: number): SessionMs => Math.round(value) as SessionMs;
export const audioSeconds = (value: number): AudioSeconds => value as AudioSeconds;
export const pageMs = (value: number): PageMs => value as PageMs;
export const epochMs = (value: number): EpochMs => value as EpochMs;
