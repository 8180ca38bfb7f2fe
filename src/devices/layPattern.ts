import type { AudioSeconds } from '../kernel/units.ts';
import type { CuePattern } from '../recorder/cuePatterns.ts';
import type { Stop } from '../recorder/ports.ts';
import { patternSamples } from './patternSamples.ts';

interface Made {
  readonly buffer: AudioBuffer;
  readonly before: number;
}

const made = new WeakMap<BaseAudioContext, Map<string, Made>>();

/** How quickly a sound that is taken back dies away (seconds): at once for the ear, without a click. */
const fade = 0.015;

/**
 * Lays a pattern on a context's clock, live or offline, its moment on the frame nearest to `at`. A lead-in that would
 * have to begin in the past is left out. Returns the way to take the sound back.
 */
export function layPattern(
  context: BaseAudioContext,
  output: AudioNode,
  pattern: CuePattern,
  at: AudioSeconds,
): Stop {
  const { buffer, before } = bufferOf(context, pattern);
  const rate = context.sampleRate;
  const moment = Math.round(at * rate);
  const source = context.createBufferSource();
  source.buffer = buffer;
  const level = context.createGain();
  source.connect(level).connect(output);
  source.onended = () => level.disconnect();
  const begin = (moment - before) / rate;
  if (begin > context.currentTime) source.start(begin);
  else source.start(moment / rate, before / rate);
  return () => {
    const now = context.currentTime;
    if (now < begin) {
      source.stop();
      level.disconnect();
      return;
    }
    level.gain.setTargetAtTime(0, now, fade / 4);
    source.stop(now + fade);
  };
}

function bufferOf(context: BaseAudioContext, pattern: CuePattern): Made {
  const known = made.get(context) ?? new Map<string, Made>();
  made.set(context, known);
  const key = JSON.stringify(pattern);
  const found = known.get(key);
  if (found !== undefined) return found;
  const { samples, before } = patternSamples(pattern, context.sampleRate);
  const buffer = context.createBuffer(1, samples.length, context.sampleRate);
  buffer.copyToChannel(samples, 0);
  const fresh = { buffer, before };
  known.set(key, fresh);
  return fresh;
}
