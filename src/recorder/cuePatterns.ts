import type { CueKind } from '../journal/entry.ts';

/** One tone of a pattern. */
export interface Tone {
  /** Seconds after the pattern's moment. */
  readonly at: number;
  /** Seconds from silence to silence. */
  readonly lasts: number;
  /** Hertz. */
  readonly pitch: number;
  /** Loudness 0 to 1, before the observer's volume. */
  readonly level: number;
}

export interface CuePattern {
  readonly tones: readonly Tone[];
}

/** The rhythm of a cue in milliseconds, on and off, as a phone vibrates it. */
export type Rhythm = readonly number[];

/** Soft edges: each tone swells and fades for this long (seconds), or for a third of itself where it is shorter. */
export const edge = 0.012;

/*
 * Told apart by rhythm before pitch: one long, two short, one short and one long. Pitches stay below 1 kHz, where a
 * small earpiece is clear and a neighbour hears least. From the drawing board, no source.
 */
const cues: Record<CueKind, CuePattern> = {
  look: { tones: [{ at: 0, lasts: 0.22, pitch: 660, level: 0.8 }] },
  observe: {
    tones: [
      { at: 0, lasts: 0.09, pitch: 523, level: 0.8 },
      { at: 0.16, lasts: 0.09, pitch: 523, level: 0.8 },
    ],
  },
  record: {
    tones: [
      { at: 0, lasts: 0.07, pitch: 392, level: 0.8 },
      { at: 0.13, lasts: 0.24, pitch: 392, level: 0.8 },
    ],
  },
};

const rhythms: Record<CueKind, Rhythm> = {
  look: [220],
  observe: [90, 70, 90],
  record: [70, 60, 240],
};

/** The sound of a cue. */
export function cuePattern(cue: CueKind): CuePattern {
  return cues[cue];
}

/** The vibration of a cue: the same rhythm. */
export function cueRhythm(cue: CueKind): Rhythm {
  return rhythms[cue];
}

/** Three, two, one: three equal ticks, quieter than a cue. */
export const countInTick: CuePattern = { tones: [{ at: 0, lasts: 0.06, pitch: 440, level: 0.45 }] };

/** A touch was taken: much quieter and shorter than any cue. */
export const confirmationClick: CuePattern = { tones: [{ at: 0, lasts: 0.018, pitch: 330, level: 0.15 }] };

/** Wireless earpieces sleep between cues and swallow the first tenths of a second: this wakes them. */
export const leadIn: Tone = { at: -0.35, lasts: 0.35, pitch: 110, level: 0.03 };

/** The same pattern with the quiet lead-in before its first tone; its moment stays where it is. */
export function withLeadIn(pattern: CuePattern): CuePattern {
  return { tones: [leadIn, ...pattern.tones] };
}
