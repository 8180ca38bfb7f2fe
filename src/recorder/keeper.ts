import type { JournalEntry } from '../journal/entry.ts';
import type { Problem, Result } from '../kernel/result.ts';
import type { SessionStore, Stop, Timer } from './ports.ts';
import type { Kept } from './roomSnapshot.ts';

/** Waiting times after refused writes, in ms; the last one goes on for good. */
export const retryAfter = [250, 500, 1000, 2000, 4000, 8000] as const;

/** A write that takes longer than this is told as a refusal, though it may still succeed (a full disk can hang). */
export const slowAfterMs = 5000;

/**
 * The write queue: one entry is one durable row. Everything queued goes into one append; a refused append stays in
 * memory and is tried again. Nothing is ever dropped, and the order never changes.
 */
export class Keeper {
  private queue: JournalEntry[] = [];
  private writing = false;
  private waiting: Stop | null = null;
  private refusals = 0;
  private kept = 0;
  private of = 0;
  private refused: Problem | null = null;
  private settled: ((allKept: boolean) => void)[] = [];
  private afterwards: (() => void)[] = [];

  /** @param alreadyKept entries of a resumed session that are durable from before */
  constructor(
    private readonly store: Pick<SessionStore, 'append'>,
    private readonly timer: Timer,
    private readonly changed: () => void,
    alreadyKept = 0,
  ) {
    this.kept = alreadyKept;
    this.of = alreadyKept;
  }

  add(entry: JournalEntry): void {
    this.queue.push(entry);
    this.of += 1;
    if (this.waiting === null) void this.write();
  }

  status(): Kept {
    return { kept: this.kept, of: this.of, refused: this.refused };
  }

  /** Tries at once. Resolves true when all is durable, false after a refusal or a write that hangs (it goes on trying). */
  flush(): Promise<boolean> {
    if (this.kept === this.of) return Promise.resolve(true);
    const done = new Promise<boolean>((resolve) => this.settled.push(resolve));
    this.waiting?.();
    this.waiting = null;
    void this.write();
    return done;
  }

  /** Calls back once, as soon as everything queued is durable. */
  whenAllKept(then: () => void): void {
    if (this.kept === this.of) then();
    else this.afterwards.push(then);
  }

  private async write(): Promise<void> {
    if (this.writing || this.queue.length === 0) return;
    this.writing = true;
    const batch = this.queue;
    this.queue = [];
    const watch = this.timer.wakeIn(slowAfterMs, () => {
      this.say({ code: 'recorder.storeSlow', values: {} });
      this.settle(false);
    });
    const answer = await this.tried(batch);
    watch();
    this.writing = false;
    if (answer.ok) {
      this.kept += batch.length;
      this.refusals = 0;
      this.say(null);
      if (this.queue.length > 0) void this.write();
      else this.settle(true);
      return;
    }
    this.queue = [...batch, ...this.queue];
    this.waiting?.();
    const pause = retryAfter[Math.min(this.refusals, retryAfter.length - 1)] ?? 8000;
    this.refusals += 1;
    this.waiting = this.timer.wakeIn(pause, () => {
      this.waiting = null;
      void this.write();
    });
    this.say(answer.problem);
    this.settle(false);
  }

  private async tried(batch: readonly JournalEntry[]): Promise<Result<null>> {
    try {
      return await this.store.append(batch);
    } catch (error) {
      const why = error instanceof Error ? error.message : String(error);
      return { ok: false, problem: { code: 'recorder.storeFailed', values: { why } } };
    }
  }

  private say(refused: Problem | null): void {
    this.refused = refused;
    this.changed();
  }

  private settle(allKept: boolean): void {
    for (const resolve of this.settled.splice(0)) resolve(allKept);
    if (allKept) for (const then of this.afterwards.splice(0)) then();
  }
}
