import type { AwayReason, CueKind } from '../journal/entry.ts';
import { childrenOf } from '../journal/headerFacts.ts';
import { type IntervalRecord, readOut } from '../journal/readOut.ts';
import { awayNow, childAt, type JournalState } from '../journal/state.ts';
import { sessionMs } from '../kernel/units.ts';
import type { SessionHeader } from '../model/session.ts';
import type { ScheduledInterval } from '../schedule/layOut.ts';
import { type GridCue, type Plan, timedIntervals } from './grid.ts';
import { presentNow } from './presentNow.ts';
import type { RoomPhase, RoomSnapshot, UpcomingLook } from './roomSnapshot.ts';
import { countInMs, type Standing } from './standing.ts';
import { undoable } from './undoable.ts';
import { intervalBefore, lastCued, type TimedInterval } from './whoseTouch.ts';

/** What the view is told beside the journal. */
export interface ViewInput
  extends Pick<
    RoomSnapshot,
    | 'resuming'
    | 'armedBefore'
    | 'kept'
    | 'sound'
    | 'wakeLock'
    | 'vibrates'
    | 'reminded'
    | 'flash'
    | 'flashStrongly'
  > {
  readonly begun: boolean;
  readonly now: number;
  readonly state: JournalState;
  readonly standing: Standing;
  readonly cues: readonly GridCue[];
  readonly felt: RoomSnapshot['felt'];
  readonly refusal: RoomSnapshot['refusal'];
}

/** Turns the journal into what the screen shows, and reads intervals out anew only when one may have changed. */
export class RoomView {
  private seen: { state: JournalState; cued: number; closed: number } | null = null;
  private records: readonly IntervalRecord[] = [];
  private timed: readonly TimedInterval[] = [];
  private basis: Pick<JournalState, 'origins' | 'closed'> | null = null;

  private readonly continuous: boolean;
  private readonly counting: boolean;

  constructor(
    private readonly header: SessionHeader,
    private readonly plan: Plan,
  ) {
    const { schedule } = header;
    this.continuous = schedule.kind === 'laid' && schedule.protocol.method === 'duration';
    this.counting = schedule.kind === 'laid' && schedule.protocol.method === 'headcount';
  }

  /** The interval whose cue came last, while it may still be marked. */
  currentAt(state: JournalState, now: number): IntervalRecord | null {
    const timed = this.timedIn(state);
    const position = lastCued(timed, now);
    const latest = timed[position];
    if (latest === undefined || now >= latest.closeAt || state.ended !== null) return null;
    return this.currentOf(this.readRecords(state, now, position, true), latest.number, now);
  }

  /** In a duration record it is the stretch that goes on. */
  private currentOf(
    intervals: readonly IntervalRecord[],
    number: number,
    now: number,
  ): IntervalRecord | null {
    if (!this.continuous) return intervals[number - 1] ?? null;
    return intervals.findLast(({ status, openAt }) => status !== 'waiting' && openAt <= now) ?? null;
  }

  /** The intervals whose cues have come or will come, as far as their parts have begun. */
  timedIn(state: JournalState): readonly TimedInterval[] {
    if (this.basis?.origins !== state.origins || this.basis.closed !== state.closed) {
      this.basis = { origins: state.origins, closed: state.closed };
      this.timed = timedIntervals(this.plan, state, this.continuous);
    }
    return this.timed;
  }

  snapshot(input: ViewInput): RoomSnapshot {
    const { state, begun, now, standing: place } = input;
    const timed = this.timedIn(state);
    const position = lastCued(timed, now);
    const latest = timed[position];
    const open = begun && latest !== undefined && now < latest.closeAt && state.ended === null;
    const intervals = this.readRecords(state, now, position, open);
    const current = open ? this.currentOf(intervals, latest.number, now) : null;
    const previous = begun && state.ended === null && !this.continuous ? intervalBefore(timed, now) : null;
    const away = this.away(state);
    const { part } = place;
    const origin = state.origins[part] ?? 0;
    const running = place.phase !== 'between parts' && place.phase !== 'over' && place.phase !== 'ended';
    const upcoming = this.upcoming(state, place, now);
    const nextCue = running ? input.cues.find((cue) => cue.at > now) : undefined;
    const next = place.phase === 'between parts' ? place.next : null;
    return {
      phase: phaseOf(begun, place),
      resuming: input.resuming,
      now: sessionMs(now),
      countIn: counted(begun, place, origin - now),
      startsIn: begun && place.phase === 'counting in' && origin - now > longestCountMs ? origin - now : null,
      current,
      upcoming,
      previous: previous === null ? null : (intervals[previous - 1] ?? null),
      armedBefore: input.armedBefore,
      intervals,
      lastRound: this.continuous ? [] : this.lastRound(intervals, part),
      present: this.counting ? presentNow(state) : this.header.children.length,
      part,
      partPhase: this.plan.parts[part]?.phase ?? null,
      nextPart: next === null ? null : { part: next, phase: this.plan.parts[next]?.phase ?? null },
      round: current?.round ?? upcoming?.round ?? null,
      rounds: this.plan.parts[part]?.rounds ?? null,
      msLeft: running ? origin + (this.plan.parts[part]?.duration ?? 0) - now : null,
      msToNextCue: nextCue === undefined ? null : nextCue.at - now,
      cuePart: open ? latestCue(input.cues, now) : null,
      kept: input.kept,
      undo: undoable(state),
      sound: input.sound,
      wakeLock: input.wakeLock,
      vibrates: input.vibrates,
      away,
      seats: state.seats,
      lessonPart: state.lessonParts.at(-1)?.lessonPart ?? null,
      mayPause: this.header.role === null,
      breakStarted: (state.closed[part] ?? null) !== null,
      reminded: input.reminded,
      flash: input.flash,
      flashStrongly: input.flashStrongly,
      felt: input.felt,
      refusal: input.refusal,
      lastFlag: lastFlag(state),
      ended: state.ended?.reason ?? null,
      state,
    };
  }

  private readRecords(state: JournalState, now: number, position: number, open: boolean) {
    const key = { state, cued: position, closed: open ? 0 : 1 };
    const { seen } = this;
    // A stretch that goes on is longer at each look.
    if (
      this.continuous ||
      seen === null ||
      seen.state !== state ||
      seen.cued !== key.cued ||
      seen.closed !== key.closed
    ) {
      this.records = readOut(state, { now });
      this.seen = key;
    }
    return this.records;
  }

  /** The first look that is still to come, in the running part or, between parts, in the next one. */
  private upcoming(state: JournalState, place: Standing, now: number): UpcomingLook | null {
    if (place.phase === 'ended' || place.phase === 'over') return null;
    if (place.phase === 'between parts') {
      const first = this.plan.parts[place.next]?.first ?? null;
      return first === null ? null : look(state, first, null);
    }
    const origin = state.origins[place.part] ?? 0;
    const next = this.plan.intervals.find((line) => line.part === place.part && origin + line.cueMs > now);
    return next === undefined ? null : look(state, next, origin + next.cueMs);
  }

  /** The looks of this round and of the one before, as far as their cues have come, but no more than one round. */
  private lastRound(intervals: readonly IntervalRecord[], part: number): readonly IntervalRecord[] {
    const length = this.plan.intervals.filter((line) => line.part === 0 && line.round === 1).length;
    return intervals
      .filter((line) => line.part === part && line.status !== 'waiting')
      .slice(-Math.min(mostToCorrect, Math.max(fewestToCorrect, length)));
  }

  private away(state: JournalState): ReadonlyMap<string, AwayReason> {
    const away = new Map<string, AwayReason>();
    for (const { id } of childrenOf(this.header)) {
      const reason = awayNow(state, id);
      if (reason !== null) away.set(id, reason);
    }
    return away;
  }
}

function look(state: JournalState, line: ScheduledInterval, cueAt: number | null): UpcomingLook {
  const child = line.child === null ? null : childAt(state, line.child, cueAt ?? Number.POSITIVE_INFINITY);
  return {
    number: line.number,
    part: line.part,
    phase: line.phase,
    round: line.round,
    child,
    seat: child === null ? null : (state.seats.get(child) ?? null),
    cueAt: cueAt === null ? null : sessionMs(cueAt),
    away: child === null ? null : awayNow(state, child),
  };
}

/** What is counted aloud: three, two, one. A longer wait is for an agreed second. */
const longestCountMs = countInMs + 1000;

function counted(begun: boolean, place: Standing, left: number): number | null {
  if (!begun || place.phase !== 'counting in' || left > longestCountMs) return null;
  return Math.min(3, Math.ceil(left / 1000));
}

/** How many looks the page for corrections lists. */
const fewestToCorrect = 6;
const mostToCorrect = 36;

function phaseOf(begun: boolean, place: Standing): RoomPhase {
  if (place.phase === 'ended') return 'ended';
  if (!begun) return 'ready';
  return place.phase === 'over' ? 'running' : place.phase;
}

function latestCue(cues: readonly GridCue[], now: number): CueKind | null {
  return cues.findLast((cue) => cue.at <= now)?.cue ?? null;
}

function lastFlag(state: JournalState): RoomSnapshot['lastFlag'] {
  const flag = state.entries.findLast((entry) => entry.kind === 'flagged');
  return flag === undefined ? null : { writer: flag.writer, seq: flag.seq };
}
