import type { MissingReason } from '../model/missing.ts';
import type { PlannedInterval } from './plannedIntervals.ts';
import type { JournalState } from './state.ts';

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
  /** Changed after the session. */
  readonly amended: boolean;
  readonly settled: readonly string[] | null;
  /** Session time of the touch that decided; NaN for none. */
  readonly touchedAt: number;
  /** Session time at which the cue was delivered; NaN when not known. */
  readonly cuedAt: number;
}

/**
 * The intervals of a session as they stand at session time `now` (default: the last time the journal speaks of).
 * A session that has ended has no `waiting` or `open` intervals; `final` reads one that never ended (a tablet that
 * was lost) as if it had ended where its journal stops.
 */
export function readOut(
  state: JournalState,
  options: { now?: number; final?: boolean } = {},
): IntervalRecord[] {
  const end = state.ended?.at ?? (options.final ? state.at : null);
  const now = end ?? options.now ?? state.at;
  return state.planned.map((line) => read(state, line, now, end));
}

function read(state: JournalState, line: PlannedInterval, now: number, end: number | null): IntervalRecord {
  const origin = state.origins[line.part] ?? Number.NaN;
  const cueAt = origin + line.cueMs;
  const closeAt = origin + line.closeMs;
  const cues = state.cues.get(line.number) ?? [];
  const delivered = cues.find((cue) => cue.cue !== 'record')?.delivered;
  const said = spoken(state, line);
  const status = said === null ? silent(state, line, { cueAt, closeAt, now, end }) : said;
  return {
    number: line.number,
    part: line.part,
    phase: line.phase,
    round: line.round,
    child: line.child,
    openAt: origin + line.openMs,
    cueAt,
    closeAt,
    lessonPart: line.lessonPart ?? lessonPartAt(state, cueAt),
    minutesFromBreak: line.minutesFromBreak ?? minutesFromBreak(state, line.part, cueAt),
    codes: null,
    counts: null,
    missing: null,
    late: false,
    amended: false,
    touchedAt: Number.NaN,
    ...status,
    settled: state.settled.get(line.number) ?? null,
    cuedAt: delivered ?? Number.NaN,
  };
}

type Outcome = Pick<IntervalRecord, 'status'> & Partial<IntervalRecord>;

/** What the observer said of the interval, if anything. In partial recording codes add up; otherwise the last word counts. */
function spoken(state: JournalState, line: PlannedInterval): Outcome | null {
  const sayings = state.sayings
    .get(line.number)
    ?.filter(({ child }) => child === undefined || child === line.child);
  // A correction outranks every mark, also one that was made by a clock that stood behind the recorder's.
  const last = sayings?.findLast((saying) => saying.kind === 'amended') ?? sayings?.at(-1);
  if (sayings === undefined || last === undefined) return null;
  if (last.kind === 'amended') {
    return last.missing !== null
      ? { status: 'missing', missing: last.missing, amended: true }
      : { status: 'scored', codes: last.codes ?? [], amended: true };
  }
  const rest = { late: last.late ?? false, touchedAt: last.at };
  if (last.kind === 'missing') return { status: 'missing', missing: last.reason, ...rest };
  if (last.counts !== undefined) return { status: 'scored', codes: [], counts: last.counts, ...rest };
  if (!severalCodes(state))
    return { status: 'scored', codes: last.code === null ? [] : [last.code], ...rest };
  const codes: string[] = [];
  for (const saying of sayings) {
    if (saying.kind !== 'marked' || saying.code === null) codes.length = 0;
    else if (!codes.includes(saying.code)) codes.push(saying.code);
  }
  return { status: 'scored', codes, ...rest };
}

function severalCodes(state: JournalState): boolean {
  const { schedule } = state.header;
  const method = schedule.kind === 'laid' ? schedule.protocol.method : schedule.method;
  return method === 'partial' || method === 'whole' || method === 'duration';
}

interface Times {
  readonly cueAt: number;
  readonly closeAt: number;
  readonly now: number;
  readonly end: number | null;
}

/** Nothing was said of the interval: is it still to come, and if not, why is it missing? Never off-task. */
function silent(state: JournalState, line: PlannedInterval, { cueAt, closeAt, now, end }: Times): Outcome {
  if (Number.isNaN(cueAt))
    return end === null ? { status: 'waiting' } : { status: 'missing', missing: 'ended early' };
  const closedAt = state.closed[line.part] ?? null;
  if (closedAt !== null && cueAt >= closedAt) return { status: 'missing', missing: 'ended early' };
  if (end !== null && cueAt >= end) return { status: 'missing', missing: 'ended early' };
  if (cueAt > now) return { status: 'waiting' };
  const cover = state.covers.find(
    (c) =>
      (c.child === null || c.child === line.child) &&
      c.from < closeAt &&
      (c.to === null || c.to > cueAt) &&
      hides(c.reason, line),
  );
  if (cover !== undefined) return { status: 'missing', missing: cover.reason };
  const cues = state.cues.get(line.number) ?? [];
  if (cues.length > 0 && cues.every((cue) => cue.by.length === 0))
    return { status: 'missing', missing: 'prompt failed' };
  if (end !== null && closeAt > end && state.ended?.reason !== 'complete')
    return { status: 'missing', missing: 'ended early' };
  return end === null && closeAt > now ? { status: 'open' } : { status: 'missing', missing: 'missed' };
}

/** A true pause stops the schedule, so a momentary look goes on after it; an observed stretch is broken by it. */
function hides(reason: string, line: PlannedInterval): boolean {
  return reason !== 'paused' || line.openMs === line.cueMs;
}

function lessonPartAt(state: JournalState, at: number): string | null {
  return state.lessonParts.findLast((change) => change.at <= at)?.lessonPart ?? null;
}

/** Minutes from the break to the cue: negative before the break began, positive after the first task was given. */
function minutesFromBreak(state: JournalState, part: number, cueAt: number): number | null {
  if (Number.isNaN(cueAt) || state.breakStartedAt === null) return null;
  const origin = part === 0 ? state.breakStartedAt : (state.origins[part] ?? Number.NaN);
  return Number.isNaN(origin) ? null : Math.round(((cueAt - origin) / 60_000) * 1000) / 1000;
}
