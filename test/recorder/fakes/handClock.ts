import { epochMs, pageMs } from '../../../src/kernel/units.ts';
import type { PageClock, Stop, Timer, WallClock } from '../../../src/recorder/ports.ts';

/** Something that moves with time: told how many milliseconds went by. */
type Mover = (ms: number) => void;

/**
 * Page clock, wall clock and timers that only a test moves. Between two wake-ups pending promises are settled, so that
 * what is kept comes back as it would in a browser.
 */
export class HandClock {
  page = 5_000;
  /** 3 November 2026, 10 o'clock. */
  wall = Date.UTC(2026, 10, 3, 10);
  /** Minutes east of UTC. */
  offset = 0;
  /** Timers wake no more often than this many ms apart, as in a hidden page. */
  throttle = 0;
  private timers: { readonly at: number; readonly wake: () => void }[] = [];
  private movers: Mover[] = [];

  readonly pageClock: PageClock = { now: () => pageMs(this.page) };
  readonly wallClock: WallClock = {
    now: () => epochMs(this.wall),
    offsetMinutes: () => this.offset,
    timeZone: () => 'Europe/London',
  };
  readonly timer: Timer = {
    wakeIn: (ms, wake): Stop => {
      const due = this.page + ms;
      const at = this.throttle === 0 ? due : Math.ceil(due / this.throttle) * this.throttle;
      const timer = { at, wake };
      this.timers.push(timer);
      return () => {
        this.timers = this.timers.filter((other) => other !== timer);
      };
    },
  };

  onMove(mover: Mover): void {
    this.movers.push(mover);
  }

  get pendingTimers(): number {
    return this.timers.length;
  }

  /** Time goes by and timers wake. */
  async advance(ms: number): Promise<void> {
    const until = this.page + ms;
    await settled();
    for (;;) {
      const next = this.timers.reduce<(typeof this.timers)[number] | null>(
        (first, timer) => (first === null || timer.at < first.at ? timer : first),
        null,
      );
      if (next === null || next.at > until) break;
      this.timers = this.timers.filter((timer) => timer !== next);
      this.move(Math.max(0, next.at - this.page));
      next.wake();
      await settled();
    }
    this.move(until - this.page);
    await settled();
  }

  /** The page is busy: time goes by for everybody, and no timer wakes before it is over. */
  block(ms: number): void {
    this.move(ms);
  }

  /** The device sleeps: only the wall clock goes on. */
  sleep(ms: number): void {
    this.wall += ms;
  }

  private move(ms: number): void {
    this.page += ms;
    this.wall += ms;
    for (const mover of this.movers) mover(ms);
  }
}

/** Lets everything that waits for a promise run. */
export async function settled(): Promise<void> {
  for (let i = 0; i < 12; i++) await Promise.resolve();
}
