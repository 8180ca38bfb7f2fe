import * as z from 'zod/mini';
import { draw } from './classroom.ts';
import { codeSet } from './codeSet.ts';
import { id, isoDate, shortText, wallTime, whole } from './common.ts';
import { method, protocol } from './protocol.ts';
import { seatingPlan } from './seatingPlan.ts';

export const role = z.enum(['primary', 'second']);
export type Role = z.infer<typeof role>;

export const sessionChild = z.object({ id, pseudonym: shortText, stratum: z.nullable(shortText) });
export type SessionChild = z.infer<typeof sessionChild>;

/** An interval that a table gave, as it stood there. */
export const listedInterval = z.object({
  number: z.int().check(z.minimum(1)),
  child: z.nullable(id),
  phase: z.nullable(shortText),
  lessonPart: z.nullable(shortText),
  round: z.nullable(whole),
  startMs: z.nullable(z.number()),
  endMs: z.nullable(z.number()),
  minutesFromBreak: z.nullable(z.number()),
});
export type ListedInterval = z.infer<typeof listedInterval>;

/** Laid out by the protocol (recorded sessions): intervals are computed by `schedule/layOut.ts`, one part a phase. */
export const laidSchedule = z.object({
  kind: z.literal('laid'),
  protocol,
  phases: z.array(shortText).check(z.minLength(1)),
  /** Whose turn it is where chance decides anew each round: part by part, interval by interval, the child's place in the list. */
  turns: z.optional(z.array(z.array(whole))),
});
export type LaidSchedule = z.infer<typeof laidSchedule>;

/** Listed one by one (sessions from an interval table). */
export const listedSchedule = z.object({
  kind: z.literal('listed'),
  method,
  intervalMs: z.nullable(z.number()),
  observeMs: z.nullable(z.number()),
  codeSet,
  intervals: z.array(listedInterval),
});
export type ListedSchedule = z.infer<typeof listedSchedule>;

export const schedule = z.discriminatedUnion('kind', [laidSchedule, listedSchedule]);
export type Schedule = z.infer<typeof schedule>;

/** All that is needed to read one session alone in ten years. Frozen before the first cue. */
export const sessionHeader = z.object({
  id,
  study: id,
  classroom: z.object({ id, name: z.string() }),
  condition: z.nullable(shortText),
  visit: id,
  /** What a table called the visit; null for visits made here. */
  visitLabel: z.nullable(z.string()),
  /** What a table called the session and the study; absent for sessions made here. */
  sessionLabel: z.optional(z.string()),
  studyLabel: z.optional(z.string()),
  observer: z.object({ id, name: shortText }),
  role: z.nullable(role),
  practice: z.boolean(),
  /** A visit to let the class get used to the observer: kept, and left out of results unless asked for. */
  familiarisation: z.optional(z.boolean()),
  /** Recorded on the printed sheet and typed in: no prompts, no times of touches. */
  fromPaper: z.optional(z.boolean()),
  date: z.nullable(isoDate),
  plannedStart: z.nullable(wallTime),
  /** The target children in the order of the schedule. */
  children: z.array(sessionChild),
  /** Drawn children who may step in, in their order; those present on the day. */
  reserves: z.optional(z.array(sessionChild)),
  plan: z.nullable(seatingPlan),
  draw: z.nullable(draw),
  orderSeed: z.nullable(shortText),
  schedule,
  app: z.string(),
  device: z.string(),
  timeZone: z.nullable(z.string()),
});
export type SessionHeader = z.infer<typeof sessionHeader>;
