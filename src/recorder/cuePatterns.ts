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
  // In a sweep the next child is a matter of seconds: half a look, and softer.
  next: { tones: [{ at: 0, lasts: 0.09, pitch: 587, level: 0.5 }] },
  record: {
    tones: [
      { at: 0, lasts: 0.07, pitch: 392, level: 0.8 },
      { at: 0.13, lasts: 0.24, pitch: 392, level: 0.8 },
    ],
  },
};

const rhythms: Record<CueKind, Rhythm> = {
  look: [220],
  next: [90],
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

/*
 * A touch was taken: much quieter and shorter than any cue. Codes are told apart by rhythm, in the order in which they
 * stand in the set; what is no code sounds lower. From the drawing board, no source.
 */
const short = 0.018;
const long = 0.07;
const clicksOfCodes: readonly (readonly number[])[] = [
  [short],
  [short, short],
  [long],
  [short, long],
  [long, short],
  [short, short, short],
];
const clickOfOther: readonly number[] = [long];
const betweenClicks = 0.09;

/** Which target was touched: a code by its place in the set (0, 1 …), or something that is no code. */
export type Touched = number | 'other';

const lengthsOf = (touched: Touched): readonly number[] =>
  (touched === 'other' ? null : clicksOfCodes[touched]) ?? clickOfOther;

/** The quiet answer to a touch. */
export function confirmationClick(touched: Touched): CuePattern {
  const pitch = touched === 'other' ? 220 : 330;
  let at = 0;
  const tones = lengthsOf(touched).map((lasts): Tone => {
    const tone = { at, lasts, pitch, level: 0.15 };
    at += lasts + betweenClicks;
    return tone;
  });
  return { tones };
}

/** The same rhythm in the hand, long enough for a motor to start. */
export function confirmationRhythm(touched: Touched): Rhythm {
  const beats = lengthsOf(touched).map((lasts) => (lasts === short ? 25 : 80));
  return beats.flatMap((beat, i) => (i === 0 ? [beat] : [betweenClicks * 1000, beat]));
}

/** A prompt waits for its mark: two soft falling tones. */
export const reminder: CuePattern = {
  tones: [
    { at: 0, lasts: 0.08, pitch: 494, level: 0.3 },
    { at: 0.1, lasts: 0.12, pitch: 370, level: 0.3 },
  ],
};
export const reminderRhythm: Rhythm = [40, 60, 40, 60, 40];

/** A look is near, where no voice can say whose: two soft rising tones. */
export const headsUpPattern: CuePattern = {
  tones: [
    { at: 0, lasts: 0.07, pitch: 370, level: 0.3 },
    { at: 0.11, lasts: 0.07, pitch: 494, level: 0.3 },
  ],
};

/** Wireless earpieces sleep between cues and swallow the first tenths of a second: this wakes them. */
export const leadIn: Tone = { at: -0.35, lasts: 0.35, pitch: 110, level: 0.03 };

/** The same pattern with the quiet lead-in before its first tone; its moment stays where it is. */
export function withLeadIn(pattern: CuePattern): CuePattern {
  return { tones: [leadIn, ...pattern.tones] };
}
