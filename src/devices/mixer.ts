import type { CueSettings } from '../model/protocol.ts';

/** Where sounds go in: one volume, then the left ear, the right ear or both. */
export interface Mixer {
  readonly input: AudioNode;
  settle(settings: Pick<CueSettings, 'channel' | 'volume'>): void;
}

/** Loudness is felt roughly as the square root of amplitude, so the lower half of the control stays usable. */
export const amplitude = (volume: number): number => Math.min(1, Math.max(0, volume)) ** 2;

export function mixer(context: BaseAudioContext): Mixer {
  const volume = context.createGain();
  const left = context.createGain();
  const right = context.createGain();
  const ears = context.createChannelMerger(2);
  volume.connect(left).connect(ears, 0, 0);
  volume.connect(right).connect(ears, 0, 1);
  ears.connect(context.destination);
  return {
    input: volume,
    settle: (settings) => {
      volume.gain.value = amplitude(settings.volume);
      left.gain.value = settings.channel === 'right' ? 0 : 1;
      right.gain.value = settings.channel === 'left' ? 0 : 1;
    },
  };
}
