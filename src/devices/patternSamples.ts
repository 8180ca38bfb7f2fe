import { type CuePattern, edge } from '../recorder/cuePatterns.ts';

export interface PatternSamples {
  readonly samples: Float32Array<ArrayBuffer>;
  /** How many of them come before the pattern's moment (a lead-in). */
  readonly before: number;
}

/**
 * A pattern as samples. Each is taken in the middle of its frame, so that the first one of a tone is already heard and
 * its onset can be measured to the frame. Edges are a quarter of a sine.
 */
export function patternSamples({ tones }: CuePattern, sampleRate: number): PatternSamples {
  const frame = (seconds: number): number => Math.round(seconds * sampleRate);
  const first = Math.min(0, ...tones.map((tone) => frame(tone.at)));
  const end = Math.max(0, ...tones.map((tone) => frame(tone.at) + frame(tone.lasts)));
  const samples = new Float32Array(end - first);
  for (const { at, lasts, pitch, level } of tones) {
    const length = frame(lasts);
    const soft = Math.min(edge, lasts / 3) * sampleRate;
    for (let k = 0; k < length; k++) {
      const rise = Math.min(1, (k + 0.5) / soft, (length - k - 0.5) / soft);
      const value =
        level * Math.sin((Math.PI / 2) * rise) * Math.sin((2 * Math.PI * pitch * (k + 0.5)) / sampleRate);
      samples[frame(at) - first + k] = (samples[frame(at) - first + k] ?? 0) + value;
    }
  }
  return { samples, before: 0 - first };
}
