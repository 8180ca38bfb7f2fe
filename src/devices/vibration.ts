import type { VibrationPort } from '../recorder/ports.ts';

/** Safari and Firefox have none; a tablet without a motor says yes and does nothing, which nobody can know. */
const available = typeof navigator !== 'undefined' && typeof navigator.vibrate === 'function';

export const vibration: VibrationPort = {
  available,
  vibrate: (pattern) => available && navigator.vibrate([...pattern]),
};
