import { audioSeconds, pageMs } from '../kernel/units.ts';
import type { ClockSample } from '../recorder/ports.ts';

/** An output timestamp further than this behind the context's time (seconds) is not believed. */
const believable = 2;

/**
 * Which sample is heard at which page time. `getOutputTimestamp` is finer than `currentTime`, which moves in steps, and
 * knows the way to the ear; where it is missing or says nonsense (zero at first), the context's own time has to do.
 */
export function readAudioClock(context: AudioContext): ClockSample {
  const now = context.currentTime;
  const page = performance.now();
  const { contextTime = 0, performanceTime = 0 } = context.getOutputTimestamp?.() ?? {};
  const age = page - performanceTime;
  const fits = contextTime <= now + 0.1 && now - contextTime - age / 1000 < believable && age < 5000;
  if (contextTime > 0 && performanceTime > 0 && fits) {
    return { audio: audioSeconds(contextTime), page: pageMs(performanceTime) };
  }
  return { audio: audioSeconds(now - latencyOf(context)), page: pageMs(page) };
}

/** Seconds from the context's clock to the ear, as far as the browser knows. */
export function latencyOf(context: AudioContext): number {
  return context.outputLatency || context.baseLatency || 0;
}
