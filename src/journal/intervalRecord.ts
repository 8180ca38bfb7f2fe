import type { MissingReason } from '../model/missing.ts';

/**
 * One interval as it came out. `status`: `waiting` (its cue has not come), `open` (its cue came, it may still be
 * marked), `scored` or `missing`. Times are session milliseconds, NaN where unknown (tables without times, a part
 * that has not begun).
 */
export interface IntervalRecord {
  readonly number: number;
  readonly part: number;
  readonly phase: string | null;
  readonly round: number | null;
  readonly child: string | null;
  readonly openAt: number;
  readonly cueAt: number;
  readonly closeAt: number;
  readonly lessonPart: string | null;
  readonly minutesFromBreak: number | null;
  readonly status: 'waiting' | 'open' | 'scored' | 'missing';
  /** The codes scored, in order of marking; empty = observed, none occurred; null unless scored. */
  readonly codes: readonly string[] | null;
  readonly counts: { readonly on: number; readonly present: number } | null;
  readonly missing: MissingReason | null;
  /** Marked within the grace after the next cue. */
  readonly late: boolean;
  /** Changed in the room after the fact: corrected, swapped with another's, or said to be of no use. */
  readonly corrected: boolean;
  /** Changed after the session. */
  readonly amended: boolean;
  readonly settled: readonly string[] | null;
  /** Session time of the touch that decided; NaN for none, and where a correction did. */
  readonly touchedAt: number;
  /** Session time at which the cue was delivered; NaN when not known. */
  readonly cuedAt: number;
}
