import type { AwayReason, EntryRef } from '../journal/entry.ts';
import type { Id } from '../kernel/ids.ts';
import type { Result } from '../kernel/result.ts';
import type { PageMs } from '../kernel/units.ts';
import type { MissingReason } from '../model/missing.ts';
import type { Manner } from '../model/observer.ts';
import * as deeds from './deeds.ts';
import type { Beginning, Correction, LiveSession } from './liveSession.ts';
import type { Stop } from './ports.ts';
import type { RoomSnapshot } from './roomSnapshot.ts';
import type { SessionRun } from './sessionRun.ts';

/** What the observer can do, said to the session that runs. */
export class RunningSession implements LiveSession {
  constructor(private readonly run: SessionRun) {}

  subscribe(listener: () => void): Stop {
    return this.run.subscribe(listener);
  }

  snapshot(): RoomSnapshot {
    return this.run.snapshot();
  }

  begin(how: Beginning = {}): Promise<Result<{ readonly sound: boolean }>> {
    return this.run.begin(how);
  }

  touch(code: string | null, at: PageMs): void {
    this.run.take({ kind: 'code', code }, at);
  }

  count(on: number, present: number, at: PageMs): void {
    this.run.take({ kind: 'count', on, present }, at);
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
    this.run.dispose();
  }
}
