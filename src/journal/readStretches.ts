import type { IntervalRecord } from './intervalRecord.ts';
import type { PlannedInterval } from './plannedIntervals.ts';
import { childAt, type JournalState, type Saying } from './state.ts';
import { lessonPartAt, minutesFromBreak } from './whereabouts.ts';

/** What holds from one moment on, until something else does. */
type Word = Pick<IntervalRecord, 'status' | 'codes' | 'missing' | 'corrected' | 'touchedAt'>;

/**
 * A duration record as stretches between onsets and offsets, numbered 1, 2, 3 … A touch holds until the next one. What
 * keeps the observer from watching (an interruption, a child away, a tablet that stood still) ends what held before:
 * nobody knows what the child did meanwhile, so time until the next touch is missed, never guessed.
 * @param now session time until which the record goes
 */
export function readStretches(
  state: JournalState,
  { now, ended }: { readonly now: number; readonly ended: boolean },
): IntervalRecord[] {
  const stretches = state.planned.flatMap((line) => partStretches(state, line, now, ended));
  return stretches.map((stretch, i) => ({ ...stretch, number: i + 1 }));
}

function partStretches(
  state: JournalState,
  line: PlannedInterval,
  now: number,
  ended: boolean,
): IntervalRecord[] {
  const origin = state.origins[line.part] ?? Number.NaN;
  const notMade: Word = ended
    ? { ...silence, missing: 'ended early' }
    : { ...silence, status: 'waiting', missing: null };
  if (Number.isNaN(origin) || now <= origin)
    return [recordOf(state, line, origin, origin + line.endMs, notMade)];
  const end = origin + line.endMs;
  const closedAt = state.closed[line.part] ?? Number.POSITIVE_INFINITY;
  const until = Math.min(end, closedAt, now);
  const goesOn = !ended && until === now && closedAt > now;
  const touches = touchesOf(state, line);
  // A touch of this very moment is answered at once, though its stretch has no length yet.
  const edges = edgesOf(state, touches, origin, goesOn ? until + 1 : until);
  const stretches: IntervalRecord[] = [];
  let heard = 0;
  for (const [i, from] of edges.entries()) {
    while ((touches[heard]?.at ?? Number.POSITIVE_INFINITY) <= from) heard += 1;
    const word = wordAt(state, line, touches[heard - 1], from);
    const to = edges[i + 1] ?? until;
    const next = recordOf(state, line, from, to, word);
    const last = stretches.at(-1);
    if (last !== undefined && saysTheSame(last, next))
      stretches[stretches.length - 1] = { ...last, closeAt: to };
    else stretches.push(next);
  }
  const last = stretches.at(-1);
  if (goesOn && last?.missing === 'missed')
    stretches[stretches.length - 1] = { ...last, status: 'open', missing: null };
  if (until < end && !goesOn)
    stretches.push(recordOf(state, line, until, end, { ...silence, missing: 'ended early' }));
  return stretches;
}

const silence: Word = {
  status: 'missing',
  codes: null,
  missing: 'missed',
  corrected: false,
  touchedAt: Number.NaN,
};

type Touch = Extract<Saying, { kind: 'marked' | 'missing' }>;

/** The touches of a part in the order of their moments. */
function touchesOf(state: JournalState, { number }: PlannedInterval): Touch[] {
  return (state.sayings.get(number) ?? [])
    .flatMap((saying) => (saying.kind === 'marked' || saying.kind === 'missing' ? [saying] : []))
    .sort((a, b) => a.at - b.at);
}

/** The moments at which something may change, in order, the first one being the beginning. */
function edgesOf(state: JournalState, touches: readonly Touch[], origin: number, until: number): number[] {
  const moments = [
    origin,
    ...touches.map(({ at }) => at),
    ...state.covers.flatMap(({ from, to }) => [from, to]),
    ...state.standIns.flatMap(({ from, to }) => [from, to]),
    ...state.unusable.flatMap(({ from, to }) => [from, to]),
    ...state.lessonParts.map(({ at }) => at),
  ];
  const inside = moments.filter((at): at is number => at !== null && at >= origin && at < until);
  return [...new Set(inside)].sort((a, b) => a - b);
}

/** What holds at a moment: a stretch of no use, a cover, or the last touch before, if nothing has ended it since. */
function wordAt(state: JournalState, line: PlannedInterval, touch: Touch | undefined, at: number): Word {
  const unusable = state.unusable.findLast(({ from, to }) => from <= at && at < to);
  if (unusable !== undefined) return { ...silence, missing: unusable.reason, corrected: true };
  const child = line.child === null ? null : childAt(state, line.child, at);
  const mine = state.covers.filter((cover) => cover.child === null || cover.child === child);
  const cover = mine.find(({ from, to }) => from <= at && (to === null || at < to));
  // No prompt is needed here: while the tablet stood still, touches were missed.
  if (cover !== undefined)
    return { ...silence, missing: cover.reason === 'prompt failed' ? 'missed' : cover.reason };
  if (touch === undefined) return silence;
  const ends = [...mine.map(({ to }) => to), ...state.standIns.flatMap(({ from, to }) => [from, to])];
  if (ends.some((end) => end !== null && end > touch.at && end <= at)) return silence;
  if (touch.kind === 'missing') return { ...silence, missing: touch.reason, touchedAt: touch.at };
  return {
    status: 'scored',
    codes: touch.code === null ? [] : [touch.code],
    missing: null,
    corrected: false,
    touchedAt: touch.at,
  };
}

function saysTheSame(a: IntervalRecord, b: IntervalRecord): boolean {
  return (
    a.status === b.status &&
    a.missing === b.missing &&
    a.child === b.child &&
    a.lessonPart === b.lessonPart &&
    a.corrected === b.corrected &&
    a.codes?.[0] === b.codes?.[0] &&
    (a.codes === null) === (b.codes === null)
  );
}

function recordOf(
  state: JournalState,
  line: PlannedInterval,
  from: number,
  to: number,
  word: Word,
): IntervalRecord {
  return {
    number: line.number,
    part: line.part,
    phase: line.phase,
    round: null,
    child: line.child === null || Number.isNaN(from) ? line.child : childAt(state, line.child, from),
    openAt: from,
    cueAt: from,
    closeAt: to,
    lessonPart: lessonPartAt(state, from),
    minutesFromBreak: minutesFromBreak(state, line.part, from),
    counts: null,
    late: false,
    amended: false,
    settled: null,
    cuedAt: Number.NaN,
    ...word,
  };
}
