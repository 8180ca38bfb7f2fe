import { type AudioSeconds, sessionMs } from '../kernel/units.ts';
import type { SessionClock } from './clock.ts';
import { type CuePattern, countInTick, cuePattern, headsUpPattern, withLeadIn } from './cuePatterns.ts';
import { dueIn, type GridCue } from './grid.ts';
import type { AudioPort, Stop } from './ports.ts';
import { countInMs } from './standing.ts';

/** Cues lie this far ahead on the audio clock: a page that is hidden or busy for a minute bends none of them. */
export const aheadMs = 90_000;

/** A context's time moves in steps (10 ms seen), so it may stand a little behind what is already on its way (seconds). */
const step = 0.05;

/** A sound cannot be laid closer to the audio clock's present than this (seconds). */
const tooClose = 0.004;

/**
 * A due sound that a slip of the audio clock makes later than this (ms) is taken back: the screen has cued meanwhile. One
 * that is less late is of more use to an ear than none, and is said to be late.
 */
const lateAtMost = 250;

/** One sound on the session's clock. */
export interface LaidSound {
  readonly at: number;
  readonly pattern: CuePattern;
}

/**
 * The sounds of a session in order: every cue, and three ticks before each part that has begun.
 * @param headsUpMs so long before a look a soft tone says that it is near; null for none
 */
export function soundsOf(
  cues: readonly GridCue[],
  origins: readonly (number | null)[],
  leadIn: boolean,
  headsUpMs: number | null = null,
): LaidSound[] {
  const dressed = (pattern: CuePattern): CuePattern => (leadIn ? withLeadIn(pattern) : pattern);
  const ticks = origins.flatMap((origin) =>
    origin === null
      ? []
      : [3, 2, 1].map((n) => ({ at: origin - (n * countInMs) / 3, pattern: dressed(countInTick) })),
  );
  const sounds = cues.map(({ at, cue }) => ({ at, pattern: dressed(cuePattern(cue)) }));
  const near =
    headsUpMs === null
      ? []
      : cues
          .filter(({ cue }) => cue === 'look' || cue === 'observe')
          .map(({ at }) => ({ at: at - headsUpMs, pattern: dressed(headsUpPattern) }));
  return [...sounds, ...ticks, ...near].sort((a, b) => a.at - b.at);
}

/** Lays sounds well ahead on the audio clock, and takes them back when silence is asked for. */
export class CuePlayer {
  private laid: { readonly at: number; readonly audio: AudioSeconds; readonly stop: Stop }[] = [];
  private until = Number.NEGATIVE_INFINITY;
  private generation = -1;

  constructor(
    private readonly audio: AudioPort,
    private readonly clock: SessionClock,
  ) {}

  /**
   * Lays what is due from session time `now` until `aheadMs` later and does not lie there yet.
   * @param sounds in order
   */
  layAhead(sounds: readonly LaidSound[], now: number): void {
    const present = this.audio.now();
    if (present === null || !this.clock.hasAudio) return;
    this.generation = this.audio.generation();
    // A sound is given up once it has been over for longer than anybody asks for it.
    this.laid = this.laid.filter((sound) => sound.at > now - aheadMs);
    const from = Math.max(this.until, now - 1);
    for (const sound of dueIn(sounds, from, now + aheadMs)) {
      if (this.laid.some((one) => one.at === sound.at)) continue;
      const at = this.clock.audioAt(sessionMs(sound.at));
      // Too late for its moment: it is not played at all, since a late cue bends the grid.
      if (at === null || at < present + tooClose) continue;
      this.laid.push({ at: sound.at, audio: at, stop: this.audio.lay(sound.pattern, at) });
    }
    this.until = Math.max(this.until, now + aheadMs);
  }

  /** Takes back all that lies ahead, and what sounds at this moment. */
  takeBack(): void {
    for (const sound of this.laid) sound.stop();
    this.laid = [];
    this.until = Number.NEGATIVE_INFINITY;
  }

  /** The audio clock slipped: takes back what is not due yet and has not begun, since it lies at a wrong moment now. */
  takeBackAhead(now: number): void {
    const present = this.audio.now() ?? 0;
    const stays = (sound: { readonly at: number; readonly audio: AudioSeconds }): boolean =>
      sound.audio <= present || (sound.at <= now && this.clock.late <= lateAtMost);
    for (const sound of this.laid) if (!stays(sound)) sound.stop();
    this.laid = this.laid.filter(stays);
    this.until = Number.NEGATIVE_INFINITY;
  }

  /** True when a sound lay at this session time and the audio clock has come to it, or is about to, being late. */
  heard(at: number): boolean {
    // What lay on a context that is gone is gone with it.
    if (this.generation !== this.audio.generation()) return false;
    const sound = this.laid.find((one) => one.at === at);
    const present = this.audio.now();
    const { late } = this.clock;
    const wait = late > 0 && late <= lateAtMost ? late / 1000 : 0;
    return sound !== undefined && present !== null && present >= sound.audio - wait - step;
  }
}
