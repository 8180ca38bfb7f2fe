import { shortVisitFile } from '../../test/browser/support/shortVisit.ts';

/** The shortest interval there is, in milliseconds: as many prompts as can be in the time. */
export const every = 3000;

/** A visit whose prompts go on for as long as a bench wants. */
export const longVisit = (key: string) =>
  shortVisitFile({
    key,
    protocol: {
      intervalMs: every,
      observeMs: every,
      lookAt: 'start',
      partLength: { kind: 'rounds', rounds: 100 },
      cues: { channel: 'both', volume: 1, flash: true, vibration: false },
    },
  });
