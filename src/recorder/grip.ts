import { ok, problem, type Result } from '../kernel/result.ts';
import type { CueSettings } from '../model/protocol.ts';
import type { AudioEvent, RecorderPorts, Stop } from './ports.ts';

/** What the session wants to be told of while it holds the tablet. */
export interface Told {
  readonly wakeLock: () => void;
  readonly visibility: () => void;
  readonly audio: (event: AudioEvent) => void;
}

/** What a session holds of the tablet while it runs: the sound, the screen kept on, and the right to record. */
export class Grip {
  private stops: Stop[] = [];
  private release: Stop | null = null;
  private over = false;

  constructor(private readonly ports: Pick<RecorderPorts, 'audio' | 'lock' | 'wakeLock' | 'visibility'>) {}

  /** Called in a tap. A sound that stays locked keeps nobody from observing; another tab that records does. */
  async take(cues: CueSettings, told: Told): Promise<Result<{ readonly sound: boolean }>> {
    const { audio, lock, wakeLock, visibility } = this.ports;
    // Both are asked for inside the tap.
    const unlocking = audio.unlock().catch(() => problem('recorder.noSound'));
    const release = await lock.take();
    if (release === null) {
      audio.close();
      return problem('recorder.otherTabRecords');
    }
    const unlocked = await unlocking;
    if (this.over) {
      release();
      return problem('recorder.ended');
    }
    this.release = release;
    audio.settle(cues);
    wakeLock.hold();
    this.stops = [
      wakeLock.subscribe(told.wakeLock),
      visibility.subscribe(told.visibility),
      audio.subscribe(told.audio),
    ];
    return ok({ sound: unlocked.ok });
  }

  /** Lets go of all but the right to record. */
  letGo(): void {
    this.over = true;
    for (const stop of this.stops.splice(0)) stop();
    this.ports.wakeLock.letGo();
    this.ports.audio.close();
  }

  /** Another tab may record now. */
  giveBack(): void {
    this.release?.();
    this.release = null;
  }
}
