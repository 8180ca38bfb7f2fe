import * as z from 'zod/mini';
import { codeSet } from './codeSet.ts';
import { id, revision, shortText } from './common.ts';

export const methods = ['momentary', 'partial', 'whole', 'headcount', 'duration'] as const;
export const method = z.enum(methods);
export type Method = z.infer<typeof method>;

/** Momentary looks happen when the interval ends or when it starts: one choice per protocol, printed with every figure. */
export const lookMoment = z.enum(['end', 'start']);
export type LookMoment = z.infer<typeof lookMoment>;

/**
 * Who is watched when: the next child at each interval; `intervals` in a row for each child; one child throughout; all
 * children one after the other at each prompt, `eachMs` a child; or one target child, and at each `peerEvery`-th
 * interval one of the others in turn. Headcounts look at everybody and have no turns.
 */
export const rotation = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('next') }),
  z.object({ kind: z.literal('block'), intervals: z.int().check(z.minimum(1), z.maximum(240)) }),
  z.object({ kind: z.literal('one') }),
  z.object({ kind: z.literal('sweep'), eachMs: z.int().check(z.minimum(1000), z.maximum(60_000)) }),
  z.object({ kind: z.literal('target'), peerEvery: z.int().check(z.minimum(2), z.maximum(60)) }),
]);
export type Rotation = z.infer<typeof rotation>;

/** How long one part (one phase) of a session is. A round is one pass through all target children. */
export const partLength = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('minutes'), minutes: z.number().check(z.minimum(0.25), z.maximum(180)) }),
  z.object({ kind: z.literal('rounds'), rounds: z.int().check(z.minimum(1), z.maximum(1000)) }),
]);
export type PartLength = z.infer<typeof partLength>;

/** Words in the earpiece ahead of a look; the prompt itself stays a tone. */
export const headsUp = z.object({
  /** What is said: the child's pseudonym, or the row and place where it sits. */
  says: z.enum(['child', 'seat']),
  aheadMs: z.int().check(z.minimum(1000), z.maximum(10_000)),
});
export type HeadsUp = z.infer<typeof headsUp>;

export const cueSettings = z.object({
  channel: z.enum(['both', 'left', 'right']),
  /** 0 to 1 */
  volume: z.number().check(z.minimum(0), z.maximum(1)),
  flash: z.boolean(),
  vibration: z.boolean(),
  headsUp: z.optional(headsUp),
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
  /** Observe and record part together: each may take ten minutes. */
  intervalMs: z.int().check(z.minimum(3000), z.maximum(1_200_000)),
  /** The part of the interval in which behaviour counts; equal to `intervalMs` where there is no record part. */
  observeMs: z.int().check(z.minimum(1000), z.maximum(600_000)),
  lookAt: lookMoment,
  rotation,
  partLength,
  /**
   * `random`: the drawn children are put in random order for each session (seed kept); `random each round`: anew for
   * each round; `listed`: in drawn order.
   */
  order: z.enum(['random', 'listed', 'random each round']),
  childrenToDraw: z.int().check(z.minimum(1), z.maximum(60)),
  reserves: z.int().check(z.minimum(0), z.maximum(60)),
  /** Time after a cue in which a touch still belongs to the interval before, if that is empty. */
  graceMs: z.int().check(z.minimum(0), z.maximum(3000)),
  /** What becomes of the interval that a true pause breaks: it is missing (also where this is absent), or done once more. */
  afterPause: z.optional(z.enum(['missing', 'repeat'])),
  /** A child who leaves is stood in for by the next reserve until it returns. Absent = no. */
  reservesStepIn: z.optional(z.boolean()),
  codeSet,
  cues: cueSettings,
  removed: z.boolean(),
  revision,
});
export type Protocol = z.infer<typeof protocol>;
