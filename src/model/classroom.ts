import * as z from 'zod/mini';
import { id, revision, shortText } from './common.ts';
import { seatingPlan } from './seatingPlan.ts';

/** A child who may be observed. Children without consent are never written down, so there is no field for it. */
export const child = z.object({
  id,
  pseudonym: shortText,
  stratum: z.nullable(shortText),
  removed: z.boolean(),
});
export type Child = z.infer<typeof child>;

/** What a random draw was and gave: enough to repeat it, and the result itself in case the method is ever lost. */
export const draw = z.object({
  seed: shortText,
  method: z.object({ name: shortText, version: z.int(), generator: shortText }),
  /** Everybody who could have been drawn, in the order in which the method saw them. */
  from: z.array(id),
  chosen: z.array(id),
  reserves: z.array(id),
});
export type Draw = z.infer<typeof draw>;

export const classroom = z.object({
  id,
  study: id,
  name: shortText,
  condition: z.nullable(shortText),
  children: z.array(child),
  plan: z.nullable(seatingPlan),
  /** The target children of the study; null until they are drawn. */
  draw: z.nullable(draw),
  removed: z.boolean(),
  revision,
});
export type Classroom = z.infer<typeof classroom>;
