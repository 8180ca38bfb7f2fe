import type { IntervalRecord } from './intervalRecord.ts';
import type { PlannedInterval } from './plannedIntervals.ts';
import { readStretches } from './readStretches.ts';
import { childAt, type JournalState } from './state.ts';
import { lessonPartAt, minutesFromBreak } from './whereabouts.ts';

export type { IntervalRecord } from './intervalRecord.ts';

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
  if (isContinuous(state)) return readStretches(state, { now, ended: end !== null });
  return state.planned.map((line) => read(state, line, now, end));
}

/** A duration that was recorded here: its intervals are the stretches between touches, not those of a schedule. */
function isContinuous({ header: { schedule } }: JournalState): boolean {
  return schedule.kind === 'laid' && schedule.protocol.method === 'duration';
}

function read(
  state: JournalState,
  planned: PlannedInterval,
  now: number,
  end: number | null,
): IntervalRecord {
  const origin = state.origins[planned.part] ?? Number.NaN;
  const cueAt = origin + planned.cueMs;
  const line = planned.child === null ? planned : { ...planned, child: childAt(state, planned.child, cueAt) };
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
    corrected: state.swapped.has(line.number),
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
    ?.filter((saying) => !('child' in saying) || saying.child === undefined || saying.child === line.child);
  // A correction afterwards outranks every mark, also one that was made by a clock that stood behind the recorder's.
  const last = sayings?.findLast((saying) => saying.kind === 'amended') ?? sayings?.at(-1);
  if (sayings === undefined || last === undefined) return null;
  if (last.kind === 'amended') {
    return last.missing !== null
      ? { status: 'missing', missing: last.missing, amended: true }
      : { status: 'scored', codes: last.codes ?? [], counts: last.counts ?? null, amended: true };
  }
  if (last.kind === 'unusable') return { status: 'missing', missing: last.reason, corrected: true };
  if (last.kind === 'corrected') {
    if (last.missing !== null) return { status: 'missing', missing: last.missing, corrected: true };
    return { status: 'scored', codes: last.codes ?? [], counts: last.counts ?? null, corrected: true };
  }
  const touch = { late: last.late ?? false, touchedAt: last.at };
  // The touch of a mark that changed places was for another interval's cue.
  const rest = state.swapped.has(line.number) ? { late: touch.late } : touch;
  if (last.kind === 'missing') return { status: 'missing', missing: last.reason, ...rest };
  if (last.counts !== undefined) return { status: 'scored', codes: [], counts: last.counts, ...rest };
  if (!severalCodes(state))
    return { status: 'scored', codes: last.code === null ? [] : [last.code], ...rest };
  const codes: string[] = [];
  for (const saying of sayings) {
    if (saying.kind !== 'marked' || saying.code === null) codes.length = 0;
    else if (!codes.includes(saying.code)) codes.push(saying.code);
    if (saying.kind === 'corrected') codes.push(...(saying.codes ?? []));
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
