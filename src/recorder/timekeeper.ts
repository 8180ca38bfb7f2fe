import type { PageMs } from '../kernel/units.ts';
import { type Reading, SessionClock } from './clock.ts';
import type { RecorderPorts } from './ports.ts';
import { type WallJump, type WallReading, wallJump } from './wallJump.ts';

/** What a look at all three clocks brought. */
export interface TimeNews {
  readonly page: PageMs;
  readonly reading: Reading;
  readonly jump: WallJump;
  /** Session time of the look before, on the grid as it was before a jump. */
  readonly lastLook: number;
}

/** Looks at page, audio and wall clock at each wake-up and keeps session time straight. */
export class Timekeeper {
  readonly clock = new SessionClock();
  private last: WallReading;
  private hiddenMeanwhile: boolean;

  constructor(private readonly ports: Pick<RecorderPorts, 'page' | 'wall' | 'audio' | 'visibility'>) {
    this.last = { page: ports.page.now(), wall: ports.wall.now() };
    this.hiddenMeanwhile = ports.visibility.hidden();
  }

  /** Told at each change of visibility: a page may have been hidden and be seen again before the next look. */
  visibilityChanged(): void {
    this.hiddenMeanwhile = true;
  }

  look(): TimeNews {
    const { page, wall, audio, visibility } = this.ports;
    const reading: WallReading = { page: page.now(), wall: wall.now() };
    const hidden = visibility.hidden();
    const jump = wallJump(this.last, reading, hidden || this.hiddenMeanwhile);
    const lastLook = this.clock.at(this.last.page);
    if (jump.kind === 'slept') this.clock.skip(jump.ms);
    this.last = reading;
    this.hiddenMeanwhile = hidden;
    const running = audio.state() === 'running' ? audio.sample() : null;
    return { page: reading.page, jump, lastLook, reading: this.clock.read(running, audio.generation()) };
  }

  /** Session time now, without looking at the other clocks. */
  now(): number {
    return this.clock.at(this.ports.page.now());
  }
}
