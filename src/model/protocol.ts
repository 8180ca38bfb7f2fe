import * as z from 'zod/mini';
import { codeSet } from './codeSet.ts';
import { id, revision, shortText } from './common.ts';

export const methods = ['momentary', 'partial', 'whole', 'headcount', 'duration'] as const;
export const method = z.enum(methods);
export type Method = z.infer<typeof method>;

/** Momentary looks happen when the interval ends or when it starts: one choice per protocol, printed with every figure. */
export const lookMoment = z.enum(['end', 'start']);
export type LookMoment = z.infer<typeof lookMoment>;

/** Who is watched when: the next child at each interval, `intervals` in a row for each child, or one child throughout. */
export const rotation = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('next') }),
  z.object({ kind: z.literal('block'), intervals: z.int().check(z.minimum(1), z.maximum(240)) }),
  z.object({ kind: z.literal('one') }),
]);
export type Rotation = z.infer<typeof rotation>;

/** How long one part (one phase) of a session is. A round is one pass through all target children. */
export const partLength = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('minutes'), minutes: z.number().check(z.minimum(0.25), z.maximum(180)) }),
  z.object({ kind: z.literal('rounds'), rounds: z.int().check(z.minimum(1), z.maximum(1000)) }),
]);
export type PartLength = z.infer<typeof partLength>;

export const cueSettings = z.object({
  channel: z.enum(['both', 'left', 'right']),
  /** 0 to 1 */
  volume: z.number().check(z.minimum(0), z.maximum(1)),
  flash: z.boolean(),
  vibration: z.boolean(),
});
export type CueSettings = z.infer<typeof cueSettings>;

/**
 * The recipe of an observation. A version that was used is never changed: an edit makes a new version
 * under the same id.
 */
export const protocol = z.object({
  id,
  version: z.int().check(z.minimum(1)),
  study: id,
  name: shortText,
  method,
  intervalMs: z.int().check(z.minimum(3000), z.maximum(600_000)),
  /** The part of the interval in which behaviour counts; equal to `intervalMs` where there is no record part. */
  observeMs: z.int().check(z.minimum(1000), z.maximum(600_000)),
  lookAt: lookMoment,
  rotation,
  partLength,
  /** `random`: the drawn children are put in random order for each session (seed kept); `listed`: in drawn order. */
  order: z.enum(['random', 'listed']),
  childrenToDraw: z.int().check(z.minimum(1), z.maximum(60)),
  reserves: z.int().check(z.minimum(0), z.maximum(60)),
  /** Time after a cue in which a touch still belongs to the interval before, if that is empty. */
  graceMs: z.int().check(z.minimum(0), z.maximum(3000)),
  codeSet,
  cues: cueSettings,
  removed: z.boolean(),
  revision,
});
export type Protocol = z.infer<typeof protocol>;
