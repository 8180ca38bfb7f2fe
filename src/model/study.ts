import * as z from 'zod/mini';
import { id, longText, revision, shortText } from './common.ts';

/** A hand's correction of which visit a session belongs to. */
export const pairing = z.object({ session: id, visit: id });
export type Pairing = z.infer<typeof pairing>;

/** One project: what its phases and conditions are called and which agreement it asks for. */
export const study = z.object({
  id,
  name: shortText,
  /** In the order in which they happen, for example before, after. */
  phases: z.array(shortText).check(z.minLength(1)),
  conditions: z.array(shortText),
  /** The condition that the others are compared with; null when there is none. */
  control: z.nullable(shortText),
  lessonParts: z.array(shortText),
  /** The study's own criterion for agreement: share 0–1 and kappa. */
  criterion: z.object({ agreement: z.number(), kappa: z.number() }),
  /** The school's designated person for safeguarding, as the team writes it. */
  safeguarding: longText,
  pairings: z.array(pairing),
  demo: z.boolean(),
  removed: z.boolean(),
  revision,
});
export type Study = z.infer<typeof study>;
