import type { VibrationPort } from '../recorder/ports.ts';

/** Vibration where the browser has it (not on iPadOS, not in Firefox). */
export const vibration: VibrationPort = {
  available: 'vibrate' in navigator,
  vibrate: (pattern) => 'vibrate' in navigator && navigator.vibrate([...pattern]),
};
