import * as z from 'zod/mini';
import { draw } from './classroom.ts';
import { id, shortText, wallTime } from './common.ts';
import { seatingPlan } from './seatingPlan.ts';
import { laidSchedule, sessionChild } from './session.ts';

/**
 * The frozen schedule of one visit, which two observers share: everything of a session header but who records.
 * It holds nobody's marks.
 */
export const visitPlan = z.object({
  visit: id,
  study: z.object({
    id,
    name: shortText,
    phases: z.array(shortText),
    conditions: z.array(shortText),
    lessonParts: z.array(shortText),
  }),
  classroom: z.object({ id, name: shortText }),
  condition: z.nullable(shortText),
  plannedStart: z.nullable(wallTime),
  children: z.array(sessionChild),
  reserves: z.optional(z.array(sessionChild)),
  plan: z.nullable(seatingPlan),
  draw: z.nullable(draw),
  orderSeed: z.nullable(shortText),
  schedule: laidSchedule,
});
export type VisitPlan = z.infer<typeof visitPlan>;
