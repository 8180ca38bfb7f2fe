import type { EntryBody } from '../../../src/journal/entry.ts';
import { readOut } from '../../../src/journal/readOut.ts';
import { fold } from '../../../src/journal/step.ts';
import { ok, type Result } from '../../../src/kernel/result.ts';
import { sessionMs } from '../../../src/kernel/units.ts';
import type { SeatingPlan } from '../../../src/model/seatingPlan.ts';
import type { SessionHeader } from '../../../src/model/session.ts';
import type { Beginning, Correction, LiveSession } from '../../../src/recorder/liveSession.ts';
import type { RoomSnapshot } from '../../../src/recorder/roomSnapshot.ts';
import { journalOf } from '../../support/session.ts';

/** Two rows of three seats; c1 in front on the left, c2 beside it, c3 at the back. */
export const plan: SeatingPlan = {
  columns: 3,
  rows: 2,
  observerSide: 'back',
  seats: [
    { id: 's1', column: 0, row: 0, table: 0, child: 'c1' },
    { id: 's2', column: 1, row: 0, table: 0, child: 'c2' },
    { id: 's3', column: 2, row: 0, table: 1, child: null },
    { id: 's4', column: 0, row: 1, table: 2, child: null },
    { id: 's5', column: 1, row: 1, table: 2, child: 'c3' },
    { id: 's6', column: 2, row: 1, table: 3, child: null },
  ],
};

/** What the room shows at session time `now` after these entries: the current interval is the one that is open. */
export function snapshotOf(
  header: SessionHeader,
  said: readonly (readonly [number, EntryBody])[],
  now: number,
  changes: Partial<RoomSnapshot> = {},
): RoomSnapshot {
  const state = fold(header, journalOf(...said));
  const intervals = readOut(state, { now });
  const current = intervals.find((i) => i.cueAt <= now && now < i.closeAt) ?? null;
  const next = intervals.find((i) => i.cueAt > now);
  return {
    phase: 'running',
    resuming: false,
    now: sessionMs(now),
    countIn: null,
    current,
    upcoming:
      next === undefined
        ? null
        : {
            number: next.number,
            part: next.part,
            phase: next.phase,
            round: next.round,
            child: next.child,
            seat: null,
            cueAt: sessionMs(next.cueAt),
            away: null,
          },
    previous: current === null ? null : (intervals[current.number - 2] ?? null),
    armedBefore: null,
    intervals,
    lastRound: intervals.filter(({ status }) => status !== 'waiting').slice(-6),
    present: header.children.length,
    startsIn: null,
    reminded: 0,
    part: 0,
    partPhase: 'before',
    nextPart: null,
    round: current?.round ?? 1,
    rounds: 2,
    msLeft: 60_000,
    msToNextCue: null,
    cuePart: current === null ? null : 'look',
    kept: { kept: said.length, of: said.length, refused: null },
    undo: null,
    sound: {
      on: true,
      cause: null,
      heard: true,
      output: null,
      latencyMs: null,
      tellsOutputChanges: true,
    },
    wakeLock: 'held',
    vibrates: false,
    away: new Map(),
    seats: state.seats,
    lessonPart: null,
    mayPause: false,
    breakStarted: false,
    flash: 0,
    flashStrongly: false,
    felt: null,
    refusal: null,
    lastFlag: null,
    ended: null,
    state,
    ...changes,
  };
}

export type Call = readonly [name: string, ...args: unknown[]];

/** A session without clocks: it writes down what it is told and shows what it is given. */
export class FakeLive implements LiveSession {
  readonly calls: Call[] = [];
  /** How it was told to behave, latest last. */
  readonly manners: Parameters<LiveSession['behave']>[0][] = [];
  begun: Result<{ readonly sound: boolean }> = ok({ sound: true });
  private readonly listeners = new Set<() => void>();

  constructor(private shown: RoomSnapshot) {}

  show(changes: Partial<RoomSnapshot>): void {
    this.shown = { ...this.shown, ...changes };
    for (const listener of this.listeners) listener();
  }

  subscribe = (listener: () => void) => {
    this.listeners.add(listener);
    return () => void this.listeners.delete(listener);
  };
  snapshot = () => this.shown;

  private told(...call: Call): void {
    this.calls.push(call);
  }

  begin = async (how?: Beginning) => {
    if (how === undefined || Object.keys(how).length === 0) this.told('begin');
    else this.told('begin', how);
    return this.begun;
  };
  callOff = () => this.told('callOff');
  touch = (code: string | null, at: number) => this.told('touch', code, at);
  count = (on: number, present: number, at: number) => this.told('count', on, present, at);
  cannotSee = (at: number) => this.told('cannotSee', at);
  swap = (pairs: readonly (readonly [number, number])[]) => this.told('swap', pairs);
  correct = (interval: number, to: Correction) => this.told('correct', interval, to);
  unusable = (...said: Parameters<LiveSession['unusable']>) => this.told('unusable', ...said);
  behave = (manner: Parameters<LiveSession['behave']>[0]) => void this.manners.push(manner);
  childBefore = () => this.told('childBefore');
  undo = () => this.told('undo');
  childLeft = (child: string, reason: string) => this.told('childLeft', child, reason);
  childReturned = (child: string) => this.told('childReturned', child);
  childMoved = (child: string, seat: string) => this.told('childMoved', child, seat);
  interruptClass = () => this.told('interruptClass');
  continueClass = () => this.told('continueClass');
  pause = () => this.told('pause');
  resume = () => this.told('resume');
  flag = () => this.told('flag');
  note = (text: string, about?: unknown) => this.told('note', text, about);
  lessonPart = (part: string | null) => this.told('lessonPart', part);
  breakStarted = () => this.told('breakStarted');
  firstTaskGiven = () => this.told('firstTaskGiven');
  silence = (silent: boolean) => this.told('silence', silent);
  end = (words?: string) => this.told('end', words);
  flush = async () => {
    this.told('flush');
    return true;
  };
  dispose = () => this.told('dispose');
}
