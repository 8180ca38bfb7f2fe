import { type CuePattern, edge } from '../recorder/cuePatterns.ts';

/**
 * Lays a pattern's tones on a context's clock, its moment at `at` seconds exactly, and returns the way to take it
 * back (also while it sounds). Works alike in a live and in an offline context: tests render what the room hears.
 */
export function layTones(
  context: BaseAudioContext,
  output: AudioNode,
  pattern: CuePattern,
  at: number,
): () => void {
  const nodes = pattern.tones.map((tone) => {
    const start = Math.max(0, at + tone.at);
    const end = Math.max(start, at + tone.at + tone.lasts);
    const swell = Math.min(edge, (end - start) / 3);
    const oscillator = new OscillatorNode(context, { frequency: tone.pitch });
    const gain = new GainNode(context, { gain: 0 });
    gain.gain.setValueAtTime(0, start);
    gain.gain.linearRampToValueAtTime(tone.level, start + swell);
    gain.gain.setValueAtTime(tone.level, end - swell);
    gain.gain.linearRampToValueAtTime(0, end);
    oscillator.connect(gain).connect(output);
    oscillator.start(start);
    oscillator.stop(end);
    oscillator.addEventListener('ended', () => gain.disconnect());
    return { oscillator, gain };
  });
  return () => {
    for (const { oscillator, gain } of nodes) {
      // Silence first: stopping an oscillator in mid-swing clicks.
      gain.gain.cancelScheduledValues(context.currentTime);
      gain.gain.setTargetAtTime(0, context.currentTime, 0.004);
      oscillator.stop(context.currentTime + 0.03);
    }
  };
}
