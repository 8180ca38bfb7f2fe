import type { MissingReason } from '../../model/missing.ts';

/** Why an interval is missing, as people read it; files keep the fixed forms of `model/missing.ts`. */
export const missing = {
  missed: 'no mark',
  'out of view': 'out of view',
  'left the room': 'left the room',
  'with another adult': 'with another adult',
  'not taking part': 'not taking part',
  'class interrupted': 'class interrupted',
  paused: 'paused',
  'prompt failed': 'prompt failed',
  'ended early': 'ended early',
  other: 'other reason',
} as const satisfies Record<MissingReason, string>;
