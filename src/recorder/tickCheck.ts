import { ok, type Result } from '../kernel/result.ts';
import { audioSeconds, type EpochMs, epochMs } from '../kernel/units.ts';
import type { CueSettings } from '../model/protocol.ts';
import type { CuePattern } from './cuePatterns.ts';
import type { RecorderPorts, Stop } from './ports.ts';

/** Each second; short, so that two ticks 20 ms apart are heard as two. From the drawing board, no source. */
export const tick: CuePattern = { tones: [{ at: 0, lasts: 0.03, pitch: 880, level: 0.6 }] };

/** Each tenth second: whole seconds' difference between two tablets is heard by it. */
export const tenthTick: CuePattern = {
  tones: [
    { at: 0, lasts: 0.03, pitch: 880, level: 0.8 },
    { at: 0.06, lasts: 0.16, pitch: 587, level: 0.8 },
  ],
};

/** Ticks lie this far ahead on the audio clock (ms). */
const aheadMs = 5000;

/** How often the three clocks are read anew (ms), and of how many readings the mapping is the median. */
const lookEveryMs = 200;
const readings = 9;

/** A tick that lies further than this (ms) from where it belongs by the latest readings is laid anew. */
const tolerance = 2;

/** A sound cannot be laid closer to the audio clock's present than this (seconds). */
const tooClose = 0.02;

interface LaidTick {
  /** Second of the nudged wall clock, ms since 1970. */
  readonly second: number;
  /** Seconds of the audio clock. */
  readonly at: number;
  readonly stop: Stop;
}

/** What a tick check is handed; its audio is its own, and is let go of with it. */
export type TickPorts = Pick<RecorderPorts, 'audio' | 'page' | 'wall' | 'timer' | 'visibility'>;

/**
 * Ticks on each second of this tablet's wall clock, as the nudge says that it is to be read, so that two tablets can be
 * brought together by ear. Ticks are laid on the audio clock (wall → page → audio, the median of the latest readings);
 * a timer only wakes the laying.
 *
 * What is brought together is what is heard: the delay of a wireless earpiece is part of the nudge, as it is part of each
 * prompt. So the check is done with the earpieces that the observers will wear.
 */
export class TickCheck {
  private nudgedBy: number;
  private running = false;
  private wallLead: number[] = [];
  private audioLead: number[] = [];
  private generation = -1;
  private laid: LaidTick[] = [];
  private wake: Stop | null = null;
  private unsee: Stop | null = null;
  private readonly listeners = new Set<() => void>();

  constructor(
    private readonly ports: TickPorts,
    nudgeMs = 0,
  ) {
    this.nudgedBy = nudgeMs;
  }

  /** How many milliseconds later than it shows this tablet's wall clock is to be read. */
  get nudgeMs(): number {
    return this.nudgedBy;
  }

  get ticking(): boolean {
    return this.running;
  }

  /** The wall clock as the nudge says that it is to be read. */
  now(): EpochMs {
    return epochMs(this.ports.wall.now() + this.nudgedBy);
  }

  /** Told at each change, and several times a second while it ticks. */
  subscribe(listener: () => void): Stop {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  }

  /** Called in a tap, since sound starts locked; ok only when the ticks are heard. In both ears. */
  async start({ volume }: Pick<CueSettings, 'volume'>): Promise<Result<null>> {
    if (this.running) return ok(null);
    const { audio, visibility } = this.ports;
    this.running = true;
    // Nobody nudges what they do not see, and a tablet that was laid aside must not tick on in a classroom.
    this.unsee = visibility.subscribe(() => visibility.hidden() && this.stop());
    audio.settle({ channel: 'both', volume });
    const unlocked = await audio.unlock();
    // Stopped meanwhile: what was just made is let go of, too.
    if (!unlocked.ok || !this.running) this.stop();
    else this.look();
    return unlocked.ok ? ok(null) : unlocked;
  }

  /** Silence at once; the nudge stays. */
  stop(): void {
    this.running = false;
    this.wake?.();
    this.unsee?.();
    this.takeBack();
    this.forget();
    this.ports.audio.close();
    this.tell();
  }

  /** By so many ms: more makes this tablet tick earlier. The ticks that lie ahead are laid anew. */
  nudge(by: number): void {
    this.nudgedBy += by;
    this.takeBack();
    if (this.running) this.layAhead();
    this.tell();
  }

  /** Back to the wall clock as it shows. */
  reset(): void {
    this.nudge(-this.nudgedBy);
  }

  private look(): void {
    if (!this.running) return;
    this.read();
    this.layAhead();
    this.wake = this.ports.timer.wakeIn(lookEveryMs, () => this.look());
    this.tell();
  }

  private read(): void {
    const { audio, page, wall } = this.ports;
    const sample = audio.state() === 'running' ? audio.sample() : null;
    if (sample === null || audio.generation() !== this.generation) {
      // What lay on a context that is gone is gone with it.
      this.takeBack();
      this.forget();
      this.generation = audio.generation();
    }
    if (sample === null) return;
    this.audioLead = [...this.audioLead, 1000 * sample.audio - sample.page].slice(-readings);
    this.wallLead = [...this.wallLead, wall.now() - page.now()].slice(-readings);
  }

  private forget(): void {
    this.audioLead = [];
    this.wallLead = [];
  }

  private takeBack(): void {
    for (const { stop } of this.laid) stop();
    this.laid = [];
  }

  /** Where a second of the nudged wall clock lies on the audio clock. */
  private audioAt(second: number): number {
    return (second - this.nudgedBy - median(this.wallLead) + median(this.audioLead)) / 1000;
  }

  private layAhead(): void {
    const { audio } = this.ports;
    const present = audio.now();
    if (present === null || this.audioLead.length === 0) return;
    const earliest = present + tooClose;
    this.laid = this.laid.filter((laid) => {
      if (laid.at <= earliest) return true;
      const stays = Math.abs(this.audioAt(laid.second) - laid.at) * 1000 <= tolerance;
      if (!stays) laid.stop();
      return stays;
    });
    const now = this.now();
    this.laid = this.laid.filter(({ second }) => second > now - 1000);
    for (let second = Math.floor(now / 1000) * 1000; second <= now + aheadMs; second += 1000) {
      const at = this.audioAt(second);
      if (at < earliest || this.laid.some((laid) => laid.second === second)) continue;
      const pattern = second % 10_000 === 0 ? tenthTick : tick;
      this.laid.push({ second, at, stop: audio.lay(pattern, audioSeconds(at)) });
    }
  }

  private tell(): void {
    for (const listener of this.listeners) listener();
  }
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  const high = sorted[middle] ?? Number.NaN;
  return sorted.length % 2 === 1 ? high : ((sorted[middle - 1] ?? high) + high) / 2;
}
