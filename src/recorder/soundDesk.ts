import type { EntryBody } from '../journal/entry.ts';
import type { JournalState } from '../journal/state.ts';
import type { CuePattern } from './cuePatterns.ts';
import type { AudioPort } from './ports.ts';
import type { SoundNow } from './roomSnapshot.ts';

type OutputChanged = Extract<EntryBody, { kind: 'outputChanged' }>;

/** Whether cues are wanted to be heard, and who said so last. */
export class SoundDesk {
  private wanted = true;
  private cause: SoundNow['cause'] = null;

  /** A resumed session is as silent as it was. */
  constructor(
    private readonly audio: AudioPort,
    state: JournalState,
  ) {
    const last = state.entries.findLast((entry) => entry.kind === 'outputChanged');
    if (last === undefined) return;
    this.wanted = last.sound;
    this.cause = last.cause;
  }

  get on(): boolean {
    return this.wanted;
  }

  /** By hand; null when nothing changes. */
  byHand(on: boolean): OutputChanged | null {
    if (this.wanted === on) return null;
    this.wanted = on;
    this.cause = 'hand';
    return this.said();
  }

  /** The output went away: silence, so that no cue comes out of a loudspeaker into the class. */
  outputGone(output: string | null): OutputChanged {
    this.wanted = false;
    this.cause = 'device';
    return { ...this.said(), ...(output === null ? {} : { output }) };
  }

  /** Sounds at once what hangs on no moment: the answer to a touch, a reminder. */
  play(pattern: CuePattern): void {
    if (this.wanted) this.audio.play(pattern);
  }

  now(clockRuns: boolean): SoundNow {
    const facts = this.audio.facts();
    return {
      on: this.wanted,
      cause: this.cause,
      heard: this.wanted && clockRuns,
      output: facts?.output ?? null,
      latencyMs: facts?.latencyMs ?? null,
      tellsOutputChanges: this.audio.tellsOutputChanges,
    };
  }

  private said(): OutputChanged {
    return { kind: 'outputChanged', sound: this.wanted, cause: this.cause ?? 'hand' };
  }
}
