import type { AwayReason, EntryRef, JournalEntry } from '../journal/entry.ts';
import type { Id } from '../kernel/ids.ts';
import { problem, type Result } from '../kernel/result.ts';
import type { PageMs } from '../kernel/units.ts';
import type { MissingReason } from '../model/missing.ts';
import type { Manner } from '../model/observer.ts';
import { callOff } from './calledOff.ts';
import * as deeds from './deeds.ts';
import type { Beginning, Correction, LiveSession } from './liveSession.ts';
import type { Stop } from './ports.ts';
import type { RoomSnapshot } from './roomSnapshot.ts';
import type { SessionRun } from './sessionRun.ts';
import { Telling } from './telling.ts';

/** What the observer can do, said to the session that runs. */
export class RunningSession implements LiveSession {
  private readonly telling = new Telling();
  private manner: Pick<Manner, 'confirm' | 'remind'> | null = null;
  /** The run whose start was called off, until all of it is kept. */
  private before: SessionRun | null = null;

  /** @param again makes a run that has not begun yet, over the journal of one whose start was called off */
  constructor(
    private run: SessionRun,
    private readonly again: (calledOff: readonly JournalEntry[]) => SessionRun,
  ) {
    this.listen();
  }

  private listen(): void {
    this.run.subscribe(() => this.telling.tell());
  }

  subscribe(listener: () => void): Stop {
    return this.telling.subscribe(listener);
  }

  snapshot(): RoomSnapshot {
    return this.run.snapshot();
  }

  async begin(how: Beginning = {}): Promise<Result<{ readonly sound: boolean }>> {
    // One after the other: the store and the right to record are handed on.
    if (this.before !== null && !(await this.before.flush())) return problem('recorder.storeSlow');
    this.before = null;
    return this.run.begin(how);
  }

  callOff(): void {
    const called: { journal: readonly JournalEntry[] | null } = { journal: null };
    this.run.deed((desk, present) => {
      if (callOff(desk, present)) called.journal = desk.book.journal;
    });
    if (called.journal === null) return;
    this.before = this.run;
    this.before.dispose();
    this.run = this.again(called.journal);
    if (this.manner !== null) this.run.behave(this.manner);
    this.listen();
    this.telling.tell();
  }

  touch(code: string | null, at: PageMs): void {
    this.run.take({ kind: 'code', code }, at);
  }

  count(on: number, present: number, at: PageMs, of?: number): void {
    this.run.take({ kind: 'count', on, present, ...(of === undefined ? {} : { of }) }, at);
  }

  cannotSee(at: PageMs): void {
    this.run.take({ kind: 'cannot see' }, at);
  }

  swap(pairs: readonly (readonly [number, number])[]): void {
    this.run.deed(deeds.swap(pairs));
  }

  correct(interval: number, to: Correction): void {
    this.run.deed(deeds.correct(interval, to));
  }

  unusable(stretch: { from: number; to: number }, reason: MissingReason, words?: string): void {
    this.run.deed(deeds.unusable(stretch, reason, words));
  }

  behave(manner: Pick<Manner, 'confirm' | 'remind'>): void {
    this.manner = manner;
    this.run.behave(manner);
  }

  childBefore(): void {
    this.run.armBefore();
  }

  undo(): void {
    this.run.deed(deeds.undo);
  }

  childLeft(child: Id, reason: AwayReason): void {
    this.run.deed(deeds.childLeft(child, reason));
  }

  childReturned(child: Id): void {
    this.run.say({ kind: 'returned', child });
  }

  childMoved(child: Id, seat: Id): void {
    this.run.say({ kind: 'moved', child, seat });
  }

  interruptClass(): void {
    this.run.deed(deeds.interruptClass);
  }

  continueClass(): void {
    this.run.deed(deeds.continueClass);
  }

  pause(): void {
    this.run.deed(deeds.pause);
  }

  resume(): void {
    this.run.deed(deeds.resume);
  }

  flag(): void {
    this.run.flag();
  }

  note(text: string, about?: EntryRef): void {
    this.run.say({ kind: 'noted', text, ...(about === undefined ? {} : { about }) });
  }

  lessonPart(lessonPart: string | null): void {
    this.run.say({ kind: 'lessonPart', lessonPart });
  }

  breakStarted(): void {
    this.run.deed(deeds.breakStarted);
  }

  firstTaskGiven(): void {
    this.run.deed(deeds.firstTaskGiven);
  }

  silence(silent: boolean): void {
    this.run.deed(deeds.silence(silent));
  }

  end(words?: string): void {
    this.run.end(words);
  }

  flush(): Promise<boolean> {
    return this.run.flush();
  }

  dispose(): void {
    this.telling.forget();
    this.run.dispose();
  }
}
