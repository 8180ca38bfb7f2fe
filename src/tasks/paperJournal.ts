import type { EntryBody } from '../journal/entry.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import type { EpochMs } from '../kernel/units.ts';
import { instantOf } from '../kernel/zoneTime.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import { layOutSchedule, partDuration, type ScheduledInterval } from '../schedule/layOut.ts';
import { answersFault } from './paperAnswers.ts';
import type { PaperAnswer, PaperDraft } from './paperDraft.ts';
import { standInBodies } from './paperStandIns.ts';

/** An entry before it is stamped: session time and what it says. */
export interface Said {
  readonly at: number;
  readonly body: EntryBody;
}

export interface PaperJournal {
  readonly start: EpochMs;
  readonly said: readonly Said[];
}

export interface PaperClock {
  readonly timeZone: string | null;
  /** Offset in minutes where the zone is not known. */
  readonly offset: number;
  /** The date today. */
  readonly today: string;
}

export const intervalsOf = ({ schedule, children }: VisitPlan): ScheduledInterval[] =>
  layOutSchedule(
    schedule,
    children.map(({ id }) => id),
  );

/** Clock times on paper are written to the minute: a moment within that minute is no contradiction. */
const writtenTo = (time: string): number => (time.length === 5 ? 59_999 : 999);

/**
 * The journal of a sheet: what was seen at each planned prompt, when parts and breaks were, and nothing of prompts,
 * of which nothing is known. What is impossible is a problem, the first one found.
 */
export function paperJournal(draft: PaperDraft, clock: PaperClock): Result<PaperJournal> {
  const { plan } = draft;
  const intervals = intervalsOf(plan);
  const fault = answersFault(draft, intervals);
  if (fault !== null) return fault;
  if (draft.date === '') return problem('paper.noDate');
  if (draft.date > clock.today) return problem('paper.inFuture', { date: draft.date });
  if (draft.start === '') return problem('paper.noStart');
  const start = instantOf(draft.date, draft.start, clock.timeZone, clock.offset);
  if (start === null) return problem('paper.badStart', { found: `${draft.date} ${draft.start}` });
  const parts = partsOf(draft, intervals, start, clock);
  if (!parts.ok) return parts;
  const said: Said[] = [{ at: 0, body: { kind: 'started', checks: [], anyway: false } }];
  const { phases } = plan.schedule;
  const closed = lastClosedAt(draft, intervals, parts.value, start, clock);
  if (!closed.ok) return closed;
  for (const [k, { part, origin, breakAt }] of parts.value.entries()) {
    if (part > 0 && breakAt !== null) {
      said.push({ at: breakAt, body: { kind: 'breakStarted' } });
      said.push({ at: origin, body: { kind: 'breakEnded' } });
    }
    said.push({ at: origin, body: { kind: 'phaseStarted', phase: phases[part] ?? '', part, origin } });
    const next = parts.value[k + 1];
    const until = next === undefined ? closed.value : (next.breakAt ?? next.origin);
    said.push(...spokenIn(draft, intervals, part, origin, until ?? Number.POSITIVE_INFINITY));
  }
  const last = parts.value.at(-1) as Part;
  let at = last.origin + partDuration(intervals, last.part);
  if (closed.value !== null) {
    said.push({ at: closed.value, body: { kind: 'breakStarted' } });
    at = Math.max(at, closed.value);
  }
  const after = intervals.find(({ number }) => number === (draft.stoppedAfter ?? 0) + 1);
  const stopped = draft.stoppedAfter !== null && after !== undefined;
  if (stopped && after.part === last.part) at = last.origin + after.cueMs;
  const { stoppedAt } = draft;
  if (stoppedAt !== null) {
    const length = partDuration(intervals, last.part);
    if (stoppedAt <= 0 || stoppedAt >= length)
      return problem('paper.stoppedOutside', { at: stoppedAt, length });
    const later = draft.onsets.find(({ part, atMs }) => part === last.part && atMs >= stoppedAt);
    if (later !== undefined) return problem('paper.onsetAfterStop', { at: later.atMs, stoppedAt });
    at = last.origin + stoppedAt;
  }
  const early = stopped || stoppedAt !== null || last.part + 1 < phases.length;
  said.push({ at, body: { kind: 'ended', reason: early ? 'early' : 'complete' } });
  return ok({ start, said });
}

interface Part {
  readonly part: number;
  readonly origin: number;
  readonly breakAt: number | null;
}

/** The parts that began, and when. */
function partsOf(
  draft: PaperDraft,
  intervals: readonly ScheduledInterval[],
  start: EpochMs,
  clock: PaperClock,
): Result<Part[]> {
  const parts: Part[] = [{ part: 0, origin: 0, breakAt: null }];
  const timeOf = (time: string): number =>
    (instantOf(draft.date, time, clock.timeZone, clock.offset) ?? Number.NaN) - start;
  for (const [k, { breakStarted, firstTask }] of draft.parts.entries()) {
    const phase = draft.plan.schedule.phases[k + 1] ?? '';
    const before = parts.at(-1) as Part;
    if (firstTask === '') {
      const later = intervals.find(({ part, number }) => part > k && draft.answers[number] !== undefined);
      const onset = draft.onsets.some(({ part }) => part > k);
      const stood = draft.standIns?.some(({ from }) => (intervals[from - 1]?.part ?? 0) > k) === true;
      const begun = draft.parts.slice(k + 1).some((one) => one.firstTask !== '');
      if (later !== undefined || onset || stood || begun) return problem('paper.noFirstTask', { phase });
      return ok(parts);
    }
    const began = timeOf(firstTask);
    if (Number.isNaN(began)) return problem('paper.badTime', { found: firstTask });
    let breakAt: number | null = null;
    if (breakStarted !== '') {
      const closed = closedAt(draft, intervals, before, timeOf(breakStarted), breakStarted);
      if (!closed.ok) return closed;
      breakAt = closed.value;
      if (began + writtenTo(firstTask) < breakAt)
        return problem('paper.firstTaskBeforeBreak', { firstTask, breakStarted });
    }
    const lastSaid = latestSaid(draft, intervals, before);
    if (lastSaid !== null && began + writtenTo(firstTask) < lastSaid.at)
      return problem('paper.firstTaskTooEarly', { firstTask, interval: lastSaid.number });
    if (began < before.origin)
      return problem('paper.firstTaskBeforeStart', { firstTask, start: draft.start });
    parts.push({ part: k + 1, origin: Math.max(began, breakAt ?? 0, lastSaid?.at ?? 0), breakAt });
  }
  return ok(parts);
}

/** A break after which nobody came back to observe still closed its part: when, or null where there was none. */
function lastClosedAt(
  draft: PaperDraft,
  intervals: readonly ScheduledInterval[],
  parts: readonly Part[],
  start: EpochMs,
  clock: PaperClock,
): Result<number | null> {
  const { breakStarted = '' } = draft.parts[parts.length - 1] ?? {};
  if (breakStarted === '') return ok(null);
  const written = instantOf(draft.date, breakStarted, clock.timeZone, clock.offset);
  const since = written === null ? Number.NaN : written - start;
  return closedAt(draft, intervals, parts.at(-1) as Part, since, breakStarted);
}

/** When "break started" closed a part: as written, but after everything that was marked, or due, within that minute. */
function closedAt(
  draft: PaperDraft,
  intervals: readonly ScheduledInterval[],
  part: Part,
  written: number,
  time: string,
): Result<number> {
  if (Number.isNaN(written)) return problem('paper.badTime', { found: time });
  if (written < part.origin)
    return problem('paper.breakBeforeStart', { breakStarted: time, start: draft.start });
  const said = latestSaid(draft, intervals, part);
  if (said !== null && written + writtenTo(time) < said.at)
    return problem('paper.markAfterBreak', { breakStarted: time, interval: said.number });
  const own = intervals.filter((line) => line.part === part.part);
  const due = part.origin + (own.at(-1)?.cueMs ?? 0);
  const latest = due <= written + writtenTo(time) ? due : (said?.at ?? 0);
  return ok(Math.max(written, latest + 1));
}

/** The last moment of a part of which the sheet says something. */
function latestSaid(
  { answers, onsets }: PaperDraft,
  intervals: readonly ScheduledInterval[],
  { part, origin }: Part,
): { readonly at: number; readonly number: number } | null {
  const own = intervals.filter((line) => line.part === part);
  const times = onsets.filter((onset) => onset.part === part).map(({ atMs }) => atMs);
  const last = own.findLast(({ number }) => answers[number] !== undefined);
  if (times.length > 0) return { at: origin + Math.max(...times), number: own[0]?.number ?? 1 };
  return last === undefined ? null : { at: origin + last.cueMs, number: last.number };
}

function spokenIn(
  { answers, onsets, standIns = [] }: PaperDraft,
  intervals: readonly ScheduledInterval[],
  part: number,
  origin: number,
  closed: number,
): Said[] {
  const own = intervals.filter((line) => line.part === part);
  const lines = own.flatMap(({ number, cueMs }) => {
    const answer = answers[number];
    const at = origin + cueMs;
    return [
      // Who is watched stands before what was seen; a line that the break cut off says so when the break began.
      ...standInBodies(standIns, number).map((body) => ({ at: Math.min(at, closed), body })),
      ...(answer === undefined ? [] : bodiesOf(number, answer).map((body) => ({ at, body }))),
    ];
  });
  const number = own[0]?.number ?? 1;
  const touches = onsets
    .filter((onset) => onset.part === part)
    .sort((a, b) => a.atMs - b.atMs)
    .flatMap(({ atMs, answer }) => bodiesOf(number, answer).map((body) => ({ at: origin + atMs, body })));
  return [...lines, ...touches];
}

function bodiesOf(interval: number, answer: PaperAnswer): EntryBody[] {
  if ('missing' in answer) return [{ kind: 'missing', interval, reason: answer.missing }];
  if ('on' in answer)
    return [{ kind: 'marked', interval, code: null, counts: { on: answer.on, present: answer.present } }];
  const codes = answer.codes.length === 0 ? [null] : answer.codes;
  return codes.map((code) => ({ kind: 'marked', interval, code }));
}
