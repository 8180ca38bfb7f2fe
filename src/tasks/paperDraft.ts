import type { AwayReason } from '../journal/entry.ts';
import type { Problem } from '../kernel/result.ts';
import type { MissingReason } from '../model/missing.ts';
import type { Role } from '../model/session.ts';
import type { VisitPlan } from '../model/visitPlan.ts';

/** What a line of a sheet says: codes (none at all = none occurred), a reason, or a headcount. A line without an answer is missed. */
export type PaperAnswer =
  | { readonly codes: readonly string[] }
  | { readonly missing: MissingReason }
  | { readonly on: number; readonly present: number };

/** A line of a duration sheet: from `atMs` of its part on, this holds. */
export interface PaperOnset {
  readonly part: number;
  readonly atMs: number;
  readonly answer: Exclude<PaperAnswer, { on: number }>;
}

/** When a later part began, by the clock: `10:42` or `10:42:07`, as it stands on the sheet; empty = not written. */
export interface PaperPart {
  readonly breakStarted: string;
  readonly firstTask: string;
}

/** From line `from` on the reserve `by` was watched instead of `child`, until the child was back at line `until`; null = to the end. */
export interface PaperStandIn {
  readonly child: string;
  readonly reason: AwayReason;
  readonly by: string;
  readonly from: number;
  readonly until: number | null;
}

/** What about a sheet cannot be. */
export interface Fault {
  readonly ok: false;
  readonly problem: Problem;
}

/** A sheet that is being typed in. It is kept at every line, and becomes a session at the end. */
export interface PaperDraft {
  /** The ids that the session and its writer will have. */
  readonly session: string;
  readonly writer: string;
  readonly plan: VisitPlan;
  readonly observer: string | null;
  readonly role: Role | null;
  readonly practice: boolean;
  readonly familiarisation?: boolean;
  /** ISO date and clock time of the beginning; empty = not typed yet. */
  readonly date: string;
  readonly start: string;
  /** One for each part after the first. */
  readonly parts: readonly PaperPart[];
  /** Number of the last interval that was observed, where the observer stopped early; null = went on to the end. */
  readonly stoppedAfter: number | null;
  /** For durations: milliseconds from the beginning of the last part that began. */
  readonly stoppedAt: number | null;
  /** By interval number. */
  readonly answers: Readonly<Record<number, PaperAnswer>>;
  readonly onsets: readonly PaperOnset[];
  /** Who stepped in for whom, where the protocol has that. */
  readonly standIns?: readonly PaperStandIn[];
}
