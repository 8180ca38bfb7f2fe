import { ok, problem } from '../../../src/kernel/result.ts';
import { audioSeconds, pageMs } from '../../../src/kernel/units.ts';
import type { CuePattern } from '../../../src/recorder/cuePatterns.ts';
import type { AudioEvent, AudioPort, AudioState, Stop } from '../../../src/recorder/ports.ts';
import type { HandClock } from './handClock.ts';

export interface LaidOnFake {
  readonly pattern: CuePattern;
  readonly at: number;
  readonly generation: number;
  /** Page time at which it was laid. */
  readonly laidAt: number;
  /** The context's time when it was taken back; null while it lies. */
  takenBack: number | null;
  /** The page time at which it came out; null when it did not. */
  heardAt: number | null;
}

/** An audio context that a test stops, starts, freezes and makes anew. It moves with the hand-driven clock. */
export class FakeAudio implements AudioPort {
  /** Seconds of this context's clock for each second of the page's. */
  speed = 1;
  /** Added to each reading of the clock, ms. */
  jitter: () => number = () => 0;
  unlocks = true;
  frozen = false;
  closed = false;
  readonly laid: LaidOnFake[] = [];
  readonly played: { readonly pattern: CuePattern; readonly page: number }[] = [];
  settings: unknown = null;
  latencyMs: number | null = 20;
  readonly tellsOutputChanges = true;
  private time = 0;
  private made = 0;
  private current: AudioState = 'silent';
  private listeners = new Set<(event: AudioEvent) => void>();

  constructor(private readonly clock: HandClock) {
    clock.onMove((ms) => this.move(ms));
  }

  unlock() {
    if (!this.unlocks) return Promise.resolve(problem('recorder.noSound'));
    this.made += 1;
    this.current = 'running';
    const facts = this.facts();
    return Promise.resolve(facts === null ? problem('recorder.noSound') : ok(facts));
  }

  state(): AudioState {
    return this.current;
  }

  now() {
    return this.current === 'running' ? audioSeconds(this.time) : null;
  }

  sample() {
    if (this.current !== 'running') return null;
    return { audio: audioSeconds(this.time + this.jitter() / 1000), page: pageMs(this.clock.page) };
  }

  generation(): number {
    return this.made;
  }

  settle(settings: unknown): void {
    this.settings = settings;
  }

  lay(pattern: CuePattern, at: number): Stop {
    if (at <= this.time) throw new Error('laid into the past');
    const sound: LaidOnFake = {
      pattern,
      at,
      generation: this.made,
      laidAt: this.clock.page,
      takenBack: null,
      heardAt: null,
    };
    this.laid.push(sound);
    return () => {
      sound.takenBack ??= this.time;
    };
  }

  play(pattern: CuePattern): void {
    if (this.current === 'running') this.played.push({ pattern, page: this.clock.page });
  }

  facts() {
    return this.current === 'running'
      ? { sampleRate: 48_000, latencyMs: this.latencyMs, output: null }
      : null;
  }

  subscribe(listener: (event: AudioEvent) => void): Stop {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  }

  close(): void {
    this.closed = true;
    this.current = 'silent';
  }

  /** A call, the lock screen: the context stops. */
  interrupt(): void {
    this.current = 'silent';
    this.tell({ kind: 'state', state: 'silent' });
  }

  /** The same context goes on, or a new one from 0. */
  comeBack({ anew = false } = {}): void {
    if (anew) {
      this.made += 1;
      this.time = 0;
    }
    this.current = 'running';
    this.tell({ kind: 'state', state: 'running' });
  }

  output(change: 'gone' | 'new'): void {
    this.tell({ kind: 'output', change, output: null });
  }

  /** What came out, in order, with the page time of each. */
  heard(): LaidOnFake[] {
    return this.laid
      .filter((sound) => sound.heardAt !== null)
      .sort((a, b) => (a.heardAt ?? 0) - (b.heardAt ?? 0));
  }

  private tell(event: AudioEvent): void {
    for (const listener of this.listeners) listener(event);
  }

  private move(ms: number): void {
    if (this.current !== 'running' || this.frozen) return;
    const from = this.time;
    this.time += (ms / 1000) * this.speed;
    for (const sound of this.laid) {
      if (sound.heardAt !== null || sound.generation !== this.made) continue;
      if (sound.takenBack !== null && sound.takenBack <= sound.at) continue;
      if (sound.at > from && sound.at <= this.time)
        sound.heardAt = this.clock.page - ((this.time - sound.at) / this.speed) * 1000;
    }
  }
}
