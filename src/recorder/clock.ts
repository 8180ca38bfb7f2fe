import { type AudioSeconds, audioSeconds, type PageMs, pageMs, type SessionMs } from '../kernel/units.ts';
import type { ClockSample } from './ports.ts';

/** How many of the latest readings the mapping is the median of. */
const readings = 9;

/** A reading further than this from the median says that one of the two clocks jumped (readings jitter by 10 ms). */
const jumpMs = 60;

/** What a reading of the audio clock meant. */
export type Reading =
  /** Nothing new. */
  | 'steady'
  /** One strange reading: waited for a second one. */
  | 'doubtful'
  /** The audio clock was set to where the session stands (first reading, new context): lay cues anew. */
  | 'anchored'
  /** The same in the middle of a run: the audio clock slipped, as under a machine that stood still for a moment. */
  | 'slipped'
  /** The audio clock does not run: the page clock goes on alone. */
  | 'lost';

/**
 * The one owner of session time. There is one straight time line T in milliseconds; audio time, page time and session
 * time are read off it:
 *
 *     T = page + pageShift           always
 *     T = 1000 × audio + audioShift  while the audio clock runs
 *     session = T − origin − paused
 *
 * While the audio clock runs it is the master: `audioShift` stands still, so that cues lie on it without any error,
 * and `pageShift` follows as the median of recent readings (which takes up the drift of two crystals). When the audio
 * clock stops or jumps, `pageShift` stands still and `audioShift` is made anew from it: the grid never moves.
 */
export class SessionClock {
  private pageShift = 0;
  private audioShift: number | null = null;
  private generation = -1;
  private raw: number[] = [];
  private doubtful: number | null = null;
  private behind = 0;
  private lastSample: ClockSample | null = null;
  private origin: number | null = null;
  private pausedFor = 0;
  private pausedSince: number | null = null;

  /** Sets session time to `at` at this page time and starts it. */
  start(page: PageMs, at: number): void {
    this.origin = page + this.pageShift - at;
    this.pausedFor = 0;
    this.pausedSince = null;
  }

  get started(): boolean {
    return this.origin !== null;
  }

  get paused(): boolean {
    return this.pausedSince !== null;
  }

  /** True while cues can be laid on the audio clock. */
  get hasAudio(): boolean {
    return this.audioShift !== null;
  }

  /**
   * So many milliseconds later than planned came what sounded until the last reading: 0 except between a slip of the
   * audio clock and the moment when cues lie anew. Negative when the audio clock ran ahead.
   */
  get late(): number {
    return this.behind;
  }

  pause(page: PageMs): void {
    if (this.pausedSince === null) this.pausedSince = page + this.pageShift;
  }

  resume(page: PageMs): void {
    if (this.pausedSince === null) return;
    this.pausedFor += page + this.pageShift - this.pausedSince;
    this.pausedSince = null;
  }

  /** Session time goes back by so many milliseconds: an interval that a pause broke is done once more. */
  stepBack(ms: number): void {
    this.pausedFor += ms;
  }

  /** Reads the audio clock against the page clock; null while it does not run. Call it at each wake-up. */
  read(sample: ClockSample | null, generation: number): Reading {
    this.behind = 0;
    if (sample === null) {
      // It said itself that it stopped: when it says that it runs again, it need not prove it against old readings.
      this.lastSample = null;
      return this.lose();
    }
    if (this.audioShift === null || generation !== this.generation) {
      const standing = generation === this.generation && this.standsStill(sample);
      this.generation = generation;
      this.lastSample = sample;
      if (standing) return 'steady';
      return this.anchor(sample);
    }
    if (this.standsStill(sample)) {
      this.lastSample = sample;
      return this.lose();
    }
    this.lastSample = sample;
    const raw = 1000 * sample.audio - sample.page;
    const behind = median(this.raw) - raw;
    if (Math.abs(behind) > jumpMs) {
      const again = this.doubtful !== null && Math.abs(raw - this.doubtful) <= jumpMs;
      this.behind = behind;
      this.doubtful = raw;
      if (!again) return 'doubtful';
      this.anchor(sample);
      return 'slipped';
    }
    this.doubtful = null;
    this.raw = [...this.raw, raw].slice(-readings);
    this.pageShift = this.audioShift + median(this.raw);
    return 'steady';
  }

  /** Page and audio clock stood still together for so long (sleep): session time takes a step. Cues have to be laid anew. */
  skip(ms: number): void {
    this.pageShift += ms;
    if (this.audioShift !== null) this.audioShift += ms;
  }

  /** Session time at a page time. Exact; round it before it is written down. */
  at(page: PageMs): number {
    const line = Math.min(page + this.pageShift, this.pausedSince ?? Number.POSITIVE_INFINITY);
    return line - (this.origin ?? Number.NaN) - this.pausedFor;
  }

  /** Page time at which the session reaches this time; NaN before the start, meaningless while paused. */
  pageAt(at: number): PageMs {
    return pageMs(at + (this.origin ?? Number.NaN) + this.pausedFor - this.pageShift);
  }

  /** Where a session time lies on the audio clock; null without one. */
  audioAt(at: SessionMs): AudioSeconds | null {
    if (this.audioShift === null || this.origin === null) return null;
    return audioSeconds((at + this.origin + this.pausedFor - this.audioShift) / 1000);
  }

  private anchor(sample: ClockSample): Reading {
    const raw = 1000 * sample.audio - sample.page;
    this.audioShift = this.pageShift - raw;
    this.raw = [raw];
    this.doubtful = null;
    return 'anchored';
  }

  private lose(): Reading {
    if (this.audioShift === null) return 'steady';
    this.audioShift = null;
    this.raw = [];
    this.doubtful = null;
    return 'lost';
  }

  /** "Running" is not believed: the audio clock moved by less than a fifth of what the page clock did. */
  private standsStill(sample: ClockSample): boolean {
    const last = this.lastSample;
    if (last === null) return false;
    const page = sample.page - last.page;
    return page >= 200 && 1000 * (sample.audio - last.audio) < page / 5;
  }
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  const high = sorted[middle] ?? Number.NaN;
  return sorted.length % 2 === 1 ? high : ((sorted[middle - 1] ?? high) + high) / 2;
}
