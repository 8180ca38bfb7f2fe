import { describe, expect, it } from 'vitest';
import { patternSamples } from '../../src/devices/patternSamples.ts';
import type { CueKind } from '../../src/journal/entry.ts';
import {
  type CuePattern,
  confirmationClick,
  confirmationRhythm,
  countInTick,
  cuePattern,
  cueRhythm,
  type Touched,
  withLeadIn,
} from '../../src/recorder/cuePatterns.ts';

const kinds: CueKind[] = ['look', 'observe', 'record', 'next'];
const touched: Touched[] = [0, 1, 2, 3, 4, 5, 'other'];
const rates = [8000, 22_050, 44_100, 48_000, 96_000];

/** Stretches of sound, from first to after last frame, in milliseconds; 10 ms of silence part them. */
function stretches(samples: Float32Array, rate: number): [number, number][] {
  const found: [number, number][] = [];
  samples.forEach((value, frame) => {
    if (Math.abs(value) <= 1e-5) return;
    const last = found.at(-1);
    if (last !== undefined && frame - last[1] < rate / 100) last[1] = frame + 1;
    else found.push([frame, frame + 1]);
  });
  return found.map(([from, to]) => [(from / rate) * 1000, (to / rate) * 1000]);
}

describe('patternSamples', () => {
  it.each(rates)('begins every cue with its very first frame, at %i Hz', (rate) => {
    for (const pattern of [...kinds.map(cuePattern), countInTick, ...touched.map(confirmationClick)]) {
      const { samples, before } = patternSamples(pattern, rate);
      expect(before).toBe(0);
      expect(Math.abs(samples[0] ?? 0)).toBeGreaterThan(5e-7);
    }
  });

  it('sounds in the rhythm that the tablet vibrates', () => {
    for (const kind of kinds) {
      const rate = 48_000;
      const { samples } = patternSamples(cuePattern(kind), rate);
      const ends = stretches(samples, rate).flat();
      const rhythm = ends.slice(1).map((end, i) => Math.round(end - (ends[i] ?? 0)));
      expect(rhythm).toEqual(cueRhythm(kind));
    }
  });

  it('never clips, and swells and fades without a step that would click', () => {
    for (const rate of rates) {
      for (const kind of kinds) {
        const { samples } = patternSamples(withLeadIn(cuePattern(kind)), rate);
        expect(Math.max(...samples.map(Math.abs))).toBeLessThanOrEqual(0.83);
        // The first and last millisecond stay below an eighth of full loudness.
        const ms = Math.round(rate / 1000);
        expect(Math.max(...samples.slice(-ms).map(Math.abs))).toBeLessThan(0.12);
      }
    }
  });

  it('puts a lead-in before the moment and leaves the moment where it is', () => {
    const rate = 48_000;
    const plain = patternSamples(cuePattern('look'), rate);
    const led = patternSamples(withLeadIn(cuePattern('look')), rate);
    expect(led.before).toBe(0.35 * rate);
    expect(led.samples.slice(led.before)).toEqual(plain.samples);
    expect(Math.max(...led.samples.slice(0, led.before).map(Math.abs))).toBeLessThan(0.04);
  });

  it('gives confirmation clicks that no one takes for a cue: short, and quieter than a quarter', () => {
    const loudest = (pattern: CuePattern) =>
      Math.max(...patternSamples(pattern, 48_000).samples.map(Math.abs));
    for (const click of touched.map(confirmationClick)) {
      expect(loudest(click)).toBeLessThan(loudest(cuePattern('look')) / 4);
      expect(patternSamples(click, 48_000).samples.length).toBeLessThan(48 * 280);
    }
  });

  it('answers each of six codes, and what is no code, in a rhythm of its own, in ear and hand', () => {
    const heard = touched.map((one) => JSON.stringify(confirmationClick(one)));
    expect(new Set(heard).size).toBe(touched.length);
    const codes = touched.filter((one) => one !== 'other');
    expect(new Set(codes.map((one) => confirmationRhythm(one).join())).size).toBe(codes.length);
  });

  it('tells the cues apart by rhythm and by pitch', () => {
    const pitches = kinds.map((kind) => cuePattern(kind).tones[0]?.pitch);
    expect(new Set(pitches).size).toBe(kinds.length);
    expect(new Set(kinds.map((kind) => cueRhythm(kind).join())).size).toBe(kinds.length);
  });
});
