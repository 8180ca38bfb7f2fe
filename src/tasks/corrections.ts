import { recordingFacts } from '../journal/headerFacts.ts';
import { fold } from '../journal/step.ts';
import type { StoredSession } from '../journal/stored.ts';
import { ok, type Problem, problem, type Result } from '../kernel/result.ts';
import type { MissingReason } from '../model/missing.ts';
import type { SessionHeader } from '../model/session.ts';
import type { Study } from '../model/study.ts';
import { appendAfterwards } from './appendAfterwards.ts';
import { editStudy } from './edits.ts';
import type { Deps } from './ports.ts';
import { cleaned, nameFrom } from './text.ts';

export interface Amendment {
  readonly interval: number;
  /** Code ids; empty = observed, none occurred (partial and whole interval). Null when `missing` is given. */
  readonly codes: readonly string[] | null;
  readonly missing: MissingReason | null;
  /** Headcount: what was counted; then `codes` is empty. */
  readonly counts?: { readonly on: number; readonly present: number };
  readonly why: string;
  readonly by: string;
}

export interface Settlement {
  readonly interval: number;
  readonly codes: readonly string[];
  readonly why: string;
  readonly by: string;
}

/** Corrects an interval after the session: a new entry beside the mark, with why and by whom. */
export function amendInterval(deps: Deps, session: string, wish: Amendment): Promise<Result<null>> {
  return appendAfterwards(deps, session, (stored) => {
    if ((wish.codes === null) === (wish.missing === null)) return problem('task.codesOrReason');
    const signed = signature(stored, wish.interval, wish.codes, wish);
    if (!signed.ok) return signed;
    const codes = wish.codes === null ? null : [...wish.codes];
    const { interval, missing, counts } = wish;
    const fault = countsFault(stored.header, wish);
    if (fault !== null) return fault;
    const { at, why, by } = signed.value;
    const counted = counts === undefined ? {} : { counts };
    return ok({ at, body: { kind: 'amended', interval, codes, missing, ...counted, why, by } });
  });
}

/** Keeps the code that was agreed on after review; it never replaces the mark. */
export function settleInterval(deps: Deps, session: string, wish: Settlement): Promise<Result<null>> {
  return appendAfterwards(deps, session, (stored) => {
    const signed = signature(stored, wish.interval, wish.codes, wish);
    if (!signed.ok) return signed;
    const { at, why, by } = signed.value;
    return ok({ at, body: { kind: 'settled', interval: wish.interval, codes: [...wish.codes], why, by } });
  });
}

/** Says by hand which visit a session belongs to; null lets it pair by itself again. */
export async function pairVisit(deps: Deps, session: string, visit: string | null): Promise<Result<Study>> {
  const found = await deps.store.session(session);
  if (!found.ok) return found;
  const summary = found.value;
  if (summary === null) return problem('task.noSession', { id: session });
  return editStudy(deps, summary.study, async (before) => {
    const others = before.pairings.filter((pairing) => pairing.session !== session);
    if (visit === null) return ok({ pairings: others });
    const sessions = await deps.store.listSessions(summary.study);
    if (!sessions.ok) return sessions;
    if (!sessions.value.some((one) => one.visit === visit)) return problem('task.noVisit', { id: visit });
    return ok({ pairings: [...others, { session, visit }] });
  });
}

interface Signature {
  readonly at: number;
  readonly why: string;
  readonly by: string;
}

function signature(
  stored: StoredSession,
  interval: number,
  codes: readonly string[] | null,
  words: { readonly why: string; readonly by: string },
): Result<Signature, Problem> {
  const state = fold(stored.header, stored.journal);
  if (state.ended === null && stored.header.schedule.kind === 'laid') return problem('task.sessionRuns');
  if (!state.planned.some((line) => line.number === interval))
    return problem('task.noSuchInterval', { interval });
  const fault = codes === null ? null : codesFault(stored.header, codes);
  if (fault !== null) return fault;
  const by = nameFrom(words.by, 'by');
  if (!by.ok) return by;
  const why = cleaned(words.why);
  if (why === '') return problem('task.noReason');
  return ok({ at: state.at, why, by: by.value });
}

/** Codes of the session's own set; one a look where a look has one. */
function codesFault(header: SessionHeader, codes: readonly string[]): ReturnType<typeof problem> | null {
  const { codeSet, method } = recordingFacts(header);
  const strange = codes.find((code) => !codeSet.codes.some((one) => one.id === code));
  if (strange !== undefined) return problem('task.noSuchCode', { code: strange });
  if (new Set(codes).size < codes.length) return problem('task.codeTwice');
  if (method === 'momentary' && codes.length !== 1) return problem('task.oneCode');
  return null;
}

/** Counts belong to headcounts, and there a scan that is not missing has some; a recorded duration has no intervals to correct. */
function countsFault(
  header: SessionHeader,
  { counts, missing }: Amendment,
): ReturnType<typeof problem> | null {
  const { method } = recordingFacts(header);
  if (method === 'duration' && header.schedule.kind === 'laid') return problem('task.durationNotCorrected');
  if ((counts !== undefined) !== (method === 'headcount' && missing === null))
    return problem('task.countsOrReason');
  const whole = (n: number): boolean => Number.isInteger(n) && n >= 0;
  if (counts !== undefined && !(whole(counts.on) && whole(counts.present) && counts.on <= counts.present))
    return problem('task.countsOutOfRange');
  return null;
}
