import * as z from 'zod/mini';

/** Why an interval has no usable mark. Written exactly so in files; missing is never off-task. */
export const missingReasons = [
  'missed',
  'out of view',
  'left the room',
  'with another adult',
  'not taking part',
  'class interrupted',
  'paused',
  'prompt failed',
  'ended early',
  'other',
] as const;

export const missingReason = z.enum(missingReasons);
export type MissingReason = z.infer<typeof missingReason>;
